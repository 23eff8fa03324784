package pinchoff.quantity;

import pinchoff.source.Issue;
import pinchoff.source.SourceText;
import pinchoff.source.TextLimits;

/** A place that moves through the text of a quantity or a unit. */
final class TextCursor {
  private static final TextLimits LIMITS = TextLimits.QUANTITY;

  private final SourceText source;
  private final String text;
  private int at;

  TextCursor(String name, String text) {
    this.source = SourceText.of(name, text);
    this.text = text;
    LIMITS.checkLength(source).ifPresent(this::refuse);
  }

  int at() {
    return at;
  }

  void backTo(int place) {
    at = place;
  }

  boolean atEnd() {
    return at >= text.length();
  }

  /** The code point here, or -1 at the end. */
  int peek() {
    return atEnd() ? -1 : text.codePointAt(at);
  }

  void skip() {
    at += Character.charCount(peek());
  }

  void blanks() {
    while (peek() == ' ') {
      at++;
    }
  }

  /** Moves past the expected text if it is here. */
  boolean accept(String expected) {
    boolean found = text.startsWith(expected, at);
    at += found ? expected.length() : 0;
    return found;
  }

  /** Moves past a sign; true if it is a minus. */
  boolean acceptMinus() {
    boolean minus = accept("-") || accept("\u2212");
    if (!minus) {
      accept("+");
    }
    return minus;
  }

  boolean atDigit() {
    return peek() >= '0' && peek() <= '9';
  }

  /** Moves past ASCII digits. */
  String digits() {
    int start = at;
    while (atDigit()) {
      at++;
    }
    return since(start);
  }

  String since(int start) {
    return text.substring(start, at);
  }

  void checkDepth(int depth) {
    LIMITS.checkDepth(depth, source.span(at - 1, at)).ifPresent(this::refuse);
  }

  /** The fault from a place up to here. */
  QuantityException error(int start, String message) {
    return error(start, at, message);
  }

  QuantityException error(int start, int end, String message) {
    return exception(Issue.error(source.span(start, Math.max(start, end)), message));
  }

  /** The fault of the character here, or of the end of the text. */
  QuantityException errorHere(String message) {
    return error(at, atEnd() ? at : at + Character.charCount(peek()), message);
  }

  QuantityException exception(Issue issue) {
    return new QuantityException(issue, source);
  }

  private void refuse(Issue issue) {
    throw exception(issue);
  }
}
