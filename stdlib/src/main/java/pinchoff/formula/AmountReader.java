package pinchoff.formula;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.QuantityException;
import pinchoff.quantity.Unit;

/**
 * Reads a number with the unit behind it. Space may stand between the number and its unit, but none
 * within the unit: {@code 1 V/V} is a pure number, {@code 1 V / V_X} a quotient.
 */
final class AmountReader {
  private static final int LONGEST_NUMBER = 40;
  private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻";

  private final Cursor cursor;

  AmountReader(Cursor cursor) {
    this.cursor = cursor;
  }

  Optional<Expression> read() {
    int start = cursor.at();
    int first = cursor.peek();
    boolean point = first == '.' && isDigit(cursor.peekNext());
    if (!isDigit(first) && !point) {
      return Optional.empty();
    }
    String number = number(start);
    int numberEnd = cursor.at();
    cursor.skipSpace();
    int unitStart = cursor.at();
    List<String> joined = new ArrayList<>();
    String unit = unit(joined);
    if (unit.isEmpty()) {
      cursor.goTo(numberEnd);
    }
    return Optional.of(
        new Expression.Amount(
            cursor.span(start),
            quantity(start, unitStart, number, unit),
            unit.isEmpty() ? number : number + " " + unit,
            joined));
  }

  private Quantity quantity(int start, int unitStart, String number, String unit) {
    try {
      double value = new BigDecimal(number).doubleValue();
      return unit.isEmpty()
          ? Quantity.ofSi(value, Dimension.NONE)
          : Quantity.parse(number + " " + unit);
    } catch (QuantityException refused) {
      throw cursor.refuse(
          unit.isEmpty() ? start : unitStart, cursor.at(), StatementReader.oneLine(refused));
    }
  }

  private String number(int start) {
    digits();
    if (cursor.peek() == '.') {
      cursor.advance();
      digits();
    }
    int mantissaEnd = cursor.at();
    if (cursor.peek() == 'e' || cursor.peek() == 'E') {
      cursor.advance();
      if (cursor.peek() == '+' || cursor.peek() == '-') {
        cursor.advance();
      }
      int exponentStart = cursor.at();
      digits();
      boolean word = Character.isLetter(cursor.peek()) || cursor.peek() == '_';
      if (cursor.at() == exponentStart || cursor.at() > exponentStart + 3 || word) {
        cursor.goTo(mantissaEnd);
      }
    }
    String number = cursor.from(start);
    if (number.length() > LONGEST_NUMBER) {
      throw cursor.refuse(
          start,
          cursor.at(),
          "a number of " + number.length() + " characters: expected at most " + LONGEST_NUMBER);
    }
    if (cursor.peek() == '.') {
      throw cursor.refuse(start, cursor.at() + 1, "a number with two decimal points");
    }
    return number;
  }

  private void digits() {
    while (isDigit(cursor.peek())) {
      cursor.advance();
    }
  }

  private static boolean isDigit(int c) {
    return c >= '0' && c <= '9';
  }

  /** The longest run of units here, or nothing. */
  private String unit(List<String> joined) {
    int start = cursor.at();
    if (factor().isEmpty()) {
      cursor.goTo(start);
      return "";
    }
    int end = cursor.at();
    while (cursor.peek() == '/' || cursor.peek() == '*' || cursor.peek() == '·') {
      boolean comment = cursor.peek() == '/' && cursor.peekNext() == '/';
      if (comment) {
        break;
      }
      cursor.advance();
      Optional<String> next = factor();
      if (next.isEmpty()) {
        break;
      }
      joined.add(next.get());
      end = cursor.at();
    }
    cursor.goTo(end);
    return cursor.from(start);
  }

  /** A unit with its exponent. */
  private Optional<String> factor() {
    int start = cursor.at();
    while (Name.isPart(cursor.peek()) || "µμΩ\u2126°%‰".indexOf(cursor.peek()) >= 0) {
      if (cursor.atEnd()) {
        break;
      }
      cursor.advance();
    }
    String name = cursor.from(start);
    if (name.isEmpty() || !isUnit(name)) {
      return Optional.empty();
    }
    exponent();
    return Optional.of(name);
  }

  private static boolean isUnit(String name) {
    if (name.equals("degC") || name.equals("°C")) {
      return true; // refused with its own reason when it is read
    }
    try {
      Unit.parse(name);
      return true;
    } catch (QuantityException no) {
      return false;
    }
  }

  private void exponent() {
    if (cursor.peek() == '^') {
      int caret = cursor.at();
      cursor.advance();
      if (cursor.peek() == '-') {
        cursor.advance();
      }
      if (cursor.peek() == '(') {
        while (!cursor.atEnd() && cursor.peek() != ')') {
          cursor.advance();
        }
        cursor.advance();
      } else if (isDigit(cursor.peek())) {
        digits();
        if (cursor.peek() == '.' && isDigit(cursor.peekNext())) {
          cursor.advance();
          digits();
        }
      } else {
        cursor.goTo(caret); // the exponent of the whole number
      }
    }
    while (!cursor.atEnd() && SUPERSCRIPTS.indexOf(cursor.peek()) >= 0) {
      cursor.advance();
    }
  }
}
