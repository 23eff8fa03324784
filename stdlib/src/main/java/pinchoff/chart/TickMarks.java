package pinchoff.chart;

import java.util.List;
import pinchoff.drawing.TextLine;

/**
 * The ticks of an axis.
 *
 * @param labelled ticks with a number
 * @param fine further grid lines between them, in SI
 * @param unit the unit for the title of the axis; empty if there is none or the ticks say it
 */
record TickMarks(List<Tick> labelled, List<Double> fine, TextLine unit) {

  /**
   * A tick.
   *
   * @param value in SI
   * @param label its number
   */
  record Tick(double value, TextLine label) {}

  static TickMarks of(Axis axis, Range range, double length, double room) {
    return axis.logarithmic()
        ? LogTicks.of(axis, range, length, room)
        : LinearTicks.of(axis, range, length, room);
  }

  /** The width of the widest label. */
  double widest(double size) {
    return labelled.stream().mapToDouble(tick -> tick.label().width(size)).max().orElse(0);
  }
}
