package pinchoff.quantity;

import java.math.BigDecimal;

/** Reads a number with a unit, and an absolute temperature. */
final class QuantityParser {

  private QuantityParser() {}

  /** Without a unit, a pure number. */
  static Quantity quantity(String text) {
    TextCursor cursor = new TextCursor("quantity", text);
    cursor.blanks();
    int start = cursor.at();
    BigDecimal number = NumberReader.read(cursor);
    int end = cursor.at();
    cursor.blanks();
    Unit unit = cursor.atEnd() ? Unit.ONE : UnitParser.rest(cursor);
    double si = unit.toSi(number);
    if (!Double.isFinite(si) || (si == 0 && number.signum() != 0)) {
      throw cursor.error(
          start, end, "the number is out of range: expected about 1e-300 to 1e300 in SI");
    }
    return Quantity.shownIn(si, unit);
  }

  static Temperature temperature(String text) {
    TextCursor cursor = new TextCursor("temperature", text);
    cursor.blanks();
    int start = cursor.at();
    double number = NumberReader.read(cursor).doubleValue();
    cursor.blanks();
    boolean celsius = cursor.accept("degC") || cursor.accept("°C") || cursor.accept("\u2103");
    if (!celsius && !cursor.accept("K")) {
      throw cursor.errorHere("expected degC or K after the number");
    }
    cursor.blanks();
    if (!cursor.atEnd()) {
      throw cursor.errorHere("expected nothing after the unit of a temperature");
    }
    try {
      return celsius ? Temperature.ofCelsius(number) : Temperature.ofKelvin(number);
    } catch (QuantityException refused) {
      throw cursor.error(start, refused.getMessage());
    }
  }
}
