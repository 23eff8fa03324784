package pinchoff.kernel.eval;

import java.util.List;

/**
 * What could be typed at a place.
 *
 * @param start start of the text to replace, in UTF-16 units
 * @param end its end
 * @param items the suggestions, best first
 */
public record Completions(int start, int end, List<Item> items) {

  /** Copies the items. */
  public Completions {
    items = List.copyOf(items);
  }

  /**
   * One suggestion.
   *
   * @param text what would be inserted
   * @param type kind of thing: function, class, instance, keyword, …
   * @param signature parameters and result for the reader; may be empty
   */
  public record Item(String text, String type, String signature) {}
}
