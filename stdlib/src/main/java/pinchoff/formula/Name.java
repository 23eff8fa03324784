package pinchoff.formula;

import pinchoff.page.Symbol;

/** How names of quantities are spelled and compared. */
public final class Name {
  private static final int LONGEST = 64;

  private Name() {}

  /** The spelling that all equal names share: {@code lambda} and {@code λ} are one name. */
  public static String canonical(String written) {
    return Symbol.of(written).text().replace('\u2032', '\'');
  }

  /** True if a formula can use this name. */
  public static boolean isValid(String name) {
    return !name.isEmpty()
        && name.length() <= LONGEST
        && isStart(name.codePointAt(0))
        && name.codePoints().allMatch(Name::isPart);
  }

  static boolean isStart(int c) {
    return Character.isLetter(c) && c != 'Ω' && c != 'µ' && c != '\u2126';
  }

  static boolean isPart(int c) {
    return Character.isLetter(c)
        || (c >= '0' && c <= '9')
        || c == '_'
        || c == '\''
        || c == '\u2032';
  }
}
