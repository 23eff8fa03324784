package pinchoff.page;

/**
 * Lines of text in letters of equal width, each as it is: a message that points at a column.
 *
 * @param text the lines
 */
public record Listing(String text) implements Block {}
