package pinchoff.quantity;

import java.util.OptionalDouble;

/**
 * How far a value may lie from a reference and still count as the same: an absolute part plus a
 * part relative to the reference.
 *
 * @param absolute 0 or more, of the dimension of the values
 * @param relative 0 or more
 */
public record Tolerance(Quantity absolute, double relative) {

  /** Checks that both parts are 0 or more and finite. */
  public Tolerance {
    if (absolute.si() < 0 || !(relative >= 0) || Double.isInfinite(relative)) {
      throw new QuantityException(
          "tolerance of "
              + absolute
              + " and "
              + Decimal.text(relative)
              + " relative: expected both to be finite and 0 or more");
    }
  }

  /** An absolute tolerance. */
  public static Tolerance absolute(Quantity width) {
    return new Tolerance(width, 0);
  }

  /** A relative tolerance for values of a dimension. */
  public static Tolerance relative(double relative, Dimension dimension) {
    return new Tolerance(Quantity.ofSi(0, dimension), relative);
  }

  /** How far a value may lie from a reference. */
  public Quantity width(Quantity reference) {
    return absolute.plus(reference.abs().times(relative));
  }

  /** True if the value lies within the tolerance of the reference, ends included. */
  public boolean contains(Quantity reference, Quantity value) {
    return value.minus(reference).abs().compareTo(width(reference)) <= 0;
  }

  /**
   * How far a value lies from a reference, counted in widths of the tolerance: at most 1 within it.
   *
   * @return 0 for equal values; empty if the values differ and the tolerance is zero
   */
  public OptionalDouble widthsApart(Quantity reference, Quantity value) {
    Quantity apart = value.minus(reference).abs();
    Quantity width = width(reference);
    if (apart.isZero()) {
      return OptionalDouble.of(0);
    }
    double widths = apart.si() / width.si();
    return Double.isFinite(widths) ? OptionalDouble.of(widths) : OptionalDouble.empty();
  }

  /** Both parts, as far as they are not zero: {@code "±(1 mV + 0.1 %)"}. */
  @Override
  public String toString() {
    String percent = Quantity.ofSi(relative, Dimension.NONE).to("%").toString();
    if (relative == 0) {
      return "±" + absolute;
    }
    return absolute.isZero() ? "±" + percent : "±(" + absolute + " + " + percent + ")";
  }
}
