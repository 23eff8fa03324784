package pinchoff.source;

/**
 * Parts of a text from outside, made harmless to show: on one line, of bounded length, without
 * characters that move the cursor, hide or reorder what follows, or are no characters at all. HTML
 * is not escaped here: that is done where HTML is written.
 */
public final class Excerpt {

  /** How many code points {@link #quote(String)} shows. */
  public static final int QUOTED = 60;

  private static final String CUT = "…";
  private static final int REPLACEMENT = 0xFFFD;

  private Excerpt() {}

  /** The text in double quotes, cut after {@value #QUOTED} code points. */
  public static String quote(String text) {
    return quote(text, QUOTED);
  }

  /**
   * The text in double quotes, cut after some code points.
   *
   * @param most how many code points to show
   */
  public static String quote(String text, int most) {
    return "\"" + clip(text, most) + "\"";
  }

  /**
   * The start of a text, with an ellipsis where it is cut.
   *
   * @param most how many code points to show
   */
  public static String clip(String text, int most) {
    StringBuilder out = new StringBuilder();
    int at = 0;
    for (int i = 0; i < most && at < text.length(); i++) {
      int c = text.codePointAt(at);
      out.appendCodePoint(harmless(c));
      at += Character.charCount(c);
    }
    return at < text.length() ? out.append(CUT).toString() : out.toString();
  }

  /** The code point itself if it is safe to show, else a blank or the replacement character. */
  static int harmless(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.SPACE_SEPARATOR -> ' ';
      case Character.CONTROL -> codePoint == '\t' ? ' ' : REPLACEMENT;
      case Character.FORMAT,
          Character.SURROGATE,
          Character.PRIVATE_USE,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          REPLACEMENT;
      default -> codePoint;
    };
  }
}
