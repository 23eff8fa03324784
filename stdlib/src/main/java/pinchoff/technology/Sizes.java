package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** Checks of drawn sizes, and what follows from an area. */
final class Sizes {
  private Sizes() {}

  static void positive(String what, Quantity size) {
    size.requireDimension(what, Dimension.LENGTH);
    if (size.si() <= 0) {
      throw new TechnologyException(what + " = " + size + ": expected more than 0 m");
    }
  }

  static void atLeast(String what, Quantity size, Optional<Quantity> minimum) {
    positive(what, size);
    if (minimum.isPresent() && size.compareTo(minimum.get()) < 0) {
      throw new TechnologyException(what + " = " + size + ": expected at least " + minimum.get());
    }
  }

  /** A factor that must not take all of the value away. */
  static double factor(String what, double factor, Temperature temperature) {
    if (!(factor > 0)) {
      throw new TechnologyException(
          what + " at " + temperature + ": its temperature coefficients do not reach that far");
    }
    return factor;
  }

  /** A/√(W L) of a pair (Pelgrom et al., JSSC 24 (1989) 1433). */
  static Quantity mismatch(
      String what, Optional<Quantity> coefficient, Quantity width, Quantity length) {
    positive("width of " + what, width);
    positive("length of " + what, length);
    Quantity known =
        coefficient.orElseThrow(
            () -> new TechnologyException(what + ": the technology states no matching"));
    return known.per(width.times(length).sqrt());
  }
}
