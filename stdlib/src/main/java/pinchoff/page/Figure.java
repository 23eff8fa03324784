package pinchoff.page;

import java.math.BigDecimal;
import java.util.Optional;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Unit;

/**
 * A number and its unit, apart, in the forms that the renderers need.
 *
 * @param digits the digits with a minus sign if negative, as many as tell the value: {@code -650}
 * @param rounded the same with trailing zeros up to the digits asked for: {@code -650.0}
 * @param exact true if no digits were lost
 * @param power the power of ten behind the digits, nearly always 0
 * @param unit the unit
 */
record Figure(String digits, String rounded, boolean exact, int power, Forms unit) {
  private static final int ALL_DIGITS = 13;

  /** A unit as text, as HTML and for the math mode of LaTeX; all empty for a pure number. */
  record Forms(String text, String html, String latex) {
    private static final Forms NONE = new Forms("", "", "");
    private static final Forms CELSIUS = new Forms("°C", "°C", "\\mathrm{^{\\circ}C}");

    static Forms of(Unit unit) {
      return new Forms(unit.symbol(), unit.html(), unit.latex());
    }

    /** True if a space stands before it. */
    boolean isApart() {
      return !text.isEmpty() && !text.equals("°");
    }
  }

  /** The figure of an entry that is a number. */
  static Optional<Figure> of(Entry entry) {
    if (entry instanceof Entry.Amount amount) {
      return Optional.of(of(amount.quantity(), amount.digits()));
    } else if (entry instanceof Entry.Count count) {
      return Optional.of(plain(Long.toString(count.number()), Forms.NONE));
    } else if (entry instanceof Entry.Degrees degrees) {
      String text = degrees.temperature().toString();
      return Optional.of(plain(text.substring(0, text.indexOf(' ')), Forms.CELSIUS));
    }
    return Optional.empty();
  }

  private static Figure plain(String number, Forms unit) {
    return new Figure(number, number, true, 0, unit);
  }

  /** A quantity with so many digits, without trailing zeros if these digits are all there is. */
  static Figure of(Quantity quantity, int digits) {
    Engineering shown = Engineering.of(quantity, digits);
    Engineering full = Engineering.of(quantity, Math.max(digits, ALL_DIGITS));
    boolean exact =
        shown.in().equals(full.in())
            && new BigDecimal(shown.number()).compareTo(new BigDecimal(full.number())) == 0;
    String number = shown.number();
    int mark = number.indexOf('e');
    String rounded = mark < 0 ? number : number.substring(0, mark);
    int power = mark < 0 ? 0 : Integer.parseInt(number.substring(mark + 1));
    String shortest = exact ? withoutTrailingZeros(rounded) : rounded;
    return new Figure(shortest, rounded, exact, power, Forms.of(shown.in()));
  }

  private static String withoutTrailingZeros(String number) {
    if (number.indexOf('.') < 0) {
      return number;
    }
    int end = number.length();
    while (number.charAt(end - 1) == '0') {
      end--;
    }
    return number.substring(0, number.charAt(end - 1) == '.' ? end - 1 : end);
  }

  /** Number and unit: {@code 650 mV}, {@code 1.602e-19 A}. */
  String text() {
    return digits + behindText();
  }

  /** What stands behind the digits as text: power of ten and unit. */
  String behindText() {
    return (power == 0 ? "" : "e" + power) + (unit.isApart() ? " " : "") + unit.text();
  }

  /** The digits with a true minus sign. */
  String signedDigits() {
    return digits.replace('-', '−');
  }

  /** The power of ten and the unit as HTML. */
  String behindHtml() {
    String raised =
        power == 0 ? "" : "×10<sup>" + Integer.toString(power).replace('-', '−') + "</sup>";
    return raised + (power != 0 && unit.isApart() ? "&nbsp;" : "") + unit.html();
  }

  /** Number and unit as HTML that does not break between them. */
  String html() {
    return signedDigits() + (power == 0 && unit.isApart() ? "&nbsp;" : "") + behindHtml();
  }

  /** The power of ten and the unit for the math mode of LaTeX. */
  String behindLatex() {
    String raised = power == 0 ? "" : "\\times 10^{" + power + "}";
    return raised + (power != 0 && unit.isApart() ? "\\," : "") + unit.latex();
  }

  /** Number and unit for the math mode of LaTeX. */
  String latex() {
    return digits + (power == 0 && unit.isApart() ? "\\," : "") + behindLatex();
  }

  /** The digits before the decimal mark. */
  String whole() {
    int mark = digits.indexOf('.');
    return mark < 0 ? digits : digits.substring(0, mark);
  }

  /** The digits from the decimal mark on; empty if there is none. */
  String fraction() {
    return digits.substring(whole().length());
  }

  /** The same figure with zeros up to a length from the decimal mark on. */
  Figure padded(int length) {
    int missing = length - fraction().length();
    if (missing <= 0) {
      return this;
    }
    String marked = fraction().isEmpty() ? digits + "." : digits;
    String zeros = "0".repeat(fraction().isEmpty() ? missing - 1 : missing);
    return new Figure(marked + zeros, rounded, exact, power, unit);
  }

  /** The same figure with all the digits asked for. */
  Figure inFull() {
    return new Figure(rounded, rounded, exact, power, unit);
  }
}
