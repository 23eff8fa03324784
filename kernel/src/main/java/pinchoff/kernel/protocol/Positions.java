package pinchoff.kernel.protocol;

/**
 * Places in a text: the protocol counts Unicode code points, Java counts UTF-16 units. Places
 * outside of the text are moved to its nearest end.
 */
public final class Positions {

  private Positions() {}

  /** Code points to UTF-16 units. */
  public static int toUtf16(String text, int codePoints) {
    int length = text.codePointCount(0, text.length());
    return text.offsetByCodePoints(0, Math.max(0, Math.min(codePoints, length)));
  }

  /** UTF-16 units to code points. */
  public static int toCodePoints(String text, int utf16) {
    return text.codePointCount(0, Math.max(0, Math.min(utf16, text.length())));
  }
}
