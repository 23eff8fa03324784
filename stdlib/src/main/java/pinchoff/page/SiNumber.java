package pinchoff.page;

import java.math.BigDecimal;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * A floating-point number as the shortest decimal that reads back as the same number. It is written
 * alike by every Java version, which {@code Double.toString} is not. Minus zero becomes zero.
 */
final class SiNumber {
  private SiNumber() {}

  static BigDecimal of(double si) {
    return new BigDecimal(Quantity.ofSi(si, Dimension.NONE).asciiText());
  }
}
