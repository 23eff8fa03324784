package pinchoff.page;

/**
 * The outcome of a check on a line of its own.
 *
 * @param subject what was checked; may be empty
 * @param verdict how it came out
 */
public record VerdictBlock(Phrase subject, Verdict verdict) implements Block {}
