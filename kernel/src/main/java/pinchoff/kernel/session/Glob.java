package pinchoff.kernel.session;

/** Patterns with {@code *} for any text and {@code ?} for any one character. */
final class Glob {

  private Glob() {}

  /**
   * Whether the whole text fits the pattern. Takes at most pattern length times text length steps,
   * whatever the pattern: only the last star ever has to be tried again.
   */
  static boolean matches(String pattern, String text) {
    int p = 0;
    int t = 0;
    int star = -1;
    int resume = 0;
    while (t < text.length()) {
      if (p < pattern.length() && pattern.charAt(p) == '*') {
        star = p++;
        resume = t;
      } else if (p < pattern.length()
          && (pattern.charAt(p) == '?' || pattern.charAt(p) == text.charAt(t))) {
        p++;
        t++;
      } else if (star >= 0) {
        p = star + 1;
        t = ++resume;
      } else {
        return false;
      }
    }
    while (p < pattern.length() && pattern.charAt(p) == '*') {
      p++;
    }
    return p == pattern.length();
  }
}
