package pinchoff.kernel.cli;

import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/** Makes text from outside fit for a terminal: a file's name or a cell's output cannot steer it. */
final class Printable {
  private static final Pattern COLOUR = Pattern.compile("\u001b\\[[0-9;:?]*[ -/]*[@-~]");

  private Printable() {}

  /** Text of several lines without colour codes and control characters. */
  static String text(String text) {
    StringBuilder clean = new StringBuilder(text.length());
    COLOUR
        .matcher(text)
        .replaceAll("")
        .chars()
        .forEach(
            c -> {
              if (c == '\n' || c == '\t' || !Character.isISOControl(c)) {
                clean.append((char) c);
              }
            });
    return clean.toString();
  }

  /** Text of one line. */
  static String line(@Nullable String text) {
    return text == null ? "" : text(text).replace('\n', ' ').strip();
  }
}
