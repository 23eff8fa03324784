package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Path;
import pinchoff.drawing.Pen;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/** Puts names of markers, loci and guides beside them, where nothing is covered. */
final class InnerLabels {
  private static final Style STYLE = Style.STANDARD;
  private static final double ROW = 16;
  private static final double HALO = 2;

  /** Directions from a marker to its name, best first. */
  private static final double[][] AROUND = {
    {1, -1}, {1, 1}, {-1, -1}, {-1, 1}, {1, 0}, {-1, 0}, {0, -1}, {0, 1}
  };

  private static final double[] DISTANCES = {5, 12, 22, 34, 50, 70};

  /** Places along a curve where its name may stand, best first. */
  private static final double[] ALONG = {
    0.97, 0.92, 0.86, 0.79, 0.71, 0.62, 0.53, 0.44, 0.35, 0.26, 0.17, 0.08, 0.03
  };

  private final Stage stage;
  private final Occupancy occupancy;
  private final List<Element> art;
  private final double halo;

  InnerLabels(Stage stage, Occupancy occupancy, List<Element> art) {
    this.stage = stage;
    this.occupancy = occupancy;
    this.art = art;
    this.halo = stage.all(Region.class).isEmpty() ? HALO : 0;
  }

  /** Names all markers; if there is no free place, where least is covered. */
  void markers() {
    List<Stage.Actor> markers = stage.all(Marker.class);
    for (Stage.Actor actor : markers) {
      Marker marker = (Marker) actor.item();
      double x = stage.x().at(marker.x().si());
      double y = stage.left().at(marker.y().si());
      if (stage.plot().contains(x, y)) {
        occupancy.add(new Rect(x - 4, y - 4, 8, 8));
      }
    }
    markers.forEach(actor -> marker((Marker) actor.item()));
  }

  private void marker(Marker marker) {
    double x = stage.x().at(marker.x().si());
    double y = stage.left().at(marker.y().si());
    if (marker.name().isEmpty() || !stage.plot().contains(x, y)) {
      return;
    }
    TextLine name = name(marker);
    double width = name.width(STYLE.text());
    Rect best = null;
    double least = Double.POSITIVE_INFINITY;
    double bestDistance = 0;
    for (double distance : DISTANCES) {
      for (double[] way : AROUND) {
        Rect area = beside(x, y, way, distance + ItemArt.MARKER * 0.6, width);
        double taken = stage.plot().contains(area) ? occupancy.taken(area) : 2;
        if (taken < least) {
          least = taken;
          best = area;
          bestDistance = distance;
        }
      }
      if (least == 0) {
        break;
      }
    }
    if (best != null) {
      if (bestDistance > DISTANCES[1]) {
        leader(x, y, best);
      }
      put(name, best, least > 0 ? HALO : halo);
    }
  }

  private static Rect beside(double x, double y, double[] way, double distance, double width) {
    double left = x + way[0] * distance - (1 - way[0]) / 2 * width;
    double middle = y + way[1] * (distance + 2);
    double top = way[1] == 0 ? middle - ROW / 2 : middle - (1 - way[1]) / 2 * ROW;
    return new Rect(left, top, width, ROW);
  }

  private void leader(double x, double y, Rect area) {
    double toX = Math.max(area.x() - 2, Math.min(area.right() + 2, x));
    double toY = Math.max(area.y() + 2, Math.min(area.bottom() - 1, y));
    double dx = toX - x;
    double dy = toY - y;
    double length = Math.sqrt(dx * dx + dy * dy);
    double skip = Math.min(1, (ItemArt.MARKER + 1.5) / length);
    art.add(
        Element.stroked(
            Path.line(x + skip * dx, y + skip * dy, toX, toY), Pen.of(STYLE.frame(), 0.9)));
  }

  /** Names loci and guides; returns those for which there is no free place. */
  List<Stage.Actor> curves() {
    List<Stage.Actor> left = new ArrayList<>();
    for (Stage.Actor actor : stage.actors()) {
      boolean mine = actor.item() instanceof Locus || actor.item() instanceof Guide;
      if (mine && !actor.item().name().isEmpty() && !actor.trace().isEmpty()) {
        Optional<Rect> free = along(actor.trace(), name(actor.item()).width(STYLE.text()));
        free.ifPresentOrElse(
            area -> {
              put(name(actor.item()), area, halo);
              occupancy.add(area);
            },
            () -> left.add(actor));
      }
    }
    return left;
  }

  private TextLine name(Item item) {
    return TextLine.of(item.name()).within(stage.plot().width() * 0.6, STYLE.text());
  }

  /** A free place beside a curve. */
  private Optional<Rect> along(Trace trace, double width) {
    double[] piece = longest(trace);
    double gap = 5;
    for (double share : ALONG) {
      double[] at = at(piece, share);
      double[][] corners = {
        {at[0] - gap - width, at[1] - ROW / 2},
        {at[0] + gap, at[1] - ROW / 2},
        {at[0] - gap - width, at[1] - ROW - 1},
        {at[0] + gap, at[1] + 1},
        {at[0] + gap, at[1] - ROW - 1},
        {at[0] - gap - width, at[1] + 1},
        {at[0] - width / 2, at[1] - ROW - 2},
        {at[0] - width / 2, at[1] + 2},
        {at[0] - width - 1, at[1] - ROW - 2},
        {at[0] + 1, at[1] + 2},
        {at[0] + 1, at[1] - ROW - 2},
        {at[0] - width - 1, at[1] + 2},
      };
      for (double[] corner : corners) {
        Rect area = new Rect(corner[0], corner[1], width, ROW);
        if (occupancy.taken(area) == 0) {
          return Optional.of(area);
        }
      }
    }
    return Optional.empty();
  }

  private static double[] longest(Trace trace) {
    double[] longest = trace.pieces().get(0);
    for (double[] piece : trace.pieces()) {
      if (length(piece) > length(longest)) {
        longest = piece;
      }
    }
    return longest;
  }

  private static double length(double[] piece) {
    double length = 0;
    for (int i = 2; i < piece.length; i += 2) {
      length += step(piece, i);
    }
    return length;
  }

  private static double step(double[] piece, int i) {
    double dx = piece[i] - piece[i - 2];
    double dy = piece[i + 1] - piece[i - 1];
    return Math.sqrt(dx * dx + dy * dy);
  }

  private static double[] at(double[] piece, double share) {
    double left = share * length(piece);
    for (int i = 2; i < piece.length; i += 2) {
      double step = step(piece, i);
      if (left <= step && step > 0) {
        double part = left / step;
        return new double[] {
          piece[i - 2] + part * (piece[i] - piece[i - 2]),
          piece[i - 1] + part * (piece[i + 1] - piece[i - 1])
        };
      }
      left -= step;
    }
    return new double[] {piece[piece.length - 2], piece[piece.length - 1]};
  }

  private void put(TextLine name, Rect area, double rim) {
    art.add(
        new Element.Text(
                name,
                area.x(),
                area.centreY() + STYLE.text() * 0.36,
                STYLE.text(),
                STYLE.ink(),
                Anchor.START)
            .withHalo(rim));
    occupancy.add(area);
  }
}
