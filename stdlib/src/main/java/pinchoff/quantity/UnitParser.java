package pinchoff.quantity;

import java.util.ArrayList;
import java.util.List;
import pinchoff.source.Excerpt;
import pinchoff.source.Issue;

/** Reads units by recursive descent: products of powers of symbols and groups. */
final class UnitParser {
  private static final String DOTS = "*·\u22C5";
  private static final String NO_LETTERS = "%°□\u2103";

  private final TextCursor cursor;
  private int depth;

  private UnitParser(TextCursor cursor) {
    this.cursor = cursor;
  }

  static Unit unit(String text) {
    return rest(new TextCursor("unit", text));
  }

  /** The unit that is the rest of the text. */
  static Unit rest(TextCursor cursor) {
    cursor.blanks();
    int start = cursor.at();
    UnitParser parser = new UnitParser(cursor);
    List<UnitFactor> factors = parser.product();
    if (!cursor.atEnd()) {
      throw parser.unexpected();
    }
    try {
      return Unit.of(factors);
    } catch (QuantityException tooLarge) {
      throw cursor.error(start, tooLarge.getMessage());
    }
  }

  private List<UnitFactor> product() {
    List<UnitFactor> factors = new ArrayList<>(power());
    cursor.blanks();
    while (cursor.peek() == '/' || (!cursor.atEnd() && DOTS.indexOf(cursor.peek()) >= 0)) {
      boolean divided = cursor.peek() == '/';
      cursor.skip();
      cursor.blanks();
      int start = cursor.at();
      List<UnitFactor> next = power();
      factors.addAll(divided ? raised(next, -Dimension.PARTS, start) : next);
      cursor.blanks();
    }
    return factors;
  }

  private List<UnitFactor> power() {
    int start = cursor.at();
    if (cursor.accept("√")) {
      List<UnitFactor> root = raised(primary(), Dimension.PARTS / 2, start);
      if (cursor.peek() == '^' || ExponentReader.atSuperscript(cursor)) {
        throw cursor.errorHere("a power of a root: write √(V^2) or (√V)^2");
      }
      return root;
    }
    List<UnitFactor> base = primary();
    if (cursor.accept("^")) {
      return raised(base, ExponentReader.read(cursor), start);
    }
    return ExponentReader.atSuperscript(cursor)
        ? raised(base, ExponentReader.superscript(cursor), start)
        : base;
  }

  private List<UnitFactor> primary() {
    int start = cursor.at();
    if (cursor.accept("(")) {
      return group();
    }
    if (cursor.accept("sqrt(")) {
      return raised(group(), Dimension.PARTS / 2, start);
    }
    if (cursor.accept("1") && !cursor.atDigit() && cursor.peek() != '.') {
      return List.of();
    }
    cursor.backTo(start);
    while (Character.isLetter(cursor.peek()) || NO_LETTERS.indexOf(cursor.peek()) >= 0) {
      cursor.skip();
    }
    if (start == cursor.at()) {
      throw unexpected();
    }
    String symbol = cursor.since(start);
    return List.of(UnitSymbols.find(symbol).orElseThrow(() -> unknown(symbol, start)));
  }

  private List<UnitFactor> group() {
    cursor.checkDepth(++depth);
    cursor.blanks();
    List<UnitFactor> inner = product();
    if (!cursor.accept(")")) {
      throw cursor.errorHere("expected )");
    }
    depth--;
    return inner;
  }

  private List<UnitFactor> raised(List<UnitFactor> base, int parts, int start) {
    try {
      return base.stream().map(factor -> factor.raisedTo(parts)).toList();
    } catch (QuantityException refused) {
      throw cursor.error(start, refused.getMessage());
    }
  }

  private QuantityException unknown(String symbol, int start) {
    QuantityException fault = cursor.error(start, "unknown unit " + Excerpt.quote(symbol));
    Issue issue = fault.issue().orElseThrow().withSuggestion(UnitSymbols.hint(symbol));
    return cursor.exception(issue);
  }

  private QuantityException unexpected() {
    if (cursor.atEnd()) {
      return cursor.errorHere("expected a unit such as mV, uA/V^2 or V^0.5");
    }
    if (cursor.atDigit()) {
      return cursor.errorHere(
          "a number inside a unit: expected a unit such as V, and a power as V^2 or V^(1/2)");
    }
    String found = Excerpt.quote(Character.toString(cursor.peek()));
    return cursor.errorHere("unexpected " + found + ": expected units joined by * or /");
  }
}
