package pinchoff.kernel.wire;

/** Frames that are no acceptable message, with the reason in words for a log line. */
public final class WireException extends Exception {
  private static final int LONGEST = 300;

  /** Made with the reason; control characters are replaced, for the text may come from outside. */
  public WireException(String reason) {
    super(printable(reason));
  }

  /** A text from outside as one short line that cannot forge another. */
  public static String printable(String text) {
    StringBuilder line = new StringBuilder();
    text.codePoints()
        .limit(LONGEST)
        .map(c -> c < ' ' || (c >= 0x7f && c < 0xa0) || c == 0x2028 || c == 0x2029 ? '?' : c)
        .forEach(line::appendCodePoint);
    return line.toString();
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
