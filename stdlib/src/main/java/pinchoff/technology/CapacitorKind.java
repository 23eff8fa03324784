package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * A kind of capacitor of a process.
 *
 * @param name its name, for example {@code plate}
 * @param description what it is made of; may be empty
 * @param nominalTemperature the temperature that the density holds at
 * @param density capacitance per area (F/m²), above 0
 * @param fringe capacitance per perimeter (F/m), 0 or more; 0 if not stated
 * @param tolerance spread over the process, both ways: 0 to 1
 * @param linearTemperatureCoefficient relative change per kelvin (1/K), either sign; 0 if not
 *     stated
 * @param voltageCoefficient relative change per volt across it (1/V), if stated
 * @param matching A_C: relative difference of a pair drawn alike times √(W L) (m), if stated
 * @param minimumSide least drawn side, if stated
 * @param ratedVoltage most voltage across it (V), if stated
 */
public record CapacitorKind(
    String name,
    String description,
    Temperature nominalTemperature,
    Quantity density,
    Quantity fringe,
    Quantity tolerance,
    Quantity linearTemperatureCoefficient,
    Optional<Quantity> voltageCoefficient,
    Optional<Quantity> matching,
    Optional<Quantity> minimumSide,
    Optional<Quantity> ratedVoltage) {

  /**
   * Capacitance of a rectangle at the nominal temperature: density times area plus fringe times
   * perimeter.
   *
   * @param width one side (m), not less than the minimum
   * @param length the other side (m), not less than the minimum
   * @throws TechnologyException if a side is out of range
   */
  public Quantity capacitance(Quantity width, Quantity length) {
    Sizes.atLeast("width of capacitor " + name, width, minimumSide);
    Sizes.atLeast("length of capacitor " + name, length, minimumSide);
    Quantity perimeter = width.plus(length).times(2);
    return density.times(width).times(length).plus(fringe.times(perimeter));
  }

  /**
   * The side of the square that has a capacitance: the positive root of density·s² + 4·fringe·s =
   * C.
   *
   * @param capacitance what it should have (F), above 0
   * @throws TechnologyException if the capacitance is not above 0 or the square would be smaller
   *     than the minimum
   */
  public Quantity sideFor(Quantity capacitance) {
    String what = "capacitance of capacitor " + name;
    capacitance.requireDimension(what, Dimension.CAPACITANCE);
    if (capacitance.si() <= 0) {
      throw new TechnologyException(what + " = " + capacitance + ": expected more than 0 F");
    }
    double edge = 2 * fringe.si();
    double area = density.si() * capacitance.si();
    // The form without a difference of like numbers.
    double side = capacitance.si() / (edge + Math.sqrt(edge * edge + area));
    Quantity length = Quantity.ofSi(side, Dimension.LENGTH);
    Sizes.atLeast("side of capacitor " + name + " for " + capacitance, length, minimumSide);
    return length;
  }

  /**
   * Capacitance at a temperature over that at the nominal one: 1 + α_1 ΔT.
   *
   * @throws TechnologyException if nothing is left of it, far outside the range that the
   *     coefficient can describe
   */
  public double factorAt(Temperature temperature) {
    double rise = temperature.minus(nominalTemperature).si();
    return Sizes.factor(
        "capacitor " + name, 1 + linearTemperatureCoefficient.si() * rise, temperature);
  }

  /**
   * Standard deviation of the relative difference of two capacitors drawn alike, A_C/√(W L).
   *
   * @throws TechnologyException if the technology states no matching for this kind
   */
  public Quantity mismatch(Quantity width, Quantity length) {
    return Sizes.mismatch("capacitor " + name, matching, width, length);
  }
}
