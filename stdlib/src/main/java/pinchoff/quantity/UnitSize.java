package pinchoff.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;

/** The size of a product of units in SI: an exact power of ten wherever that is possible. */
final class UnitSize {
  private static final MathContext DIGITS = MathContext.DECIMAL128;

  private UnitSize() {}

  static BigDecimal of(List<UnitFactor> factors) {
    long tenths = 0; // the power of ten, in sixtieths
    BigDecimal rest = BigDecimal.ONE;
    for (UnitFactor factor : factors) {
      BigDecimal size = factor.unit().size();
      tenths += (long) factor.parts() * (factor.prefix().power() - size.scale());
      rest = rest.multiply(power(new BigDecimal(size.unscaledValue()), factor.parts()), DIGITS);
    }
    long whole = Math.floorDiv(tenths, Dimension.PARTS);
    int fraction = (int) Math.floorMod(tenths, (long) Dimension.PARTS);
    if (fraction != 0) {
      rest = rest.multiply(power(BigDecimal.TEN, fraction), DIGITS);
    }
    return rest.scaleByPowerOfTen((int) whole).stripTrailingZeros();
  }

  /** A whole number to a power in sixtieths; roots other than square ones to double precision. */
  private static BigDecimal power(BigDecimal base, int parts) {
    if (base.compareTo(BigDecimal.ONE) == 0) {
      return base;
    }
    int whole = Dimension.PARTS;
    if (parts % whole == 0) {
      return base.pow(parts / whole, DIGITS);
    }
    if (parts * 2 % whole == 0) {
      return base.sqrt(DIGITS).pow(parts * 2 / whole, DIGITS);
    }
    return new BigDecimal(StrictMath.pow(base.doubleValue(), (double) parts / whole));
  }
}
