package pinchoff.formula;

import java.util.Optional;
import pinchoff.source.Excerpt;
import pinchoff.source.Issue;
import pinchoff.source.SourceSpan;
import pinchoff.source.SourceText;

/** A place in one line of a text that moves on as the line is read. */
final class Cursor {
  private final SourceText source;
  private final String text;
  private final int end;
  private int at;

  Cursor(SourceText source, int start, int end) {
    this.source = source;
    this.text = source.text();
    this.end = end;
    this.at = start;
  }

  int at() {
    return at;
  }

  void goTo(int place) {
    at = place;
  }

  void skipSpace() {
    while (at < end && (Character.isWhitespace(peek()) || peek() == '\u00a0')) {
      at += Character.charCount(peek());
    }
  }

  boolean atEnd() {
    return at >= end;
  }

  /** The code point here, or 0 at the end. */
  int peek() {
    return at < end ? text.codePointAt(at) : 0;
  }

  /** The character after this one, or 0. */
  int peekNext() {
    int next = at + Character.charCount(peek());
    return at < end && next < end ? text.codePointAt(next) : 0;
  }

  void advance() {
    at += Character.charCount(peek());
  }

  /** Takes a sign, after any space. */
  boolean take(String sign) {
    skipSpace();
    if (at + sign.length() <= end && text.startsWith(sign, at)) {
      at += sign.length();
      return true;
    }
    return false;
  }

  /** Takes a word that is not the start of a longer one, after any space. */
  boolean takeWord(String word) {
    skipSpace();
    int start = at;
    if (take(word) && !Name.isPart(peek())) {
      return true;
    }
    at = start;
    return false;
  }

  /** Takes a name, after any space. */
  Optional<Expression.Named> takeName() {
    skipSpace();
    if (!Name.isStart(peek())) {
      return Optional.empty();
    }
    int start = at;
    while (at < end && Name.isPart(peek())) {
      advance();
    }
    String name = text.substring(start, at);
    if (!Name.isValid(name)) {
      throw refuse(start, at, "a name of " + name.length() + " characters: expected at most 64");
    }
    return Optional.of(new Expression.Named(source.span(start, at), name));
  }

  String from(int start) {
    return text.substring(start, at);
  }

  SourceSpan span(int start) {
    return source.span(start, at);
  }

  SourceSpan span(int start, int stop) {
    return source.span(start, stop);
  }

  Refused refuse(int start, int stop, String message) {
    return new Refused(Issue.error(source.span(start, Math.max(start, stop)), message));
  }

  /** The refusal of what stands here. */
  Refused expected(String what) {
    skipSpace();
    if (atEnd()) {
      return refuse(at, at, "the line ends here: expected " + what);
    }
    String found = new String(Character.toChars(peek()));
    return refuse(at, at + found.length(), "found " + Excerpt.quote(found) + ": expected " + what);
  }
}
