package pinchoff.quantity;

/**
 * Factories named as the unit: {@code V(1.8)}, {@code mV(650)}, {@code um(2)}, {@code degC(27)};
 * and {@code quantity("387 uA/V^2")} for everything else.
 *
 * <p>A number means its shortest decimal form: {@code mV(650)} equals {@code V(0.65)} to the bit.
 * All refuse NaN and infinity with a {@link QuantityException}.
 */
public final class Units {
  private static final Unit VOLTS = Unit.parse("V");
  private static final Unit MILLIVOLTS = Unit.parse("mV");
  private static final Unit MICROVOLTS = Unit.parse("uV");
  private static final Unit NANOVOLTS = Unit.parse("nV");
  private static final Unit AMPERES = Unit.parse("A");
  private static final Unit MILLIAMPERES = Unit.parse("mA");
  private static final Unit MICROAMPERES = Unit.parse("uA");
  private static final Unit NANOAMPERES = Unit.parse("nA");
  private static final Unit PICOAMPERES = Unit.parse("pA");
  private static final Unit FEMTOAMPERES = Unit.parse("fA");
  private static final Unit OHMS = Unit.parse("ohm");
  private static final Unit MILLIOHMS = Unit.parse("mohm");
  private static final Unit KILOOHMS = Unit.parse("kohm");
  private static final Unit MEGAOHMS = Unit.parse("Mohm");
  private static final Unit GIGAOHMS = Unit.parse("Gohm");
  private static final Unit SIEMENS = Unit.parse("S");
  private static final Unit MILLISIEMENS = Unit.parse("mS");
  private static final Unit MICROSIEMENS = Unit.parse("uS");
  private static final Unit NANOSIEMENS = Unit.parse("nS");
  private static final Unit FARADS = Unit.parse("F");
  private static final Unit MILLIFARADS = Unit.parse("mF");
  private static final Unit MICROFARADS = Unit.parse("uF");
  private static final Unit NANOFARADS = Unit.parse("nF");
  private static final Unit PICOFARADS = Unit.parse("pF");
  private static final Unit FEMTOFARADS = Unit.parse("fF");
  private static final Unit ATTOFARADS = Unit.parse("aF");
  private static final Unit HENRIES = Unit.parse("H");
  private static final Unit MILLIHENRIES = Unit.parse("mH");
  private static final Unit MICROHENRIES = Unit.parse("uH");
  private static final Unit NANOHENRIES = Unit.parse("nH");
  private static final Unit PICOHENRIES = Unit.parse("pH");
  private static final Unit HERTZ = Unit.parse("Hz");
  private static final Unit KILOHERTZ = Unit.parse("kHz");
  private static final Unit MEGAHERTZ = Unit.parse("MHz");
  private static final Unit GIGAHERTZ = Unit.parse("GHz");
  private static final Unit SECONDS = Unit.parse("s");
  private static final Unit MILLISECONDS = Unit.parse("ms");
  private static final Unit MICROSECONDS = Unit.parse("us");
  private static final Unit NANOSECONDS = Unit.parse("ns");
  private static final Unit PICOSECONDS = Unit.parse("ps");
  private static final Unit METRES = Unit.parse("m");
  private static final Unit CENTIMETRES = Unit.parse("cm");
  private static final Unit MILLIMETRES = Unit.parse("mm");
  private static final Unit MICROMETRES = Unit.parse("um");
  private static final Unit NANOMETRES = Unit.parse("nm");
  private static final Unit WATTS = Unit.parse("W");
  private static final Unit MILLIWATTS = Unit.parse("mW");
  private static final Unit MICROWATTS = Unit.parse("uW");
  private static final Unit NANOWATTS = Unit.parse("nW");
  private static final Unit PICOWATTS = Unit.parse("pW");
  private static final Unit COULOMBS = Unit.parse("C");
  private static final Unit PICOCOULOMBS = Unit.parse("pC");
  private static final Unit FEMTOCOULOMBS = Unit.parse("fC");
  private static final Unit JOULES = Unit.parse("J");
  private static final Unit PICOJOULES = Unit.parse("pJ");
  private static final Unit FEMTOJOULES = Unit.parse("fJ");
  private static final Unit ELECTRONVOLTS = Unit.parse("eV");
  private static final Unit MILLIELECTRONVOLTS = Unit.parse("meV");
  private static final Unit KELVINS = Unit.parse("K");
  private static final Unit MILLIKELVINS = Unit.parse("mK");
  private static final Unit PERCENT = Unit.parse("%");
  private static final Unit PPM = Unit.parse("ppm");

  private Units() {}

  /**
   * Reads a number and a unit: {@code "650 mV"}, {@code "387 uA/V^2"}, {@code "0.45 V^0.5"}.
   *
   * @throws QuantityException with the place of the fault
   */
  public static Quantity quantity(String text) {
    return Quantity.parse(text);
  }

  /** A voltage in volts. */
  public static Quantity V(double value) {
    return Quantity.of(value, VOLTS);
  }

  /** A voltage in millivolts. */
  public static Quantity mV(double value) {
    return Quantity.of(value, MILLIVOLTS);
  }

  /** A voltage in microvolts. */
  public static Quantity uV(double value) {
    return Quantity.of(value, MICROVOLTS);
  }

  /** A voltage in nanovolts. */
  public static Quantity nV(double value) {
    return Quantity.of(value, NANOVOLTS);
  }

  /** A current in amperes. */
  public static Quantity A(double value) {
    return Quantity.of(value, AMPERES);
  }

  /** A current in milliamperes. */
  public static Quantity mA(double value) {
    return Quantity.of(value, MILLIAMPERES);
  }

  /** A current in microamperes. */
  public static Quantity uA(double value) {
    return Quantity.of(value, MICROAMPERES);
  }

  /** A current in nanoamperes. */
  public static Quantity nA(double value) {
    return Quantity.of(value, NANOAMPERES);
  }

  /** A current in picoamperes. */
  public static Quantity pA(double value) {
    return Quantity.of(value, PICOAMPERES);
  }

  /** A current in femtoamperes. */
  public static Quantity fA(double value) {
    return Quantity.of(value, FEMTOAMPERES);
  }

  /** A resistance in ohms. */
  public static Quantity ohm(double value) {
    return Quantity.of(value, OHMS);
  }

  /** A resistance in milliohms. */
  public static Quantity mohm(double value) {
    return Quantity.of(value, MILLIOHMS);
  }

  /** A resistance in kiloohms. */
  public static Quantity kohm(double value) {
    return Quantity.of(value, KILOOHMS);
  }

  /** A resistance in megaohms. */
  public static Quantity Mohm(double value) {
    return Quantity.of(value, MEGAOHMS);
  }

  /** A resistance in gigaohms. */
  public static Quantity Gohm(double value) {
    return Quantity.of(value, GIGAOHMS);
  }

  /** A conductance in siemens. */
  public static Quantity S(double value) {
    return Quantity.of(value, SIEMENS);
  }

  /** A conductance in millisiemens. */
  public static Quantity mS(double value) {
    return Quantity.of(value, MILLISIEMENS);
  }

  /** A conductance in microsiemens. */
  public static Quantity uS(double value) {
    return Quantity.of(value, MICROSIEMENS);
  }

  /** A conductance in nanosiemens. */
  public static Quantity nS(double value) {
    return Quantity.of(value, NANOSIEMENS);
  }

  /** A capacitance in farads. */
  public static Quantity F(double value) {
    return Quantity.of(value, FARADS);
  }

  /** A capacitance in millifarads. */
  public static Quantity mF(double value) {
    return Quantity.of(value, MILLIFARADS);
  }

  /** A capacitance in microfarads. */
  public static Quantity uF(double value) {
    return Quantity.of(value, MICROFARADS);
  }

  /** A capacitance in nanofarads. */
  public static Quantity nF(double value) {
    return Quantity.of(value, NANOFARADS);
  }

  /** A capacitance in picofarads. */
  public static Quantity pF(double value) {
    return Quantity.of(value, PICOFARADS);
  }

  /** A capacitance in femtofarads. */
  public static Quantity fF(double value) {
    return Quantity.of(value, FEMTOFARADS);
  }

  /** A capacitance in attofarads. */
  public static Quantity aF(double value) {
    return Quantity.of(value, ATTOFARADS);
  }

  /** An inductance in henries. */
  public static Quantity H(double value) {
    return Quantity.of(value, HENRIES);
  }

  /** An inductance in millihenries. */
  public static Quantity mH(double value) {
    return Quantity.of(value, MILLIHENRIES);
  }

  /** An inductance in microhenries. */
  public static Quantity uH(double value) {
    return Quantity.of(value, MICROHENRIES);
  }

  /** An inductance in nanohenries. */
  public static Quantity nH(double value) {
    return Quantity.of(value, NANOHENRIES);
  }

  /** An inductance in picohenries. */
  public static Quantity pH(double value) {
    return Quantity.of(value, PICOHENRIES);
  }

  /** A frequency in hertz. */
  public static Quantity Hz(double value) {
    return Quantity.of(value, HERTZ);
  }

  /** A frequency in kilohertz. */
  public static Quantity kHz(double value) {
    return Quantity.of(value, KILOHERTZ);
  }

  /** A frequency in megahertz. */
  public static Quantity MHz(double value) {
    return Quantity.of(value, MEGAHERTZ);
  }

  /** A frequency in gigahertz. */
  public static Quantity GHz(double value) {
    return Quantity.of(value, GIGAHERTZ);
  }

  /** A time in seconds. */
  public static Quantity s(double value) {
    return Quantity.of(value, SECONDS);
  }

  /** A time in milliseconds. */
  public static Quantity ms(double value) {
    return Quantity.of(value, MILLISECONDS);
  }

  /** A time in microseconds. */
  public static Quantity us(double value) {
    return Quantity.of(value, MICROSECONDS);
  }

  /** A time in nanoseconds. */
  public static Quantity ns(double value) {
    return Quantity.of(value, NANOSECONDS);
  }

  /** A time in picoseconds. */
  public static Quantity ps(double value) {
    return Quantity.of(value, PICOSECONDS);
  }

  /** A length in metres. */
  public static Quantity m(double value) {
    return Quantity.of(value, METRES);
  }

  /** A length in centimetres. */
  public static Quantity cm(double value) {
    return Quantity.of(value, CENTIMETRES);
  }

  /** A length in millimetres. */
  public static Quantity mm(double value) {
    return Quantity.of(value, MILLIMETRES);
  }

  /** A length in micrometres. */
  public static Quantity um(double value) {
    return Quantity.of(value, MICROMETRES);
  }

  /** A length in nanometres. */
  public static Quantity nm(double value) {
    return Quantity.of(value, NANOMETRES);
  }

  /** A power in watts. */
  public static Quantity W(double value) {
    return Quantity.of(value, WATTS);
  }

  /** A power in milliwatts. */
  public static Quantity mW(double value) {
    return Quantity.of(value, MILLIWATTS);
  }

  /** A power in microwatts. */
  public static Quantity uW(double value) {
    return Quantity.of(value, MICROWATTS);
  }

  /** A power in nanowatts. */
  public static Quantity nW(double value) {
    return Quantity.of(value, NANOWATTS);
  }

  /** A power in picowatts. */
  public static Quantity pW(double value) {
    return Quantity.of(value, PICOWATTS);
  }

  /** A charge in coulombs. */
  public static Quantity C(double value) {
    return Quantity.of(value, COULOMBS);
  }

  /** A charge in picocoulombs. */
  public static Quantity pC(double value) {
    return Quantity.of(value, PICOCOULOMBS);
  }

  /** A charge in femtocoulombs. */
  public static Quantity fC(double value) {
    return Quantity.of(value, FEMTOCOULOMBS);
  }

  /** An energy in joules. */
  public static Quantity J(double value) {
    return Quantity.of(value, JOULES);
  }

  /** An energy in picojoules. */
  public static Quantity pJ(double value) {
    return Quantity.of(value, PICOJOULES);
  }

  /** An energy in femtojoules. */
  public static Quantity fJ(double value) {
    return Quantity.of(value, FEMTOJOULES);
  }

  /** An energy in electronvolts. */
  public static Quantity eV(double value) {
    return Quantity.of(value, ELECTRONVOLTS);
  }

  /** An energy in millielectronvolts. */
  public static Quantity meV(double value) {
    return Quantity.of(value, MILLIELECTRONVOLTS);
  }

  /** A difference of temperatures in kelvins. */
  public static Quantity K(double value) {
    return Quantity.of(value, KELVINS);
  }

  /** A difference of temperatures in millikelvins. */
  public static Quantity mK(double value) {
    return Quantity.of(value, MILLIKELVINS);
  }

  /** A pure number in percent. */
  public static Quantity percent(double value) {
    return Quantity.of(value, PERCENT);
  }

  /** A pure number in parts per million. */
  public static Quantity ppm(double value) {
    return Quantity.of(value, PPM);
  }

  /** A pure number. */
  public static Quantity ratio(double value) {
    return Quantity.of(value, Unit.ONE);
  }

  /**
   * An absolute temperature in degrees Celsius. A difference of temperatures is in {@link #K}.
   *
   * @throws QuantityException unless it is above -273.15
   */
  public static Temperature degC(double value) {
    return Temperature.ofCelsius(value);
  }
}
