package pinchoff.kernel.eval;

import java.lang.reflect.Array;
import java.util.Collection;
import java.util.Iterator;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.BaseStream;
import org.jspecify.annotations.Nullable;
import pinchoff.display.Displayable;

/** Values as plain text, much as Java writes them, but arrays too, and no longer than readable. */
final class ValueText {
  static final int MAX_ELEMENTS = 500;
  private static final int MAX_CHARACTERS = 100_000;
  private static final int MAX_DEPTH = 8;

  private final StringBuilder text = new StringBuilder();

  private ValueText() {}

  /** The text of a value, cut with a note when it is long. */
  static String of(@Nullable Object value) {
    ValueText writer = new ValueText();
    writer.append(value, 0);
    return cut(writer.text.toString());
  }

  private static String cut(String text) {
    if (text.length() <= MAX_CHARACTERS) {
      return text;
    }
    int end =
        Character.isHighSurrogate(text.charAt(MAX_CHARACTERS - 1))
            ? MAX_CHARACTERS - 1
            : MAX_CHARACTERS;
    return text.substring(0, end)
        + "\n… cut here: "
        + (text.length() - end)
        + " more characters. System.out.println(…) shows all.";
  }

  private void append(@Nullable Object value, int depth) {
    if (depth > MAX_DEPTH) {
      text.append("…");
    } else if (value instanceof Displayable d) {
      text.append(guarded(() -> d.display().plainText(), d));
    } else if (value instanceof Map<?, ?> map) {
      appendAll(map.entrySet().iterator(), map.size(), "{", "}", depth);
    } else if (value instanceof Map.Entry<?, ?> entry) {
      append(entry.getKey(), depth + 1);
      text.append('=');
      append(entry.getValue(), depth + 1);
    } else if (value instanceof Collection<?> collection) {
      appendAll(collection.iterator(), collection.size(), "[", "]", depth);
    } else if (value != null && value.getClass().isArray()) {
      appendArray(value, depth);
    } else if (value instanceof BaseStream<?, ?>) {
      text.append("a stream that has not run: end it with .toList(), .sum() or the like");
    } else {
      text.append(guarded(() -> String.valueOf(value), value));
    }
  }

  private void appendArray(Object array, int depth) {
    Iterator<@Nullable Object> elements =
        new Iterator<>() {
          private int next;

          @Override
          public boolean hasNext() {
            return next < Array.getLength(array);
          }

          @Override
          public @Nullable Object next() {
            return Array.get(array, next++);
          }
        };
    appendAll(elements, Array.getLength(array), "[", "]", depth);
  }

  private void appendAll(
      Iterator<? extends @Nullable Object> elements,
      int size,
      String open,
      String close,
      int depth) {
    text.append(open);
    for (int i = 0; elements.hasNext(); i++) {
      if (i > 0) {
        text.append(", ");
      }
      if (i == MAX_ELEMENTS || text.length() > MAX_CHARACTERS) {
        text.append("… ").append(size - i).append(" more of ").append(size);
        break;
      }
      append(elements.next(), depth + 1);
    }
    text.append(close);
  }

  /** User code that fails must not take the whole value with it. */
  static String guarded(Supplier<@Nullable String> user, @Nullable Object value) {
    String type = value == null ? "null" : value.getClass().getName();
    try {
      String said = user.get();
      return said == null ? "null" : said;
    } catch (CellInterrupted e) {
      throw e;
    } catch (RuntimeException | StackOverflowError | LinkageError e) {
      return type + " (its text cannot be had: " + e.getClass().getSimpleName() + ")";
    }
  }
}
