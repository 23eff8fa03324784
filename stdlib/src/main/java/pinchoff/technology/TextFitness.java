package pinchoff.technology;

import java.util.Locale;
import java.util.Optional;

/** What makes a string no readable text: half a character, a control character. */
final class TextFitness {
  private TextFitness() {}

  /** The first half of a character pair that stands alone, or -1. */
  static int halfCharacter(String text) {
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (Character.isHighSurrogate(c)
          && i + 1 < text.length()
          && Character.isLowSurrogate(text.charAt(i + 1))) {
        i++;
      } else if (Character.isSurrogate(c)) {
        return i;
      }
    }
    return -1;
  }

  /** What is wrong with a text, or empty. */
  static Optional<String> fault(String text) {
    int half = halfCharacter(text);
    if (half >= 0) {
      return Optional.of("half a character, " + code(text, half) + ": expected both halves");
    }
    for (int i = 0; i < text.length(); i++) {
      if (Character.isISOControl(text.charAt(i))) {
        return Optional.of("the control character " + code(text, i) + ": expected none");
      }
    }
    return Optional.empty();
  }

  /** The code of the character at a place, as in {@code U+D800}. */
  static String code(String text, int at) {
    return String.format(Locale.ROOT, "U+%04X", (int) text.charAt(at));
  }
}
