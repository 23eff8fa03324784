package pinchoff.device;

/**
 * Something that must be said beside a result.
 *
 * @param id tells it from others of the same result, the same from run to run
 * @param text the sentence
 */
public record Caution(String id, String text) {}
