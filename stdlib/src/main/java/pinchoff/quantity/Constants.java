package pinchoff.quantity;

/** Physical constants, each with its source. */
public final class Constants {

  /**
   * The elementary charge <i>q</i>, 1.602176634e-19 C, exact by the definition of the ampere (SI
   * Brochure, 9th edition, 2019; CODATA 2022).
   */
  public static final Quantity ELEMENTARY_CHARGE = Quantity.ofSi(1.602176634e-19, Dimension.CHARGE);

  /**
   * The Boltzmann constant <i>k</i>, 1.380649e-23 J/K, exact by the definition of the kelvin (SI
   * Brochure, 9th edition, 2019; CODATA 2022).
   */
  public static final Quantity BOLTZMANN =
      Quantity.ofSi(1.380649e-23, Dimension.ENERGY.per(Dimension.TEMPERATURE));

  /**
   * The permittivity of vacuum <i>ε</i><sub>0</sub>, 8.8541878188e-12 F/m, measured, with a
   * relative uncertainty of 1.6e-10 (CODATA 2022).
   */
  public static final Quantity VACUUM_PERMITTIVITY =
      Quantity.ofSi(8.8541878188e-12, Dimension.CAPACITANCE_PER_LENGTH);

  private Constants() {}

  /**
   * The thermal voltage <i>kT/q</i>: 25.85 mV at 300 K.
   *
   * @param temperature the absolute temperature
   */
  public static Quantity thermalVoltage(Temperature temperature) {
    double volts = BOLTZMANN.si() * temperature.kelvin() / ELEMENTARY_CHARGE.si();
    return Quantity.ofSi(volts, Dimension.VOLTAGE);
  }
}
