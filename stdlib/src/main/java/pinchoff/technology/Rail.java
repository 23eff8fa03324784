package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Quantity;

/**
 * A supply rail of a process.
 *
 * @param name its name, for example {@code core}
 * @param nominal what it is meant to be (V), above 0
 * @param minimum the least that it may be
 * @param maximum the most that it may be
 */
public record Rail(
    String name, Quantity nominal, Optional<Quantity> minimum, Optional<Quantity> maximum) {

  /** Checks dimensions and order. */
  public Rail {
    nominal.requireDimension("rail " + name, Dimension.VOLTAGE);
    if (nominal.si() <= 0) {
      throw new TechnologyException("rail " + name + " = " + nominal + ": expected more than 0 V");
    }
    Limits unused = new Limits(minimum, Optional.of(nominal), maximum);
  }

  /** Least, nominal and most as limits. */
  public Limits limits() {
    return new Limits(minimum, Optional.of(nominal), maximum);
  }
}
