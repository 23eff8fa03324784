package pinchoff.source;

import java.util.Arrays;

/**
 * A text with a name, and where its lines begin. A line ends with a line feed, a carriage return,
 * or both.
 */
public final class SourceText {
  private final String name;
  private final String text;
  private final int[] lineStarts;

  private SourceText(String name, String text) {
    this.name = name;
    this.text = text;
    this.lineStarts = lineStarts(text);
  }

  /**
   * Names a text.
   *
   * @param name what a reader of an issue knows it by: a file's name, or {@code "quantity"}
   * @param text the text, taken as it is
   */
  public static SourceText of(String name, String text) {
    return new SourceText(name, text);
  }

  /** What a reader of an issue knows this text by. */
  public String name() {
    return name;
  }

  /** The whole text. */
  public String text() {
    return text;
  }

  /** The number of lines, at least 1. */
  public int lines() {
    return lineStarts.length;
  }

  /**
   * One line without its end.
   *
   * @param line from 1
   * @throws IndexOutOfBoundsException if there is no such line
   */
  public String line(int line) {
    int start = lineStarts[line - 1];
    int end = line < lineStarts.length ? lineStarts[line] : text.length();
    while (end > start && isLineEnd(text.charAt(end - 1))) {
      end--;
    }
    return text.substring(start, end);
  }

  /**
   * The place at an offset.
   *
   * @param offset UTF-16 units, from 0 to the length of the text
   * @throws IndexOutOfBoundsException if the text is shorter
   */
  public Position position(int offset) {
    if (offset < 0 || offset > text.length()) {
      throw new IndexOutOfBoundsException(
          "offset " + offset + " in a text of length " + text.length());
    }
    int found = Arrays.binarySearch(lineStarts, offset);
    int index = found >= 0 ? found : -found - 2;
    return new Position(offset, index + 1, text.codePointCount(lineStarts[index], offset) + 1);
  }

  /**
   * The span between two offsets.
   *
   * @param start the first UTF-16 unit
   * @param end the one after the last
   */
  public SourceSpan span(int start, int end) {
    return new SourceSpan(position(start), position(end));
  }

  /** The name and the length. */
  @Override
  public String toString() {
    return name + " (" + text.length() + " characters)";
  }

  private static int[] lineStarts(String text) {
    int[] starts = new int[16];
    int count = 1;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      boolean first = c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n';
      if (isLineEnd(c) && !first) {
        if (count == starts.length) {
          starts = Arrays.copyOf(starts, count * 2);
        }
        starts[count++] = i + 1;
      }
    }
    return Arrays.copyOf(starts, count);
  }

  private static boolean isLineEnd(char c) {
    return c == '\n' || c == '\r';
  }
}
