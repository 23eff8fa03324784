package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import pinchoff.drawing.TextLine;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Quantity;

/** Says in words what a chart shows: the text alternative. */
final class Description {
  private static final int MOST_ITEMS = 30;

  private final Chart chart;
  private final Ranges ranges;

  private Description(Chart chart) {
    this.chart = chart;
    this.ranges = Ranges.of(chart);
  }

  static String of(Chart chart) {
    return new Description(chart).text();
  }

  private String text() {
    List<String> sentences = new ArrayList<>();
    if (!chart.title().isEmpty()) {
      sentences.add(TextLine.plain(chart.title()).text());
    }
    for (int i = 0; i < chart.panels().size(); i++) {
      panel(chart.panels().get(i), i, sentences);
    }
    return String.join(". ", sentences) + ".";
  }

  private void panel(Panel panel, int index, List<String> sentences) {
    String second =
        panel
            .right()
            .map(axis -> " and " + axis(axis, ranges.right().get(index).orElseThrow()))
            .orElse("");
    sentences.add(
        (index == 0 ? "Chart of " : "Below it ")
            + axis(panel.left(), ranges.left().get(index))
            + second
            + " against "
            + axis(chart.x(), ranges.x()));
    if (panel.items().isEmpty()) {
      sentences.add("No data");
    }
    panel.items().stream().limit(MOST_ITEMS).forEach(item -> sentences.add(item(item, panel)));
    if (panel.items().size() > MOST_ITEMS) {
      sentences.add("And " + (panel.items().size() - MOST_ITEMS) + " more");
    }
    sentences.addAll(Crossings.of(panel, chart.x()));
  }

  private static String axis(Axis axis, Range range) {
    String name = axis.label().text();
    return "%s (%s%s to %s)"
        .formatted(
            name.isEmpty() ? axis.dimension().name().orElse("values") : name,
            axis.logarithmic() ? "logarithmic, " : "",
            value(range.low(), axis.dimension(), axis),
            value(range.high(), axis.dimension(), axis));
  }

  private String item(Item item, Panel panel) {
    String name = item.name().isEmpty() ? "" : " \"" + TextLine.plain(item.name()).text() + "\"";
    if (item instanceof Line line) {
      Axis axis = line.onRight() ? panel.right().orElseThrow() : panel.left();
      return "Line" + name + ": " + course(line.points(), axis);
    } else if (item instanceof Locus locus) {
      return "Locus" + name + ": " + course(locus.points(), panel.left());
    } else if (item instanceof Dots dots) {
      return "Dots" + name + ": " + course(dots.points(), panel.left());
    } else if (item instanceof Guide guide) {
      return (guide.vertical() ? "Upright line" : "Level line") + name + " at " + guide.value();
    } else if (item instanceof Marker marker) {
      return "Point" + name + " at (" + marker.x() + ", " + marker.y() + ")";
    }
    return "Region" + name;
  }

  /** Ends and extremes of a curve. */
  private String course(Points points, Axis axis) {
    int first = -1;
    int last = -1;
    int lowest = -1;
    int highest = -1;
    int without = 0;
    for (int i = 0; i < points.size(); i++) {
      if (hasPlace(points, i, axis)) {
        first = first < 0 ? i : first;
        last = i;
        lowest = lowest < 0 || points.y(i) < points.y(lowest) ? i : lowest;
        highest = highest < 0 || points.y(i) > points.y(highest) ? i : highest;
      } else {
        without++;
      }
    }
    if (first < 0) {
      return "no points";
    }
    StringBuilder text = new StringBuilder("from " + point(points, first, axis));
    text.append(" to ").append(point(points, last, axis));
    if (lowest != first && lowest != last) {
      text.append(", lowest at ").append(point(points, lowest, axis));
    }
    if (highest != first && highest != last) {
      text.append(", highest at ").append(point(points, highest, axis));
    }
    if (without > 0) {
      text.append(
          String.format(Locale.ROOT, ", %d of %d points have no place", without, points.size()));
    }
    return text.toString();
  }

  private boolean hasPlace(Points points, int i, Axis axis) {
    return points.isPoint(i)
        && (!axis.logarithmic() || points.y(i) > 0)
        && (!chart.x().logarithmic() || points.x(i) > 0);
  }

  private String point(Points points, int i, Axis y) {
    return "("
        + value(points.x(i), chart.x().dimension(), chart.x())
        + ", "
        + value(points.y(i), y.dimension(), y)
        + ")";
  }

  /** A value as it is shown elsewhere, in the unit of its axis if that was given. */
  static String value(double si, Dimension dimension, Axis axis) {
    Quantity quantity = Quantity.ofSi(si, dimension);
    return Engineering.of(axis.unit().map(quantity::to).orElse(quantity), Engineering.DIGITS)
        .text();
  }
}
