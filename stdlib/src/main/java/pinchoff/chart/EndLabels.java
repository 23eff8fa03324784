package pinchoff.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Path;
import pinchoff.drawing.Pen;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/** Puts the names of lines at their right ends: in the margin, or in free space behind the end. */
final class EndLabels {
  /** Width of the margin between the plotting area and the names, for leaders. */
  static final double LEADER = 14;

  private static final Style STYLE = Style.STANDARD;
  private static final double ROW = 16;

  private final Stage stage;
  private final Occupancy occupancy;
  private final double room;
  private final List<Element> art = new ArrayList<>();
  private final List<End> inMargin = new ArrayList<>();

  private record End(TextLine name, Look look, double x, double y) {}

  private EndLabels(Stage stage, Occupancy occupancy, double room) {
    this.stage = stage;
    this.occupancy = occupancy;
    this.room = room;
  }

  /**
   * The names of lines at their ends.
   *
   * @param named the lines to name
   * @param occupancy what is taken; names within the plotting area are added
   * @param room width of the margin for names
   * @return empty if there is no room for all of them
   */
  static Optional<List<Element>> of(
      Stage stage, List<Stage.Actor> named, Occupancy occupancy, double room) {
    EndLabels labels = new EndLabels(stage, occupancy, room);
    for (Stage.Actor actor : named) {
      if (!labels.add(actor)) {
        return Optional.empty();
      }
    }
    return labels.placeMargin() ? Optional.of(labels.art) : Optional.empty();
  }

  private boolean add(Stage.Actor actor) {
    if (actor.trace().isEmpty()) {
      return true;
    }
    double[] at = rightEnd(actor.trace());
    Rect plot = stage.plot();
    double x = Math.min(plot.right(), Math.max(plot.x(), at[0]));
    double y = Math.min(plot.bottom(), Math.max(plot.y(), at[1]));
    TextLine name = TextLine.of(actor.item().name()).within(room, STYLE.text());
    End end = new End(name, actor.look(), x, y);
    if (x >= plot.right() - 2) {
      inMargin.add(end);
      return true;
    }
    return placeInside(end);
  }

  private static double[] rightEnd(Trace trace) {
    double[] first = trace.pieces().get(0);
    double[] last = trace.pieces().get(trace.pieces().size() - 1);
    double[] begin = {first[0], first[1]};
    double[] end = {last[last.length - 2], last[last.length - 1]};
    return begin[0] > end[0] ? begin : end;
  }

  private boolean placeInside(End end) {
    double width = end.name.width(STYLE.text());
    Rect area = new Rect(end.x + 6, end.y - ROW / 2, width + 2, ROW);
    if (occupancy.taken(area) > 0) {
      return false;
    }
    occupancy.add(area);
    art.add(text(end.name, end.x + 7, end.y, end.look));
    return true;
  }

  private boolean placeMargin() {
    if (inMargin.size() * ROW > stage.plot().height() + ROW) {
      return false;
    }
    inMargin.sort(Comparator.comparingDouble(End::y));
    double[] places =
        Spread.of(
            inMargin.stream().mapToDouble(End::y).toArray(),
            ROW,
            stage.plot().y() + 2,
            stage.plot().bottom() - 2);
    double from = stage.plot().right();
    for (int i = 0; i < places.length; i++) {
      End end = inMargin.get(i);
      if (Math.abs(places[i] - end.y) > 2.5) {
        Path leader =
            Path.builder()
                .moveTo(from + 1, end.y)
                .lineTo(from + 3, end.y)
                .lineTo(from + LEADER - 4, places[i])
                .lineTo(from + LEADER - 2, places[i])
                .build();
        art.add(Element.stroked(leader, Pen.of(end.look.colour(), 0.9)));
      }
      double gap = Math.abs(places[i] - end.y) > 2.5 ? LEADER : 6;
      art.add(text(end.name, from + gap, places[i], end.look));
    }
    return true;
  }

  private static Element text(TextLine name, double x, double y, Look look) {
    return new Element.Text(
        name, x, y + STYLE.text() * 0.36, STYLE.text(), look.colour().shade(), Anchor.START);
  }
}
