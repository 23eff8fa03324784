package pinchoff.kernel.notebook;

/** What remains visible of printed text after its carriage returns. */
final class TerminalText {
  private static final char ESCAPE = '\u001b';

  private TerminalText() {}

  /**
   * Applies the carriage returns of a text: what follows one overwrites the line from its start,
   * and one just before a line end does nothing. A colour code has no width, so a line that holds
   * one is replaced as a whole.
   */
  static String settle(String text) {
    if (text.indexOf('\r') < 0) {
      return text;
    }
    StringBuilder settled = new StringBuilder(text.length());
    int start = 0;
    while (start < text.length()) {
      int end = text.indexOf('\n', start);
      int stop = end < 0 ? text.length() : end;
      appendLine(settled, text.substring(start, stop));
      if (end >= 0) {
        settled.append('\n');
      }
      start = stop + 1;
    }
    return settled.toString();
  }

  private static void appendLine(StringBuilder out, String line) {
    String visible = "";
    for (String part : line.split("\r", -1)) {
      if (part.isEmpty()) {
        continue;
      }
      boolean covers = part.length() >= visible.length();
      visible =
          covers || visible.indexOf(ESCAPE) >= 0 || part.indexOf(ESCAPE) >= 0
              ? part
              : part + visible.substring(part.length());
    }
    out.append(visible);
  }
}
