package pinchoff.page;

/** A paragraph. */
public record Prose(Phrase text) implements Block {}
