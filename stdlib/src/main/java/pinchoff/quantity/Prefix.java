package pinchoff.quantity;

import java.util.List;

/** The SI prefixes that the trade uses, with every accepted spelling. */
@SuppressWarnings("ImmutableEnumChecker") // the list is unmodifiable
enum Prefix {
  ATTO('a', -18, "a"),
  FEMTO('f', -15, "f"),
  PICO('p', -12, "p"),
  NANO('n', -9, "n"),
  /** Written u; the micro sign and the Greek letter are accepted, the former is shown. */
  MICRO('u', -6, "µ", "u", "\u03BC"),
  MILLI('m', -3, "m"),
  /** With the metre alone. */
  CENTI('c', -2, "c"),
  NONE('1', 0, ""),
  KILO('k', 3, "k"),
  MEGA('M', 6, "M"),
  GIGA('G', 9, "G"),
  TERA('T', 12, "T");

  private final char code;
  private final int power;
  private final List<String> spellings;

  Prefix(char code, int power, String... spellings) {
    this.code = code;
    this.power = power;
    this.spellings = List.of(spellings);
  }

  /** The power of ten. */
  int power() {
    return power;
  }

  /** True if a list of prefix letters contains this one; no prefix is always allowed. */
  boolean isIn(String codes) {
    return this == NONE || codes.indexOf(code) >= 0;
  }

  /** How it is shown. */
  String symbol() {
    return spellings.get(0);
  }

  /** How it is written in ASCII. */
  String ascii() {
    return this == NONE ? "" : String.valueOf(code);
  }

  /** Every accepted spelling. */
  List<String> spellings() {
    return spellings;
  }
}
