package pinchoff.technology;

import pinchoff.quantity.Constants;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** What the layers of a silicon process make of its devices, for a long channel. */
final class Silicon {
  /** Relative permittivity of silicon dioxide (Sze and Ng, Physics of Semiconductor Devices). */
  private static final double OXIDE = 3.9;

  /**
   * Relative permittivity of silicon (Pierret, Semiconductor Device Fundamentals: 11.8 to 11.7).
   */
  private static final double CRYSTAL = 11.7;

  private Silicon() {}

  /** C_ox = ε_ox/t_ox. */
  static Quantity oxideCapacitance(Quantity thickness) {
    return Constants.VACUUM_PERMITTIVITY.times(OXIDE).per(thickness);
  }

  /** γ = √(2 q ε_si N)/C_ox. */
  static Quantity bodyFactor(Quantity doping, Quantity oxideCapacitance) {
    return Constants.ELEMENTARY_CHARGE
        .times(2 * CRYSTAL)
        .times(Constants.VACUUM_PERMITTIVITY)
        .times(doping)
        .sqrt()
        .per(oxideCapacitance);
  }

  /** 2φ_F = 2 (kT/q) ln(N/n_i). */
  static Quantity surfacePotential(Quantity doping, Temperature temperature) {
    double ratio = doping.per(intrinsicDensity(temperature)).ratio();
    return Constants.thermalVoltage(temperature).times(2 * StrictMath.log(ratio));
  }

  /**
   * n_i = 5.29e19 (T/300 K)^2.54 exp(−6726 K/T) per cm³, measured from 78 K to 340 K (Misiakos and
   * Tsamakis, J. Appl. Phys. 74 (1993) 3293).
   */
  static Quantity intrinsicDensity(Temperature temperature) {
    double kelvin = temperature.kelvin();
    double perCubicCentimetre =
        5.29e19 * StrictMath.pow(kelvin / 300, 2.54) * StrictMath.exp(-6726 / kelvin);
    return Quantity.ofSi(perCubicCentimetre * 1e6, Dimension.NUMBER_DENSITY);
  }
}
