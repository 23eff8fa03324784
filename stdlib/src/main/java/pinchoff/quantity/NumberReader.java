package pinchoff.quantity;

import java.math.BigDecimal;

/** Reads a decimal number as it is written, without rounding: {@code 650}, {@code -1.2e-3}. */
final class NumberReader {
  private static final int EXPONENT_DIGITS = 4;

  private NumberReader() {}

  static BigDecimal read(TextCursor cursor) {
    int start = cursor.at();
    String sign = cursor.acceptMinus() ? "-" : "";
    String whole = cursor.digits();
    String fraction = cursor.accept(".") ? cursor.digits() : "";
    if (whole.isEmpty() && fraction.isEmpty()) {
      throw cursor.error(start, "expected a number such as 650 or 1.2e-3");
    }
    if (cursor.peek() == ',') {
      throw cursor.errorHere("a comma in a number: expected a point as decimal mark");
    }
    return new BigDecimal(sign + whole + "." + fraction + "0E" + exponent(cursor));
  }

  /** The power of ten; 0 if there is none, as in 5eV. */
  private static String exponent(TextCursor cursor) {
    int start = cursor.at();
    if (cursor.accept("e") || cursor.accept("E")) {
      String sign = cursor.acceptMinus() ? "-" : "";
      String digits = cursor.digits();
      if (digits.length() > EXPONENT_DIGITS) {
        throw cursor.error(start, "expected an exponent of at most 4 digits");
      }
      if (!digits.isEmpty()) {
        return sign + digits;
      }
    }
    cursor.backTo(start);
    return "0";
  }
}
