package pinchoff.quantity;

import java.math.BigDecimal;

/** Reads the exponent of a unit: 2, -1, 0.5, (1/3), or superscripts. The result is in sixtieths. */
final class ExponentReader {
  private static final int LONGEST = 6;
  private static final int SUPERSCRIPTS = 2;

  private ExponentReader() {}

  /** What follows a {@code ^}. */
  static int read(TextCursor cursor) {
    int start = cursor.at();
    boolean bracket = cursor.accept("(");
    BigDecimal numerator = number(cursor, start);
    BigDecimal denominator = bracket && cursor.accept("/") ? number(cursor, start) : BigDecimal.ONE;
    if (bracket && !cursor.accept(")")) {
      throw cursor.errorHere("expected ) after the exponent");
    }
    if (denominator.signum() == 0) {
      throw cursor.error(start, "an exponent with the denominator 0");
    }
    BigDecimal sixtieths = numerator.multiply(BigDecimal.valueOf(Dimension.PARTS));
    BigDecimal[] parts = sixtieths.divideAndRemainder(denominator);
    if (parts[1].signum() != 0 || parts[0].stripTrailingZeros().scale() > 0) {
      throw cursor.error(start, "expected an exponent that is a multiple of 1/" + Dimension.PARTS);
    }
    return parts[0].intValueExact();
  }

  private static BigDecimal number(TextCursor cursor, int start) {
    String sign = cursor.acceptMinus() ? "-" : "";
    String whole = cursor.digits();
    boolean point = cursor.accept(".");
    String fraction = point ? cursor.digits() : "";
    boolean complete = !whole.isEmpty() && point != fraction.isEmpty();
    if (!complete || whole.length() + fraction.length() > LONGEST) {
      throw cursor.error(start, "expected an exponent such as 2, -1, 0.5 or (1/3)");
    }
    return new BigDecimal(sign + whole + (point ? "." + fraction : ""));
  }

  static boolean atSuperscript(TextCursor cursor) {
    return cursor.peek() == '⁻' || Exponent.superscriptDigit(cursor.peek()) >= 0;
  }

  static int superscript(TextCursor cursor) {
    int start = cursor.at();
    int sign = cursor.accept("⁻") ? -1 : 1;
    int digits = cursor.at();
    int value = 0;
    while (Exponent.superscriptDigit(cursor.peek()) >= 0 && cursor.at() - digits <= SUPERSCRIPTS) {
      value = value * 10 + Exponent.superscriptDigit(cursor.peek());
      cursor.skip();
    }
    int count = cursor.at() - digits;
    if (count == 0 || count > SUPERSCRIPTS) {
      throw cursor.error(start, "expected an exponent of one or two digits");
    }
    return sign * value * Dimension.PARTS;
  }
}
