package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The ranges of all axes of a chart.
 *
 * @param x of the horizontal axis
 * @param left of each panel's left axis
 * @param right of each panel's right axis
 */
record Ranges(Range x, List<Range> left, List<Optional<Range>> right) {

  /**
   * Lines, dots, regions, markers and guides set the ranges; loci only where there is nothing else,
   * since a boundary often runs far beyond what it bounds.
   */
  static Ranges of(Chart chart) {
    Range.Finder x = new Range.Finder(chart.x());
    chart.panels().forEach(panel -> addX(panel, x));
    if (x.isEmpty()) {
      chart.panels().forEach(panel -> addLociX(panel, x));
    }
    boolean curves =
        chart.panels().stream()
            .flatMap(panel -> panel.items().stream())
            .anyMatch(i -> i instanceof Line || i instanceof Region || i instanceof Locus);
    Range across = x.range(!curves);
    List<Range> left = new ArrayList<>();
    List<Optional<Range>> right = new ArrayList<>();
    for (Panel panel : chart.panels()) {
      left.add(vertical(panel, panel.left(), false, across));
      right.add(panel.right().map(axis -> vertical(panel, axis, true, across)));
    }
    return new Ranges(across, left, right);
  }

  private static void addX(Panel panel, Range.Finder x) {
    for (Item item : panel.items()) {
      if (item instanceof Marker marker) {
        x.add(marker.x().si());
      } else if (item instanceof Guide guide && guide.vertical()) {
        x.add(guide.value().si());
      } else if (!(item instanceof Locus)) {
        points(item).ifPresent(points -> addX(points, x));
      }
    }
  }

  private static void addLociX(Panel panel, Range.Finder x) {
    for (Item item : panel.items()) {
      if (item instanceof Locus locus) {
        addX(locus.points(), x);
      }
    }
  }

  private static void addX(Points points, Range.Finder x) {
    for (int i = 0; i < points.size(); i++) {
      if (points.isPoint(i)) {
        x.add(points.x(i));
      }
    }
  }

  /** Only what lies within the horizontal range counts. */
  private static Range vertical(Panel panel, Axis axis, boolean onRight, Range across) {
    Range.Finder y = new Range.Finder(axis);
    for (Item item : panel.items()) {
      boolean here = onRight == (item instanceof Line line && line.onRight());
      if (here && item instanceof Marker marker) {
        y.add(marker.y().si());
      } else if (here && item instanceof Guide guide && !guide.vertical()) {
        y.add(guide.value().si());
      } else if (here && !(item instanceof Locus)) {
        points(item).ifPresent(points -> addY(points, y, across));
      }
    }
    if (y.isEmpty() && !onRight) {
      panel.items().stream()
          .filter(Locus.class::isInstance)
          .forEach(item -> addY(((Locus) item).points(), y, across));
    }
    boolean map = panel.items().stream().anyMatch(Region.class::isInstance);
    return y.range(!map);
  }

  private static void addY(Points points, Range.Finder y, Range across) {
    for (int i = 0; i < points.size(); i++) {
      if (points.isPoint(i) && across.contains(points.x(i))) {
        y.add(points.y(i));
      }
    }
  }

  private static Optional<Points> points(Item item) {
    if (item instanceof Line line) {
      return Optional.of(line.points());
    } else if (item instanceof Dots dots) {
      return Optional.of(dots.points());
    } else if (item instanceof Region region) {
      return Optional.of(region.outline());
    } else if (item instanceof Locus locus) {
      return Optional.of(locus.points());
    }
    return Optional.empty();
  }
}
