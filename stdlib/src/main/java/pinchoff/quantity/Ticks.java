package pinchoff.quantity;

import java.math.MathContext;

/**
 * The unit of an axis and the labels of its ticks: one prefix for all, chosen by the larger end.
 *
 * @param unit the common unit
 */
public record Ticks(Unit unit) {
  private static final MathContext LABEL = new MathContext(6);

  /**
   * The unit for a range.
   *
   * @param dimension what the axis shows
   * @param low one end in SI
   * @param high the other end in SI
   */
  public static Ticks of(Dimension dimension, double low, double high) {
    double largest = Math.max(Math.abs(low), Math.abs(high));
    if (!Double.isFinite(low) || !Double.isFinite(high)) {
      throw new QuantityException("axis from " + low + " to " + high + ": expected finite ends");
    }
    DisplayUnits units = DisplayUnits.of(dimension);
    return new Ticks(
        units.forExponent(
            largest == 0 ? 0 : Engineering.leading(Decimal.of(largest).round(LABEL))));
  }

  /** A value in the common unit. */
  public double in(double si) {
    return unit.fromSi(si);
  }

  /** The label of a tick: up to six significant digits without trailing zeros. */
  public String label(double si) {
    if (!Double.isFinite(si)) {
      throw new QuantityException("tick at " + si + ": expected a finite value");
    }
    return Engineering.shortest(unit.decimalFromSi(si).round(LABEL));
  }
}
