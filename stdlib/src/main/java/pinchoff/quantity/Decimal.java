package pinchoff.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.function.ToDoubleFunction;

/**
 * Doubles as the decimal numbers that their writers mean: the shortest decimal that reads back as
 * the same double.
 */
final class Decimal {
  private static final double[] POWERS = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16,
    1e17, 1e18, 1e19, 1e20, 1e21, 1e22
  };
  private static final int EXACT = POWERS.length - 1;
  private static final double LONGEST = 1e15;
  private static final double EXACT_WHOLE = 0x1p53;

  private Decimal() {}

  /** The shortest decimal that reads back as the value. */
  static BigDecimal of(double value) {
    BigDecimal exact = new BigDecimal(value);
    for (int digits = 15; digits < 17; digits++) {
      BigDecimal rounded = exact.round(new MathContext(digits, RoundingMode.HALF_EVEN));
      if (rounded.doubleValue() == value) {
        return normal(rounded);
      }
    }
    return normal(exact.round(new MathContext(17, RoundingMode.HALF_EVEN)));
  }

  /**
   * The decimal with the fewest digits that some reading takes for a value; the decimal itself, to
   * 17 digits, if there is none.
   */
  static BigDecimal shortest(
      BigDecimal decimal, ToDoubleFunction<BigDecimal> reading, double value) {
    for (int digits = 15; digits < 17; digits++) {
      BigDecimal rounded = decimal.round(new MathContext(digits, RoundingMode.HALF_EVEN));
      if (reading.applyAsDouble(rounded) == value) {
        return normal(rounded);
      }
    }
    return normal(decimal.round(new MathContext(17, RoundingMode.HALF_EVEN)));
  }

  /** The shortest decimal as text; the platform's own differs between versions. */
  static String text(double value) {
    return Double.isFinite(value) ? Engineering.shortest(of(value)) : Double.toString(value);
  }

  private static BigDecimal normal(BigDecimal value) {
    return value.signum() == 0 ? BigDecimal.ZERO : value.stripTrailingZeros();
  }

  /**
   * The value, as its shortest decimal, times a power of ten, rounded once. So 0.18 scaled by -6 is
   * the double nearest to 0.00000018, which 0.18 * 1e-6 is not.
   */
  static double scale(double value, int power) {
    if (power == 0 || value == 0) {
      return value;
    }
    for (int places = 0; places <= EXACT; places++) {
      double whole = Math.rint(value * POWERS[places]);
      if (Math.abs(whole) > LONGEST && !(places == 0 && Math.abs(whole) <= EXACT_WHOLE)) {
        break;
      }
      // A whole number of at most 15 digits over an exact power of ten: this is the decimal meant.
      if (whole / POWERS[places] == value) {
        return scaleExact(whole, power - places);
      }
    }
    return of(value).scaleByPowerOfTen(power).doubleValue();
  }

  private static double scaleExact(double whole, int power) {
    if (power >= 0 && power <= EXACT) {
      return whole * POWERS[power];
    }
    if (power < 0 && power >= -EXACT) {
      return whole / POWERS[-power];
    }
    return of(whole).scaleByPowerOfTen(power).doubleValue();
  }
}
