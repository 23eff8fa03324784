package pinchoff.kernel.eval;

/**
 * Java source with its comments and the insides of its literals blanked, for looking at the text
 * without being misled by them. Offsets and line breaks stay.
 */
final class JavaText {
  private final String code;
  private final char[] masked;
  private int at;

  private JavaText(String code) {
    this.code = code;
    this.masked = code.toCharArray();
  }

  /** Comments become spaces, the characters inside literals become underscores. */
  static String masked(String code) {
    JavaText text = new JavaText(code);
    text.scan();
    return new String(text.masked);
  }

  /** The last character that is neither space nor comment, or 0 if there is none. */
  static char lastOf(String code) {
    String text = masked(code).stripTrailing();
    return text.isEmpty() ? 0 : text.charAt(text.length() - 1);
  }

  private void scan() {
    while (at < code.length()) {
      if (code.startsWith("//", at)) {
        int end = code.indexOf('\n', at);
        blank(end < 0 ? code.length() : end, ' ');
      } else if (code.startsWith("/*", at)) {
        int end = code.indexOf("*/", at + 2);
        blank(end < 0 ? code.length() : end + 2, ' ');
      } else if (code.startsWith("\"\"\"", at)) {
        at += 3;
        blank(endOfLiteral("\"\"\"", true), '_');
        at += 3;
      } else if (code.charAt(at) == '"' || code.charAt(at) == '\'') {
        String quote = code.substring(at, at + 1);
        at++;
        blank(endOfLiteral(quote, false), '_');
        at++;
      } else {
        at++;
      }
    }
  }

  private int endOfLiteral(String quote, boolean overLines) {
    for (int i = at; i < code.length(); i++) {
      if (code.charAt(i) == '\\') {
        i++;
      } else if (code.startsWith(quote, i) || (!overLines && code.charAt(i) == '\n')) {
        return i;
      }
    }
    return code.length();
  }

  private void blank(int end, char with) {
    for (; at < end; at++) {
      if (masked[at] != '\n') {
        masked[at] = with;
      }
    }
  }
}
