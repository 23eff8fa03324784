package pinchoff.technology;

import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import pinchoff.device.Device;
import pinchoff.device.Polarity;
import pinchoff.device.Source;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** Makes rails, devices, corners and passives of a checked document. */
final class Parts {
  private final Document document;

  Parts(Document document) {
    this.document = document;
  }

  Temperature nominalTemperature() {
    return document
        .degrees("nominalTemperature")
        .orElseThrow(() -> new IllegalStateException("nominalTemperature was checked"));
  }

  Map<String, Rail> rails() {
    return named("rails", Parts::rail);
  }

  private static Rail rail(String name, Section s) {
    return new Rail(name, s.required("nominal"), s.amount("minimum"), s.amount("maximum"));
  }

  Map<String, Device> devices(Source source) {
    return named(
        "devices",
        (name, section) -> {
          DeviceParts parts = new DeviceParts(section);
          return Device.of(
              parts.parameters(name, nominalTemperature()), parts.rules(), parts.ratings(), source);
        });
  }

  /** The corners of each device: its own, or those of its polarity, or none. */
  Map<String, Map<Corner, CornerShift>> deviceCorners() {
    return named("devices", (name, section) -> deviceCorners(section));
  }

  private Map<Corner, CornerShift> deviceCorners(Section device) {
    Section own = device.in("corners");
    Polarity polarity = new DeviceParts(device).polarity();
    return own.isStated() ? corners(own) : corners(polarity);
  }

  /** The corners of all devices of a polarity that have none of their own. */
  Map<Corner, CornerShift> corners(Polarity polarity) {
    return corners(new Section(document, "corners").in(polarity.letter()));
  }

  private static Map<Corner, CornerShift> corners(Section corners) {
    Map<Corner, CornerShift> shifts = new EnumMap<>(Corner.class);
    shifts.put(Corner.TYPICAL, CornerShift.NONE);
    for (Corner corner : List.of(Corner.SLOW, Corner.FAST)) {
      Section section = corners.in(corner.toString());
      if (section.isStated()) {
        shifts.put(corner, shift(section));
      }
    }
    return shifts;
  }

  private static CornerShift shift(Section s) {
    return new CornerShift(
        s.required("thresholdShift"),
        s.ratio("transconductanceFactor"),
        s.amount("oxideCapacitanceFactor").map(Quantity::ratio).orElse(1.0));
  }

  Passives passives() {
    return new Passives(
        named("passives.resistors", this::resistor), named("passives.capacitors", this::capacitor));
  }

  private ResistorKind resistor(String name, Section s) {
    return new ResistorKind(
        name,
        s.words("description"),
        nominalTemperature(),
        s.required("sheetResistance"),
        s.required("tolerance"),
        s.orZero("linearTemperatureCoefficient", Dimension.PER_TEMPERATURE),
        s.orZero("quadraticTemperatureCoefficient", Dimension.TEMPERATURE.pow(-2)),
        s.amount("voltageCoefficient"),
        s.amount("matching"),
        s.amount("minimumWidth"),
        s.orZero("widthOffset", Dimension.LENGTH),
        s.amount("currentDensity"));
  }

  private CapacitorKind capacitor(String name, Section s) {
    return new CapacitorKind(
        name,
        s.words("description"),
        nominalTemperature(),
        s.required("density"),
        s.orZero("fringe", Dimension.CAPACITANCE_PER_LENGTH),
        s.required("tolerance"),
        s.orZero("linearTemperatureCoefficient", Dimension.PER_TEMPERATURE),
        s.amount("voltageCoefficient"),
        s.amount("matching"),
        s.amount("minimumSide"),
        s.amount("ratedVoltage"));
  }

  Optional<TemperatureRange> temperatureRange() {
    Optional<Temperature> minimum = document.degrees("temperatureRange.minimum");
    Optional<Temperature> maximum = document.degrees("temperatureRange.maximum");
    return minimum.isPresent() && maximum.isPresent()
        ? Optional.of(new TemperatureRange(minimum.get(), maximum.get()))
        : Optional.empty();
  }

  private <T> Map<String, T> named(String path, BiFunction<String, Section, T> make) {
    Map<String, T> made = new LinkedHashMap<>();
    for (String name : document.names(path)) {
      made.put(name, make.apply(name, new Section(document, path + "." + name)));
    }
    return made;
  }
}
