package pinchoff.page;

/** The heading of what follows it, one level below the page's title. */
public record Heading(Phrase text) implements Block {}
