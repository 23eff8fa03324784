package pinchoff.page;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A sentence of text, symbols, quantities and verdicts.
 *
 * @param entries its parts in order; spaces between them are part of the text
 */
public record Phrase(List<Entry> entries) {

  private static final String PLACE = "{}";

  /** Copies the entries. */
  public Phrase {
    entries = List.copyOf(entries);
  }

  /**
   * A sentence with places to fill: {@code Phrase.of("{} is in saturation by {}", name, margin)}.
   *
   * @param template the text; each <code>{}</code> is a place for the next argument
   * @param arguments what {@link Entry#from} accepts
   * @throws IllegalArgumentException if there are not as many arguments as places, or one of them
   *     cannot be shown
   */
  public static Phrase of(String template, Object... arguments) {
    List<Entry> entries = new ArrayList<>();
    int from = 0;
    int used = 0;
    for (int at = template.indexOf(PLACE); at >= 0; at = template.indexOf(PLACE, from)) {
      if (used == arguments.length) {
        throw mismatch(template, arguments);
      }
      addText(entries, template.substring(from, at));
      entries.add(Entry.from(arguments[used++]));
      from = at + PLACE.length();
    }
    if (used < arguments.length) {
      throw mismatch(template, arguments);
    }
    addText(entries, template.substring(from));
    return new Phrase(entries);
  }

  /** A sentence of plain text, in which braces mean nothing. */
  public static Phrase plain(String text) {
    return new Phrase(List.of(new Entry.Words(text)));
  }

  /** A sentence of one symbol. */
  public static Phrase of(Symbol symbol) {
    return new Phrase(List.of(Entry.of(symbol)));
  }

  /** True if there is nothing in it to show. */
  public boolean isEmpty() {
    return entries.stream().allMatch(Entry.EMPTY::equals);
  }

  /** The sentence as plain text. */
  public String text() {
    return PlainEntries.text(this);
  }

  @Override
  public String toString() {
    return text();
  }

  private static void addText(List<Entry> entries, String text) {
    if (!text.isEmpty()) {
      entries.add(new Entry.Words(text));
    }
  }

  private static IllegalArgumentException mismatch(String template, Object... arguments) {
    return new IllegalArgumentException(
        "the sentence \""
            + template
            + "\" has "
            + (template.split("\\{\\}", -1).length - 1)
            + " places, found "
            + arguments.length
            + " arguments: "
            + Arrays.toString(arguments));
  }
}
