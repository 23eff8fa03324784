package pinchoff.derive;

import java.util.Optional;
import pinchoff.quantity.Quantity;

/**
 * An input of a derivation.
 *
 * @param name in the spelling that equal names share
 * @param value what it is worth
 * @param origin where it comes from
 * @param tolerance how far it may be off in either direction, if that was said
 */
public record Input(String name, Quantity value, String origin, Optional<Quantity> tolerance) {

  static Input of(String name, Quantity value, String origin) {
    return new Input(name, value, origin, Optional.empty());
  }

  Input within(Quantity plusMinus) {
    return new Input(name, value, origin, Optional.of(plusMinus));
  }

  Input worth(Quantity other) {
    return new Input(name, other, origin, tolerance);
  }
}
