package pinchoff.quantity;

/**
 * How far two values may lie apart and still count as the same: an absolute part plus a part
 * relative to the reference.
 *
 * @param absolute 0 or more, of the dimension of the values
 * @param relative 0 or more
 */
public record Tolerance(Quantity absolute, double relative) {

  /** Checks that both parts are 0 or more and finite. */
  public Tolerance {
    if (absolute.si() < 0 || !(relative >= 0) || Double.isInfinite(relative)) {
      throw new QuantityException(
          "tolerance of " + absolute + " and " + relative + " relative: expected both 0 or more");
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
}
