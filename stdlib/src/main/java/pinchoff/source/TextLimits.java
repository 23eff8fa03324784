package pinchoff.source;

import java.util.Optional;

/**
 * How much of a text from outside is accepted. Readers check the length before anything else, and
 * the depth while they descend, so that no input can exhaust memory or the stack.
 *
 * @param length the most UTF-16 units
 * @param depth the deepest nesting of brackets, objects and the like
 */
public record TextLimits(int length, int depth) {

  /** A quantity or a unit: 256 characters, 16 levels. */
  public static final TextLimits QUANTITY = new TextLimits(256, 16);

  /** A formula or a block of formulas: 64 Ki characters, 64 levels. */
  public static final TextLimits FORMULA = new TextLimits(1 << 16, 64);

  /** A technology file: 4 Mi characters, 32 levels. */
  public static final TextLimits FILE = new TextLimits(1 << 22, 32);

  /** Checks that both limits are positive. */
  public TextLimits {
    if (length < 1 || depth < 1) {
      throw new IllegalArgumentException(
          "length limit " + length + ", depth limit " + depth + ": expected 1 or more");
    }
  }

  /**
   * The issue that the text is too long, at the first place beyond the limit; empty if it is not.
   */
  public Optional<Issue> checkLength(SourceText source) {
    int actual = source.text().length();
    return actual <= length
        ? Optional.empty()
        : Optional.of(
            Issue.error(
                source.span(length, length),
                "text of " + actual + " characters: expected at most " + length));
  }

  /** The issue that a place is nested too deeply; empty if it is not. */
  public Optional<Issue> checkDepth(int actual, SourceSpan span) {
    return actual <= depth
        ? Optional.empty()
        : Optional.of(Issue.error(span, "nested more than " + depth + " levels deep"));
  }
}
