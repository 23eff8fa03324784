package pinchoff.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * A quantity as number and unit for display, apart so that a table can align them. This is the one
 * place that formats a number.
 *
 * <p>The number has the stated count of significant digits, with trailing zeros. The unit has the
 * prefix that leaves one to three digits before the decimal mark, chosen after rounding: 999.96 mV
 * to four digits is 1.000 V. Halves are rounded away from zero, on the decimal number that was
 * meant. What no prefix reaches is shown with a power of ten: {@code 1.602e-19 C}. Zero is {@code
 * 0} in the unit without prefix.
 *
 * @param number the digits, with a minus sign if negative: {@code "650.0"}
 * @param in the unit
 */
public record Engineering(String number, Unit in) {

  /** How many significant digits are shown unless something else is asked for. */
  public static final int DIGITS = 4;

  /** The one unit that stands close to its number. */
  private static final String DEGREE = "°";

  private static final int MOST_DIGITS = 17;
  private static final BigDecimal NOTHING_LOST = new BigDecimal("1e-12");
  private static final int PLAIN_FROM = -3;
  private static final int PLAIN_TO = 6;

  /**
   * Formats a quantity, in its display unit if it has one.
   *
   * @param digits significant digits, 1 to 17
   */
  public static Engineering of(Quantity quantity, int digits) {
    if (digits < 1 || digits > MOST_DIGITS) {
      throw new QuantityException(digits + " significant digits: expected 1 to " + MOST_DIGITS);
    }
    double si = quantity.si();
    MathContext rounding = new MathContext(digits, RoundingMode.HALF_UP);
    Unit unit =
        quantity
            .displayUnit()
            .orElseGet(
                () ->
                    DisplayUnits.of(quantity.dimension())
                        .forExponent(leading(Decimal.of(si).round(rounding))));
    return new Engineering(plain(unit.decimalFromSi(si).round(rounding), digits), unit);
  }

  /** The unit as it is shown: {@code "mV"}; empty for a pure number. */
  public String unit() {
    return in.symbol();
  }

  /** Number and unit: {@code "650.0 mV"}, {@code "35.00 %"}; a pure number is the number alone. */
  public String text() {
    return number + (isClose() ? "" : " ") + unit();
  }

  /** True if nothing stands between number and unit: no unit, or the degree of an angle. */
  boolean isClose() {
    return unit().isEmpty() || unit().equals(DEGREE);
  }

  /**
   * The common unit for the ticks of an axis.
   *
   * @param dimension what the axis shows
   * @param low one end in SI
   * @param high the other end in SI
   */
  public static Ticks ticks(Dimension dimension, double low, double high) {
    return Ticks.of(dimension, low, high);
  }

  /** Four digits, without trailing zeros if these four are all there is. */
  static Engineering brief(Quantity quantity) {
    Engineering full = of(quantity, DIGITS);
    BigDecimal exact = full.in.decimalFromSi(quantity.si());
    BigDecimal rounded = exact.round(new MathContext(DIGITS, RoundingMode.HALF_UP));
    BigDecimal lost = exact.subtract(rounded).abs();
    boolean complete = lost.compareTo(exact.abs().multiply(NOTHING_LOST)) <= 0;
    return complete ? new Engineering(shortest(rounded), full.in) : full;
  }

  /** A number with no more digits than it has. */
  static String shortest(BigDecimal value) {
    BigDecimal stripped = value.stripTrailingZeros();
    return plain(stripped, stripped.precision());
  }

  /** The power of ten of the leading digit. */
  static int leading(BigDecimal value) {
    return value.precision() - value.scale() - 1;
  }

  /** A rounded number with all its digits, with a power of ten if it is very large or small. */
  private static String plain(BigDecimal rounded, int digits) {
    if (rounded.signum() == 0) {
      return "0";
    }
    int exponent = leading(rounded);
    if (exponent >= PLAIN_FROM && exponent < PLAIN_TO) {
      int places = Math.max(0, digits - 1 - exponent);
      return rounded.setScale(places, RoundingMode.UNNECESSARY).toPlainString();
    }
    return rounded
            .scaleByPowerOfTen(-exponent)
            .setScale(digits - 1, RoundingMode.UNNECESSARY)
            .toPlainString()
        + "e"
        + exponent;
  }
}
