package pinchoff.page;

import java.math.BigDecimal;
import java.util.Optional;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Unit;

/**
 * A number and its unit, apart, in the forms that the renderers need.
 *
 * @param number the digits, with a minus sign if negative and perhaps a power of ten: {@code -650},
 *     {@code 1.602e-19}
 * @param exact true if no digits were lost
 * @param unit the unit as text, empty for a pure number
 * @param unitHtml the unit as HTML
 * @param unitLatex the unit for the math mode of LaTeX
 */
record Figure(String number, boolean exact, String unit, String unitHtml, String unitLatex) {
  private static final int ALL_DIGITS = 13;
  private static final String CELSIUS = "°C";

  /** The figure of an entry that is a number. */
  static Optional<Figure> of(Entry entry) {
    if (entry instanceof Entry.Amount amount) {
      return Optional.of(of(amount.quantity(), amount.digits()));
    } else if (entry instanceof Entry.Count count) {
      return Optional.of(new Figure(Long.toString(count.number()), true, "", "", ""));
    } else if (entry instanceof Entry.Degrees degrees) {
      String text = degrees.temperature().toString();
      String number = text.substring(0, text.length() - CELSIUS.length()).strip();
      return Optional.of(new Figure(number, true, CELSIUS, CELSIUS, "\\mathrm{^{\\circ}C}"));
    }
    return Optional.empty();
  }

  /** A quantity with so many digits, without trailing zeros if these digits are all there is. */
  static Figure of(Quantity quantity, int digits) {
    Engineering rounded = Engineering.of(quantity, digits);
    Engineering full = Engineering.of(quantity, Math.max(digits, ALL_DIGITS));
    Unit unit = rounded.in();
    boolean exact =
        unit.equals(full.in())
            && new BigDecimal(rounded.number()).compareTo(new BigDecimal(full.number())) == 0;
    String number = exact ? withoutTrailingZeros(rounded.number()) : rounded.number();
    return new Figure(number, exact, unit.symbol(), unit.html(), unit.latex());
  }

  /** Number and unit: {@code 650 mV}. */
  String text() {
    return number + gap(" ") + unit;
  }

  /** The number as HTML, with a true minus sign and a raised power of ten. */
  String numberHtml() {
    String signed = number.replace('-', '−');
    int power = signed.indexOf('e');
    return power < 0
        ? signed
        : signed.substring(0, power) + "×10<sup>" + signed.substring(power + 1) + "</sup>";
  }

  /** Number and unit as HTML that does not break between them. */
  String html() {
    return numberHtml() + gap("&nbsp;") + unitHtml;
  }

  /** The number for the math mode of LaTeX. */
  String numberLatex() {
    int power = number.indexOf('e');
    return power < 0
        ? number
        : number.substring(0, power) + "\\times 10^{" + number.substring(power + 1) + "}";
  }

  /** Number and unit for the math mode of LaTeX. */
  String latex() {
    return numberLatex() + gap("\\,") + unitLatex;
  }

  /** The length of the number up to its decimal mark. */
  int wholeLength() {
    int mark = number.indexOf('.');
    return mark < 0 ? number.length() : mark;
  }

  /** The length of the number from its decimal mark on. */
  int fractionLength() {
    return number.length() - wholeLength();
  }

  /** The same figure with at least so many characters from the decimal mark on. */
  Figure padded(int fraction) {
    if (fraction <= fractionLength() || number.indexOf('e') >= 0) {
      return this;
    }
    String marked = number.indexOf('.') < 0 ? number + "." : number;
    String zeros = "0".repeat(wholeLength() + fraction - marked.length());
    return new Figure(marked + zeros, exact, unit, unitHtml, unitLatex);
  }

  private String gap(String space) {
    return unit.isEmpty() || unit.equals("°") ? "" : space;
  }

  private static String withoutTrailingZeros(String number) {
    int power = number.indexOf('e');
    String digits = power < 0 ? number : number.substring(0, power);
    String rest = power < 0 ? "" : number.substring(power);
    if (digits.indexOf('.') < 0) {
      return number;
    }
    int end = digits.length();
    while (digits.charAt(end - 1) == '0') {
      end--;
    }
    return digits.substring(0, digits.charAt(end - 1) == '.' ? end - 1 : end) + rest;
  }
}
