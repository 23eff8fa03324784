package pinchoff.device;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** Checks of parameters, with messages that name the value and what was expected. */
final class Check {
  private Check() {}

  static Quantity positive(String what, Quantity value, Dimension dimension) {
    if (value.requireDimension(what, dimension).si() <= 0) {
      throw new DeviceException(what + " = " + value + ": expected more than 0");
    }
    return value;
  }

  static Quantity notNegative(String what, Quantity value, Dimension dimension) {
    if (value.requireDimension(what, dimension).si() < 0) {
      throw new DeviceException(what + " = " + value + ": expected 0 or more");
    }
    return value;
  }

  static void positive(String what, Optional<Quantity> value, Dimension dimension) {
    value.ifPresent(v -> positive(what, v, dimension));
  }

  static void notNegative(String what, Optional<Quantity> value, Dimension dimension) {
    value.ifPresent(v -> notNegative(what, v, dimension));
  }

  static double within(String what, double value, double least, double most) {
    if (!(value >= least && value <= most)) {
      throw new DeviceException(what + " = " + value + ": expected " + least + " to " + most);
    }
    return value;
  }

  /** The value of a V_SB of an n device or a V_BS of a p device. */
  static Quantity sourceBody(Transistor transistor, Known given) {
    boolean n = transistor.polarity() == Polarity.N;
    if (given.kind() != (n ? Known.Kind.VSB : Known.Kind.VBS)) {
      throw new DeviceException(
          "%s for curves of %s: expected %s"
              .formatted(given, transistor.device().name(), n ? "vsb" : "vbs"));
    }
    return given.value();
  }
}
