package pinchoff.chart;

import pinchoff.drawing.TextLine;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Unit;

/** Chooses the common unit for the numbers of an axis. */
final class AxisUnit {
  private AxisUnit() {}

  /**
   * The axis' own unit, or the one with the prefix that suits a size.
   *
   * @param size the largest number to be written, in SI
   */
  static Unit of(Axis axis, double size) {
    return axis.unit().orElseGet(() -> suited(axis, size));
  }

  private static Unit suited(Axis axis, double size) {
    Unit unit = Engineering.ticks(axis.dimension(), 0, size).unit();
    boolean root = unit.symbol().matches("√\\p{L}+");
    if (!root || size >= 1) {
      return unit;
    }
    // √I_D of microamperes reads best in √µA: the prefix belongs under the root.
    Unit square = Engineering.ticks(axis.dimension().pow(2), 0, size * size).unit();
    return Unit.parse("√" + square.ascii());
  }

  /** The unit as it is shown; empty for a pure number. */
  static TextLine text(Unit unit) {
    return TextLine.plain(unit.symbol());
  }
}
