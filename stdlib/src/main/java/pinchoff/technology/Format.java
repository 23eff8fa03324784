package pinchoff.technology;

import static pinchoff.technology.Range.POSITIVE;

import java.util.List;
import pinchoff.quantity.Dimension;

/**
 * The format of technology files, as one table: every key, what may stand there and what it means.
 * Reader, writer, JSON Schema and display are all made from it, so they cannot disagree.
 */
final class Format {
  static final String VERSION = "technology-1";

  static final Shape.Group RAIL =
      Shape.Group.of(
          Field.of(
                  "nominal",
                  Shape.amount(Dimension.VOLTAGE, POSITIVE),
                  "what the supply is meant to be")
              .must(),
          Field.of(
              "minimum", Shape.amount(Dimension.VOLTAGE, POSITIVE), "the least that it may be"),
          Field.of(
              "maximum", Shape.amount(Dimension.VOLTAGE, POSITIVE), "the most that it may be"));

  static final Shape.Group ROOT =
      Shape.Group.of(
          Field.of("$schema", Shape.WORDS, "where an editor finds the schema of this format"),
          Field.of(
                  "format",
                  new Shape.Choice(List.of(VERSION)),
                  "the format and its version, \"" + VERSION + "\"")
              .must(),
          Field.of("name", Shape.WORDS, "the name of the process").must(),
          Field.of(
              "description", Shape.WORDS, "what the process is, and how far it can be trusted"),
          Field.of(
                  "nominalTemperature",
                  "T_0",
                  Shape.DEGREES,
                  "the temperature that all values hold at")
              .must(),
          Field.of(
              "temperatureRange",
              Shape.Group.of(
                  Field.of("minimum", Shape.DEGREES, "the coldest").must(),
                  Field.of("maximum", Shape.DEGREES, "the hottest").must()),
              "the temperatures that the process is made for"),
          Field.of("rails", new Shape.Catalog("a rail", RAIL), "supply rails by name"),
          Field.of(
                  "devices",
                  new Shape.Catalog("a device", DeviceFormat.DEVICE),
                  "transistors by name")
              .must(),
          Field.of(
              "corners",
              Shape.Group.of(
                  Field.of("n", CornerFormat.CORNERS, "corners of all n devices"),
                  Field.of("p", CornerFormat.CORNERS, "corners of all p devices")),
              "how the process as a whole may shift"),
          Field.of(
              "passives",
              Shape.Group.of(
                  Field.of(
                      "resistors",
                      new Shape.Catalog("a resistor", PassiveFormat.RESISTOR),
                      "resistors by name"),
                  Field.of(
                      "capacitors",
                      new Shape.Catalog("a capacitor", PassiveFormat.CAPACITOR),
                      "capacitors by name")),
              "resistors and capacitors"));

  private Format() {}
}
