package pinchoff.quantity;

import java.math.BigDecimal;

/** Text of an exponent that is held in sixtieths. */
final class Exponent {
  private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

  private Exponent() {}

  /** "2", "-1", "0.5", "(1/3)". */
  static String text(long parts) {
    int whole = Dimension.PARTS;
    if (parts % whole == 0) {
      return Long.toString(parts / whole);
    }
    if (parts % 3 == 0) {
      return BigDecimal.valueOf(parts / 3 * 5, 2).stripTrailingZeros().toPlainString();
    }
    long divisor = gcd(Math.abs(parts), whole);
    return "(" + parts / divisor + "/" + whole / divisor + ")";
  }

  /** "²", "⁻¹" for whole exponents. */
  static String superscript(long parts) {
    StringBuilder out = new StringBuilder();
    for (char c : Long.toString(parts / Dimension.PARTS).toCharArray()) {
      out.append(c == '-' ? '⁻' : SUPERSCRIPTS.charAt(c - '0'));
    }
    return out.toString();
  }

  /** The value of a superscript digit, or -1. */
  static int superscriptDigit(int c) {
    return SUPERSCRIPTS.indexOf(c);
  }

  private static long gcd(long a, long b) {
    return b == 0 ? a : gcd(b, a % b);
  }
}
