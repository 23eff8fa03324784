package pinchoff.page;

/**
 * The sentence under a result that says how well its formula applies there.
 *
 * @param standing whether it applies, is on the edge of doing so, or does not
 * @param text the sentence
 */
public record TrustLine(Standing standing, Phrase text) implements Block {}
