package pinchoff.kernel.json;

/** Java strings can hold lone surrogates, UTF-8 cannot. */
final class WellFormed {
  private static final char REPLACEMENT = '\uFFFD';

  private WellFormed() {}

  /** The text with each lone surrogate replaced; the same object when there is none. */
  static String text(String text) {
    StringBuilder copy = null;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (!Character.isSurrogate(c)) {
        continue;
      }
      if (Character.isHighSurrogate(c)
          && i + 1 < text.length()
          && Character.isLowSurrogate(text.charAt(i + 1))) {
        i++;
        continue;
      }
      if (copy == null) {
        copy = new StringBuilder(text);
      }
      copy.setCharAt(i, REPLACEMENT);
    }
    return copy == null ? text : copy.toString();
  }
}
