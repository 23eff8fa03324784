package pinchoff.quantity;

import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

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

  /** A least and a most value. */
  public static Limits between(Quantity least, Quantity most) {
    return NONE.withMin(least).withMax(most);
  }

  /** A least value alone. */
  public static Limits atLeast(Quantity least) {
    return NONE.withMin(least);
  }

  /** A most value alone. */
  public static Limits atMost(Quantity most) {
    return NONE.withMax(most);
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
    if (lower.isEmpty() || higher.isEmpty()) {
      return;
    }
    lower.get().requireDimension("limit " + low, higher.get().dimension());
    if (lower.get().compareTo(higher.get()) > 0) {
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

  /** Those that are given: {@code "min 18 µA, typ 20 µA, max 22 µA"}. */
  @Override
  public String toString() {
    return Stream.of(text("min ", min), text("typ ", typ), text("max ", max))
        .filter(text -> !text.isEmpty())
        .collect(Collectors.joining(", "));
  }

  private static String text(String name, Optional<Quantity> limit) {
    return limit.map(value -> name + value).orElse("");
  }
}
