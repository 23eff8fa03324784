package pinchoff.quantity;

import java.math.BigDecimal;
import java.util.List;

/**
 * The table of units: symbol as shown, ASCII form and further accepted spellings, dimension, the
 * prefixes that make sense with it, and its size in SI.
 *
 * <p>A prefix that nobody writes is left out on purpose: a kilofarad or a megasecond is a slip of
 * the pen, and an attometre would make "am" a unit.
 */
@SuppressWarnings("ImmutableEnumChecker") // dimensions, decimals and the list are immutable
enum NamedUnit {
  METRE(Dimension.LENGTH, "fpnumck", "m"),
  GRAM(Dimension.MASS, "numk", "1e-3", "g"),
  SECOND(Dimension.TIME, "afpnum", "s"),
  AMPERE(Dimension.CURRENT, "afpnumk", "A"),
  KELVIN(Dimension.TEMPERATURE, "um", "K"),
  VOLT(Dimension.VOLTAGE, "afpnumkM", "V"),
  OHM(Dimension.RESISTANCE, "numkMGT", "Ω", "ohm", "Ohm", "\u2126"),
  SIEMENS(Dimension.CONDUCTANCE, "afpnumk", "S"),
  FARAD(Dimension.CAPACITANCE, "afpnum", "F"),
  HENRY(Dimension.INDUCTANCE, "afpnum", "H"),
  COULOMB(Dimension.CHARGE, "afpnum", "C"),
  HERTZ(Dimension.FREQUENCY, "numkMGT", "Hz"),
  WATT(Dimension.POWER, "afpnumkM", "W"),
  JOULE(Dimension.ENERGY, "afpnumkM", "J"),
  /** Its size is exact since the SI of 2019. */
  ELECTRONVOLT(Dimension.ENERGY, "numkM", "1.602176634e-19", "eV"),
  PERCENT(Dimension.NONE, "", "1e-2", "%"),
  /** Parts per million. */
  PPM(Dimension.NONE, "", "1e-6", "ppm"),
  RADIAN(Dimension.NONE, "num", "rad"),
  /** A degree of angle; π/180 to 34 digits. */
  DEGREE(Dimension.NONE, "", "0.01745329251994329576923690768488613", "°", "deg"),
  /** A label: per decade, as in mV/dec. */
  DECADE(Dimension.NONE, "", "dec"),
  /** A label: per octave. */
  OCTAVE(Dimension.NONE, "", "oct"),
  /** A label: per square, as in ohm/sq. */
  SQUARE(Dimension.NONE, "", "sq", "□");

  private final Dimension dimension;
  private final String prefixes;
  private final BigDecimal size;
  private final List<String> spellings;

  NamedUnit(Dimension dimension, String prefixes, String... sizeAndSpellings) {
    boolean sized = Character.isDigit(sizeAndSpellings[0].charAt(0));
    this.dimension = dimension;
    this.prefixes = prefixes;
    this.size = sized ? new BigDecimal(sizeAndSpellings[0]) : BigDecimal.ONE;
    List<String> all = List.of(sizeAndSpellings);
    this.spellings = sized ? all.subList(1, all.size()) : all;
  }

  Dimension dimension() {
    return dimension;
  }

  /** The size of one in SI. */
  BigDecimal size() {
    return size;
  }

  boolean takes(Prefix prefix) {
    return prefix.isIn(prefixes);
  }

  /** How it is shown. */
  String symbol() {
    return spellings.get(0);
  }

  /** How it is written in ASCII. */
  String ascii() {
    return spellings.stream()
        .filter(s -> s.chars().allMatch(c -> c < 128))
        .findFirst()
        .orElseThrow();
  }

  /** Every accepted spelling. */
  List<String> spellings() {
    return spellings;
  }
}
