package pinchoff.technology;

import static pinchoff.technology.Range.ANY;
import static pinchoff.technology.Range.NOT_NEGATIVE;
import static pinchoff.technology.Range.POSITIVE;
import static pinchoff.technology.Range.SHARE;
import static pinchoff.technology.Range.between;
import static pinchoff.technology.Shape.amount;

import pinchoff.quantity.Dimension;

/** The part of the format that describes resistors and capacitors. */
final class PassiveFormat {
  static final Shape.Group RESISTOR =
      Shape.Group.of(
          Field.of("description", Shape.WORDS, "what it is made of"),
          Field.of(
                  "sheetResistance",
                  "R_sq",
                  amount(Dimension.RESISTANCE, POSITIVE),
                  "resistance of a square")
              .must(),
          Field.of("tolerance", amount(Dimension.NONE, SHARE), "spread over the process, both ways")
              .must(),
          Field.of(
              "linearTemperatureCoefficient",
              "α_1",
              amount(Dimension.PER_TEMPERATURE, ANY),
              "relative change per kelvin"),
          Field.of(
              "quadraticTemperatureCoefficient",
              "α_2",
              amount(Dimension.TEMPERATURE.pow(-2), ANY),
              "relative change per kelvin squared"),
          Field.of(
              "voltageCoefficient",
              "α_V",
              amount(Dimension.PER_VOLTAGE, ANY),
              "relative change per volt across it"),
          Field.of(
              "matching",
              "A_R",
              amount(Dimension.LENGTH, between(0, 5e-7, "0 to 50 %*um")),
              "relative difference of a pair times √(W L)"),
          Field.of(
              "minimumWidth", "W_min", amount(Dimension.LENGTH, POSITIVE), "least drawn width"),
          Field.of(
              "widthOffset", "ΔW", amount(Dimension.LENGTH, ANY), "drawn minus effective width"),
          Field.of(
              "currentDensity",
              "J_max",
              amount(Dimension.CURRENT_PER_LENGTH, POSITIVE),
              "most current per width"));

  static final Shape.Group CAPACITOR =
      Shape.Group.of(
          Field.of("description", Shape.WORDS, "what it is made of"),
          Field.of(
                  "density",
                  "C_A",
                  amount(Dimension.CAPACITANCE_PER_AREA, POSITIVE),
                  "capacitance per area")
              .must(),
          Field.of(
              "fringe",
              "C_P",
              amount(Dimension.CAPACITANCE_PER_LENGTH, NOT_NEGATIVE),
              "capacitance per perimeter"),
          Field.of("tolerance", amount(Dimension.NONE, SHARE), "spread over the process, both ways")
              .must(),
          Field.of(
              "linearTemperatureCoefficient",
              "α_1",
              amount(Dimension.PER_TEMPERATURE, ANY),
              "relative change per kelvin"),
          Field.of(
              "voltageCoefficient",
              "α_V",
              amount(Dimension.PER_VOLTAGE, ANY),
              "relative change per volt across it"),
          Field.of(
              "matching",
              "A_C",
              amount(Dimension.LENGTH, between(0, 5e-7, "0 to 50 %*um")),
              "relative difference of a pair times √(W L)"),
          Field.of("minimumSide", amount(Dimension.LENGTH, POSITIVE), "least drawn side"),
          Field.of(
              "ratedVoltage",
              "V_max",
              amount(Dimension.VOLTAGE, POSITIVE),
              "most voltage across it"));

  private PassiveFormat() {}
}
