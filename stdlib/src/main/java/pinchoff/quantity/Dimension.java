package pinchoff.quantity;

import java.util.Optional;

/**
 * What kind of thing a quantity measures: a product of powers of metre, kilogram, second, ampere
 * and kelvin with rational exponents.
 *
 * <p>Exponents are exact multiples of 1/60, which covers halves, thirds, quarters, fifths and
 * tenths: the body factor is in V^0.5, the coefficient of an alpha-power law in A/V^1.3. They may
 * reach ±17 for kilogram and kelvin, ±34 for metre and ampere, ±68 for second; beyond that a {@link
 * QuantityException} is thrown.
 */
public final class Dimension {
  /*
   * The exponents stand side by side in one long, in sixtieths, each field twice as wide as the
   * exponents that are allowed. So a product is one addition, a sum of two allowed exponents cannot
   * run into its neighbour, and the instance is found in a table: no allocation.
   */
  static final int PARTS = 60;

  private static final String[] BASES = {"m", "kg", "s", "A", "K"};
  private static final int[] WIDTHS = {13, 12, 14, 13, 12};
  private static final DimensionTable TABLE = new DimensionTable();

  /** A pure number. */
  public static final Dimension NONE = base(0, 0, 0, 0, 0);

  /** m. */
  public static final Dimension LENGTH = base(1, 0, 0, 0, 0);

  /** kg. */
  public static final Dimension MASS = base(0, 1, 0, 0, 0);

  /** s. */
  public static final Dimension TIME = base(0, 0, 1, 0, 0);

  /** A. */
  public static final Dimension CURRENT = base(0, 0, 0, 1, 0);

  /** K: a difference of temperatures. */
  public static final Dimension TEMPERATURE = base(0, 0, 0, 0, 1);

  /** m². */
  public static final Dimension AREA = LENGTH.pow(2);

  /** 1/m. */
  public static final Dimension PER_LENGTH = LENGTH.pow(-1);

  /** 1/m³: doping and carrier densities. */
  public static final Dimension NUMBER_DENSITY = LENGTH.pow(-3);

  /** Hz. */
  public static final Dimension FREQUENCY = TIME.pow(-1);

  /** m/s. */
  public static final Dimension VELOCITY = LENGTH.per(TIME);

  /** J. */
  public static final Dimension ENERGY = MASS.times(VELOCITY.pow(2));

  /** W. */
  public static final Dimension POWER = ENERGY.per(TIME);

  /** V. */
  public static final Dimension VOLTAGE = POWER.per(CURRENT);

  /** ohm. */
  public static final Dimension RESISTANCE = VOLTAGE.per(CURRENT);

  /** S. */
  public static final Dimension CONDUCTANCE = CURRENT.per(VOLTAGE);

  /** C. */
  public static final Dimension CHARGE = CURRENT.times(TIME);

  /** F. */
  public static final Dimension CAPACITANCE = CHARGE.per(VOLTAGE);

  /** H. */
  public static final Dimension INDUCTANCE = RESISTANCE.times(TIME);

  /** A/V²: k′ and β. */
  public static final Dimension TRANSCONDUCTANCE_PARAMETER = CURRENT.per(VOLTAGE.pow(2));

  /** √V: the body factor γ. */
  public static final Dimension ROOT_VOLTAGE = VOLTAGE.sqrt();

  /** V². */
  public static final Dimension VOLTAGE_SQUARED = VOLTAGE.pow(2);

  /** 1/V: channel-length modulation λ, gm/ID. */
  public static final Dimension PER_VOLTAGE = VOLTAGE.pow(-1);

  /** m/V: channel-length modulation times length. */
  public static final Dimension LENGTH_PER_VOLTAGE = LENGTH.per(VOLTAGE);

  /** V·m: the mismatch coefficient of the threshold. */
  public static final Dimension VOLTAGE_LENGTH = VOLTAGE.times(LENGTH);

  /** V/m: an electric field. */
  public static final Dimension FIELD = VOLTAGE.per(LENGTH);

  /** m²/(V·s). */
  public static final Dimension MOBILITY = AREA.per(VOLTAGE.times(TIME));

  /** F/m². */
  public static final Dimension CAPACITANCE_PER_AREA = CAPACITANCE.per(AREA);

  /** F/m. */
  public static final Dimension CAPACITANCE_PER_LENGTH = CAPACITANCE.per(LENGTH);

  /** C/m². */
  public static final Dimension CHARGE_PER_AREA = CHARGE.per(AREA);

  /** A/m. */
  public static final Dimension CURRENT_PER_LENGTH = CURRENT.per(LENGTH);

  /** A/m². */
  public static final Dimension CURRENT_PER_AREA = CURRENT.per(AREA);

  /** ohm·m. */
  public static final Dimension RESISTIVITY = RESISTANCE.times(LENGTH);

  /** V/K. */
  public static final Dimension VOLTAGE_PER_TEMPERATURE = VOLTAGE.per(TEMPERATURE);

  /** 1/K: relative temperature coefficients. */
  public static final Dimension PER_TEMPERATURE = TEMPERATURE.pow(-1);

  /** V/s: slew rate. */
  public static final Dimension VOLTAGE_PER_TIME = VOLTAGE.per(TIME);

  /** V/√Hz. */
  public static final Dimension VOLTAGE_NOISE = VOLTAGE.per(FREQUENCY.sqrt());

  /** A/√Hz. */
  public static final Dimension CURRENT_NOISE = CURRENT.per(FREQUENCY.sqrt());

  /** V²/Hz. */
  public static final Dimension VOLTAGE_NOISE_POWER = VOLTAGE_NOISE.pow(2);

  /** A²/Hz. */
  public static final Dimension CURRENT_NOISE_POWER = CURRENT_NOISE.pow(2);

  private final long packed;

  Dimension(long packed) {
    this.packed = packed;
  }

  private static Dimension base(int... exponents) {
    int[] parts = new int[exponents.length];
    for (int i = 0; i < parts.length; i++) {
      parts[i] = exponents[i] * PARTS;
    }
    return TABLE.get(pack(parts));
  }

  /** The dimension of a product. */
  public Dimension times(Dimension other) {
    return TABLE.get(packed + other.packed);
  }

  /** The dimension of a quotient. */
  public Dimension per(Dimension other) {
    return TABLE.get(packed - other.packed);
  }

  /** The dimension of a power. */
  public Dimension pow(int exponent) {
    return pow(exponent, 1);
  }

  /**
   * The dimension of a rational power.
   *
   * @param numerator any
   * @param denominator not 0
   * @throws QuantityException if an exponent is then no multiple of 1/60 or too large
   */
  public Dimension pow(int numerator, int denominator) {
    if (denominator == 0) {
      throw new QuantityException(
          this + " to the power " + numerator + "/0: expected a denominator other than 0");
    }
    int[] parts = parts();
    for (int i = 0; i < parts.length; i++) {
      long product = (long) parts[i] * numerator;
      long quotient = product / denominator;
      if (quotient * denominator != product) {
        throw new QuantityException(
            this
                + " to the power "
                + numerator
                + "/"
                + denominator
                + ": expected exponents that are multiples of 1/"
                + PARTS);
      }
      parts[i] = checked(i, quotient);
    }
    return TABLE.get(pack(parts));
  }

  /** The dimension of a square root. */
  public Dimension sqrt() {
    return pow(1, 2);
  }

  /** True for a pure number. */
  public boolean isNone() {
    return packed == 0;
  }

  /** The usual name, for example "voltage", of the dimensions that have one. */
  public Optional<String> name() {
    return CoherentUnits.nameOf(this);
  }

  /** For error messages: "a voltage (V)", "a quantity in A/V^3", "a pure number". */
  public String description() {
    return CoherentUnits.describe(this);
  }

  @Override
  public boolean equals(Object other) {
    return this == other || (other instanceof Dimension d && packed == d.packed);
  }

  @Override
  public int hashCode() {
    return DimensionTable.hash(packed);
  }

  /** The coherent SI unit as text that {@link Unit#parse} reads: "A/V^2"; "1" for a pure number. */
  @Override
  public String toString() {
    return CoherentUnits.of(this).ascii();
  }

  long packed() {
    return packed;
  }

  /** Exponents of m, kg, s, A, K in sixtieths. */
  int[] parts() {
    int[] parts = new int[WIDTHS.length];
    long rest = packed;
    for (int i = 0; i < parts.length; i++) {
      int unused = Long.SIZE - WIDTHS[i];
      parts[i] = (int) (rest << unused >> unused);
      rest = (rest - parts[i]) >> WIDTHS[i];
    }
    return parts;
  }

  /** Throws if an exponent is beyond what is allowed. */
  Dimension requireAllowed() {
    int[] parts = parts();
    for (int i = 0; i < parts.length; i++) {
      checked(i, parts[i]);
    }
    return this;
  }

  private static long pack(int[] parts) {
    long packed = 0;
    for (int i = parts.length - 1; i >= 0; i--) {
      packed = (packed << WIDTHS[i]) + parts[i];
    }
    return packed;
  }

  private static int checked(int base, long part) {
    int most = (1 << (WIDTHS[base] - 2)) - 1;
    if (Math.abs(part) > most) {
      throw new QuantityException(
          "exponent "
              + Exponent.text(part)
              + " of "
              + BASES[base]
              + " in a dimension: expected at most "
              + most / PARTS
              + " either way");
    }
    return (int) part;
  }
}
