package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.drawing.Rect;

/**
 * A panel with its place on the page, and its items with theirs.
 *
 * @param panel what is drawn
 * @param plot where
 * @param x the horizontal scale
 * @param left the vertical scale
 * @param right the second vertical scale
 * @param actors the items in the order of the panel
 */
record Stage(
    Panel panel, Rect plot, Scale x, Scale left, Optional<Scale> right, List<Actor> actors) {

  /**
   * An item on the page.
   *
   * @param item what it is
   * @param look how it is drawn
   * @param trace where its points lie; empty for markers and regions
   */
  record Actor(Item item, Look look, Trace trace) {}

  static Stage of(
      Panel panel,
      List<Look> looks,
      Rect plot,
      Range x,
      Range left,
      Optional<Range> right,
      boolean logX) {
    Scale across = new Scale(x, logX, plot.x(), plot.right());
    Scale up = new Scale(left, panel.left().logarithmic(), plot.bottom(), plot.y());
    Optional<Scale> second =
        right.map(
            range ->
                new Scale(
                    range, panel.right().orElseThrow().logarithmic(), plot.bottom(), plot.y()));
    List<Actor> actors = new ArrayList<>();
    for (int i = 0; i < looks.size(); i++) {
      Item item = panel.items().get(i);
      Scale own = item instanceof Line line && line.onRight() ? second.orElseThrow() : up;
      actors.add(new Actor(item, looks.get(i), trace(item, across, own, plot)));
    }
    return new Stage(panel, plot, across, up, second, actors);
  }

  private static Trace trace(Item item, Scale x, Scale y, Rect plot) {
    if (item instanceof Line line) {
      return Trace.of(line.points(), x, y, plot);
    } else if (item instanceof Locus locus) {
      return Trace.of(locus.points(), x, y, plot);
    } else if (item instanceof Guide guide) {
      return guide(guide, x, y, plot);
    }
    return new Trace(List.of());
  }

  private static Trace guide(Guide guide, Scale x, Scale y, Rect plot) {
    double at = (guide.vertical() ? x : y).at(guide.value().si());
    double low = guide.vertical() ? plot.x() : plot.y();
    double high = guide.vertical() ? plot.right() : plot.bottom();
    if (!(at >= low && at <= high)) {
      return new Trace(List.of());
    }
    return new Trace(
        List.of(
            guide.vertical()
                ? new double[] {at, plot.bottom(), at, plot.y()}
                : new double[] {plot.x(), at, plot.right(), at}));
  }

  /** The actors whose items are of one kind. */
  List<Actor> all(Class<? extends Item> kind) {
    return actors.stream().filter(actor -> kind.isInstance(actor.item())).toList();
  }
}
