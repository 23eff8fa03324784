package pinchoff.kernel.notebook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Text that a file may hold as one string or as a list of pieces. Pieces keep their line ends; put
 * together without anything between them they are the text.
 */
final class MultilineText {
  /** What ends a line for the format's reference writer, beside the pair CR LF. */
  private static final String LINE_ENDS = "\n\r\u000b\u000c\u001c\u001d\u001e\u0085\u2028\u2029";

  private MultilineText() {}

  /** The text of a string or of a list of strings; empty if the value is neither. */
  static Optional<String> join(@Nullable Object value) {
    if (value instanceof String s) {
      return Optional.of(s);
    }
    if (!(value instanceof List<?> pieces)) {
      return Optional.empty();
    }
    StringBuilder text = new StringBuilder();
    for (Object piece : pieces) {
      if (!(piece instanceof String s)) {
        return Optional.empty();
      }
      text.append(s);
    }
    return Optional.of(text.toString());
  }

  /** The text cut after each line end. */
  static List<String> split(String text) {
    List<String> lines = new ArrayList<>();
    int start = 0;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      boolean pair = c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n';
      if (!pair && LINE_ENDS.indexOf(c) >= 0) {
        lines.add(text.substring(start, i + 1));
        start = i + 1;
      }
    }
    if (start < text.length()) {
      lines.add(text.substring(start));
    }
    return lines;
  }
}
