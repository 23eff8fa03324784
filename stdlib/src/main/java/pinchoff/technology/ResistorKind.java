package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * A kind of resistor of a process.
 *
 * @param name its name, for example {@code poly-high}
 * @param description what it is made of; may be empty
 * @param nominalTemperature the temperature that the sheet resistance holds at
 * @param sheetResistance resistance of a square (ohm), above 0
 * @param tolerance spread over the process, both ways: 0 to 1
 * @param linearTemperatureCoefficient relative change per kelvin (1/K), either sign; 0 if not
 *     stated
 * @param quadraticTemperatureCoefficient relative change per kelvin squared (1/K²), either sign; 0
 *     if not stated
 * @param voltageCoefficient relative change per volt across it (1/V), if stated
 * @param matching A_R: relative difference of a pair drawn alike times √(W L) (m), if stated
 * @param minimumWidth least drawn width, if stated
 * @param widthOffset drawn minus effective width (m), either sign; 0 if not stated
 * @param currentDensity most current per width (A/m), if stated
 */
public record ResistorKind(
    String name,
    String description,
    Temperature nominalTemperature,
    Quantity sheetResistance,
    Quantity tolerance,
    Quantity linearTemperatureCoefficient,
    Quantity quadraticTemperatureCoefficient,
    Optional<Quantity> voltageCoefficient,
    Optional<Quantity> matching,
    Optional<Quantity> minimumWidth,
    Quantity widthOffset,
    Optional<Quantity> currentDensity) {

  /**
   * Resistance at the nominal temperature: sheet resistance times length over effective width.
   * Contacts and bends are not counted.
   *
   * @param width drawn width (m), more than the width offset and not less than the minimum
   * @param length length between the contacts (m), above 0
   * @throws TechnologyException if a size is out of range
   */
  public Quantity resistance(Quantity width, Quantity length) {
    Sizes.positive("length of resistor " + name, length);
    Sizes.atLeast("width of resistor " + name, width, minimumWidth);
    Quantity effective = width.minus(widthOffset);
    if (effective.si() <= 0) {
      throw new TechnologyException(
          "width of resistor "
              + name
              + " = "
              + width
              + ": expected more than its offset of "
              + widthOffset);
    }
    return sheetResistance.times(length.per(effective));
  }

  /**
   * Resistance at a temperature over that at the nominal one: 1 + α_1 ΔT + α_2 ΔT².
   *
   * @throws TechnologyException if nothing is left of it, far outside the range that the two
   *     coefficients can describe
   */
  public double factorAt(Temperature temperature) {
    double rise = temperature.minus(nominalTemperature).si();
    double linear = linearTemperatureCoefficient.si() * rise;
    double quadratic = quadraticTemperatureCoefficient.si() * rise * rise;
    return Sizes.factor("resistor " + name, 1 + linear + quadratic, temperature);
  }

  /**
   * Standard deviation of the relative difference of two resistors drawn alike, A_R/√(W L).
   *
   * @throws TechnologyException if the technology states no matching for this kind
   */
  public Quantity mismatch(Quantity width, Quantity length) {
    return Sizes.mismatch("resistor " + name, matching, width, length);
  }
}
