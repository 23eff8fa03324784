package pinchoff.quantity;

import java.util.Optional;

/**
 * The limits of a specified value: least, typical and most, each optional.
 *
 * @param min the least that is accepted
 * @param typ the value that is aimed at
 * @param max the most that is accepted
 */
public record Limits(Optional<Quantity> min, Optional<Quantity> typ, Optional<Quantity> max) {

  /** No limits. */
  public static final Limits NONE =
      new Limits(Optional.empty(), Optional.empty(), Optional.empty());

  /** Checks that those given have one dimension and are in order. */
  public Limits {
    requireOrder("min", min, "typ", typ);
    requireOrder("typ", typ, "max", max);
    requireOrder("min", min, "max", max);
  }

  /** These limits with a least value. */
  public Limits withMin(Quantity least) {
    return new Limits(Optional.of(least), typ, max);
  }

  /** These limits with a typical value. */
  public Limits withTyp(Quantity typical) {
    return new Limits(min, Optional.of(typical), max);
  }

  /** These limits with a most value. */
  public Limits withMax(Quantity most) {
    return new Limits(min, typ, Optional.of(most));
  }

  /** True if the value is neither below the least nor above the most, ends included. */
  public boolean contains(Quantity value) {
    return margin(value).map(m -> m.si() >= 0).orElse(true);
  }

  /**
   * The distance of a value to the nearer limit: positive inside, negative outside; empty if there
   * is neither a least nor a most value.
   */
  public Optional<Quantity> margin(Quantity value) {
    Optional<Quantity> below = min.map(value::minus);
    Optional<Quantity> above = max.map(m -> m.minus(value));
    return below.isPresent() && above.isPresent()
        ? Optional.of(below.get().min(above.get()))
        : below.or(() -> above);
  }

  private static void requireOrder(
      String low, Optional<Quantity> lower, String high, Optional<Quantity> higher) {
    if (lower.isPresent() && higher.isPresent() && lower.get().compareTo(higher.get()) > 0) {
      throw new QuantityException(
          low
              + " = "
              + lower.get()
              + " above "
              + high
              + " = "
              + higher.get()
              + ": expected "
              + low
              + " ≤ "
              + high);
    }
  }
}
