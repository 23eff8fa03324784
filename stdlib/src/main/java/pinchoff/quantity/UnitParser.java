package pinchoff.quantity;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.source.Excerpt;
import pinchoff.source.Issue;
import pinchoff.source.SourceText;
import pinchoff.source.TextLimits;

/** Reads units, and quantities as a number and a unit, by recursive descent. */
final class UnitParser {
  private static final TextLimits LIMITS = TextLimits.QUANTITY;
  private static final String DOTS = "*·\u22C5";

  private final SourceText source;
  private final String text;
  private int at;
  private int depth;

  private UnitParser(String name, String text) {
    this.source = SourceText.of(name, text);
    this.text = text;
    LIMITS
        .checkLength(source)
        .ifPresent(
            issue -> {
              throw new QuantityException(issue, source);
            });
  }

  static Unit unit(String text) {
    UnitParser parser = new UnitParser("unit", text);
    return parser.wholeUnit();
  }

  /** A number and a unit; without a unit a pure number. */
  static Quantity quantity(String text) {
    UnitParser parser = new UnitParser("quantity", text);
    parser.blanks();
    int start = parser.at;
    BigDecimal number = parser.number();
    int end = parser.at;
    parser.blanks();
    Unit unit = parser.atEnd() ? Unit.ONE : parser.wholeUnit();
    double si = unit.toSi(number);
    if (!Double.isFinite(si) || (si == 0 && number.signum() != 0)) {
      throw parser.error(
          start, end, "the number is out of range: expected about 1e-300 to 1e300 in SI");
    }
    return Quantity.shownIn(si, unit);
  }

  private Unit wholeUnit() {
    blanks();
    List<UnitFactor> factors = product();
    if (!atEnd()) {
      throw unexpected();
    }
    int start = 0;
    try {
      return Unit.of(factors);
    } catch (QuantityException tooLarge) {
      throw error(start, text.length(), tooLarge.getMessage());
    }
  }

  private List<UnitFactor> product() {
    List<UnitFactor> factors = new ArrayList<>(power());
    while (true) {
      blanks();
      if (atEnd()) {
        return factors;
      }
      char operator = text.charAt(at);
      if (operator != '/' && DOTS.indexOf(operator) < 0) {
        return factors;
      }
      at++;
      blanks();
      factors.addAll(operator == '/' ? raised(power(), -1, 1, at) : power());
    }
  }

  private List<UnitFactor> power() {
    if (accept("√")) {
      int start = at;
      List<UnitFactor> root = raised(primary(), 1, 2, start);
      if (!atEnd() && (text.charAt(at) == '^' || startsSuperscript())) {
        throw error(at, at + 1, "a power of a root: write √(V^2) or (√V)^2");
      }
      return root;
    }
    int start = at;
    List<UnitFactor> base = primary();
    if (accept("^")) {
      int parts = exponent();
      return raised(base, parts, Dimension.PARTS, start);
    }
    return startsSuperscript() ? raised(base, superscript(), 1, start) : base;
  }

  private List<UnitFactor> primary() {
    if (accept("(")) {
      List<UnitFactor> inner = group();
      return inner;
    }
    if (accept("sqrt(")) {
      int start = at;
      return raised(group(), 1, 2, start);
    }
    int start = at;
    if (accept("1")) {
      if (!atEnd() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
        throw bareNumber(start);
      }
      return List.of();
    }
    while (!atEnd() && isLetter(text.codePointAt(at))) {
      at += Character.charCount(text.codePointAt(at));
    }
    if (start == at) {
      throw !atEnd() && Character.isDigit(text.charAt(at)) ? bareNumber(start) : unexpected();
    }
    String symbol = text.substring(start, at);
    return List.of(UnitSymbols.find(symbol).orElseThrow(() -> unknown(symbol, start)));
  }

  private List<UnitFactor> group() {
    depth++;
    LIMITS
        .checkDepth(depth, source.span(at - 1, at))
        .ifPresent(
            issue -> {
              throw new QuantityException(issue, source);
            });
    blanks();
    List<UnitFactor> inner = product();
    if (!accept(")")) {
      throw error(at, at, "expected )");
    }
    depth--;
    return inner;
  }

  /** An exponent in sixtieths: 2, -1, 0.5, (1/3). */
  private int exponent() {
    int start = at;
    boolean bracket = accept("(");
    BigDecimal numerator = exponentNumber(start);
    BigDecimal denominator = BigDecimal.ONE;
    if (bracket) {
      denominator = accept("/") ? exponentNumber(start) : denominator;
      if (!accept(")")) {
        throw error(at, at, "expected ) after the exponent");
      }
    }
    if (denominator.signum() == 0) {
      throw error(start, at, "an exponent with the denominator 0");
    }
    BigDecimal[] parts =
        numerator.multiply(BigDecimal.valueOf(Dimension.PARTS)).divideAndRemainder(denominator);
    if (parts[1].signum() != 0 || parts[0].stripTrailingZeros().scale() > 0) {
      throw error(start, at, "expected an exponent that is a multiple of 1/" + Dimension.PARTS);
    }
    return parts[0].intValueExact();
  }

  private BigDecimal exponentNumber(int start) {
    int from = at;
    if (!accept("-") && !accept("\u2212")) {
      accept("+");
    }
    String sign = at > from && text.charAt(at - 1) != '+' ? "-" : "";
    String digits = digits() + (accept(".") ? "." + digits() : "");
    if (digits.isEmpty() || digits.startsWith(".") || digits.endsWith(".") || digits.length() > 6) {
      throw error(start, Math.max(at, start), "expected an exponent such as 2, -1, 0.5 or (1/3)");
    }
    return new BigDecimal(sign + digits);
  }

  private boolean startsSuperscript() {
    return !atEnd() && (text.charAt(at) == '⁻' || Exponent.superscriptDigit(text.charAt(at)) >= 0);
  }

  private int superscript() {
    int start = at;
    boolean negative = accept("⁻");
    int value = 0;
    int count = 0;
    while (!atEnd() && Exponent.superscriptDigit(text.charAt(at)) >= 0) {
      value = value * 10 + Exponent.superscriptDigit(text.charAt(at++));
      if (++count > 2) {
        throw error(start, at, "expected an exponent below 100");
      }
    }
    if (count == 0) {
      throw error(start, at, "expected digits after ⁻");
    }
    return negative ? -value : value;
  }

  private BigDecimal number() {
    int start = at;
    String sign = accept("-") || accept("\u2212") ? "-" : "";
    if (sign.isEmpty()) {
      accept("+");
    }
    String whole = digits();
    String fraction = accept(".") ? digits() : "";
    if (whole.isEmpty() && fraction.isEmpty()) {
      throw error(start, Math.max(at, start), "expected a number such as 650 or 1.2e-3");
    }
    if (!atEnd() && text.charAt(at) == ',') {
      throw error(at, at + 1, "a comma in a number: expected a point as decimal mark");
    }
    return new BigDecimal(sign + whole + "." + fraction + "0E" + exponentOfTen());
  }

  private String exponentOfTen() {
    int back = at;
    if (accept("e") || accept("E")) {
      String sign = accept("-") || accept("\u2212") ? "-" : "";
      if (sign.isEmpty()) {
        accept("+");
      }
      String digits = digits();
      if (digits.length() > 4) {
        throw error(back, at, "expected an exponent of at most 4 digits");
      }
      if (!digits.isEmpty()) {
        return sign + digits;
      }
    }
    at = back;
    return "0";
  }

  private String digits() {
    int start = at;
    while (!atEnd() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
      at++;
    }
    return text.substring(start, at);
  }

  private List<UnitFactor> raised(
      List<UnitFactor> base, int numerator, int denominator, int start) {
    try {
      return base.stream().map(factor -> factor.raisedTo(numerator, denominator)).toList();
    } catch (QuantityException refused) {
      throw error(start, at, refused.getMessage());
    }
  }

  private boolean accept(String expected) {
    boolean found = text.startsWith(expected, at);
    at += found ? expected.length() : 0;
    return found;
  }

  private void blanks() {
    while (!atEnd() && text.charAt(at) == ' ') {
      at++;
    }
  }

  private boolean atEnd() {
    return at >= text.length();
  }

  private static boolean isLetter(int c) {
    return Character.isLetter(c) || c == '%' || c == '°' || c == '□' || c == '\u2103';
  }

  private QuantityException unknown(String symbol, int start) {
    Optional<String> hint = UnitSymbols.hint(symbol);
    Issue issue =
        Issue.error(source.span(start, at), "unknown unit " + Excerpt.quote(symbol))
            .withSuggestion(hint);
    return new QuantityException(issue, source);
  }

  private QuantityException bareNumber(int start) {
    return error(
        start,
        Math.min(start + 1, text.length()),
        "a number inside a unit: expected a unit such as V, and a power as V^2 or V^(1/2)");
  }

  private QuantityException unexpected() {
    if (atEnd()) {
      return error(at, at, "expected a unit such as mV, uA/V^2 or V^0.5");
    }
    int c = text.codePointAt(at);
    return error(
        at,
        at + Character.charCount(c),
        "unexpected "
            + Excerpt.quote(Character.toString(c))
            + ": expected a unit, or * / ^ between units");
  }

  private QuantityException error(int start, int end, String message) {
    return new QuantityException(Issue.error(source.span(start, end), message), source);
  }
}
