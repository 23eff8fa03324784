package pinchoff.technology;

import static pinchoff.technology.Range.ANY;
import static pinchoff.technology.Range.between;
import static pinchoff.technology.Shape.amount;

import pinchoff.quantity.Dimension;

/** The part of the format that describes process corners. */
final class CornerFormat {
  static final Shape.Group CORNER =
      Shape.Group.of(
          Field.of(
                  "thresholdShift",
                  "ΔV_TH",
                  amount(Dimension.VOLTAGE, ANY),
                  "how much harder the device is to turn on: added to V_TH of n devices, taken from"
                      + " V_TH of p devices")
              .must(),
          Field.of(
                  "transconductanceFactor",
                  "Δk'",
                  amount(Dimension.NONE, between(0.1, 10, "0.1 to 10")),
                  "k' is multiplied by this")
              .must(),
          Field.of(
              "oxideCapacitanceFactor",
              "ΔC_ox",
              amount(Dimension.NONE, between(0.1, 10, "0.1 to 10")),
              "C_ox is multiplied by this; 1 if it is not given"));

  static final Shape.Group CORNERS =
      Shape.Group.of(
          Field.of("slow", CORNER, "the corner with the least current").must(),
          Field.of("fast", CORNER, "the corner with the most current").must());

  private CornerFormat() {}
}
