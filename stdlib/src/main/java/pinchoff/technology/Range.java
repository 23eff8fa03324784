package pinchoff.technology;

import java.util.Optional;
import pinchoff.quantity.Quantity;

/**
 * Which values make sense at all, in SI. It is no judgement of what is usual.
 *
 * @param least the lower end
 * @param open true if the lower end itself is not in the range
 * @param most the upper end, included
 * @param words what is expected, for a message
 */
record Range(double least, boolean open, double most, String words) {

  /** Anything. */
  static final Range ANY =
      new Range(Double.NEGATIVE_INFINITY, false, Double.POSITIVE_INFINITY, "any value");

  /** Above zero. */
  static final Range POSITIVE = new Range(0, true, Double.POSITIVE_INFINITY, "more than 0");

  /** Zero or above. */
  static final Range NOT_NEGATIVE = new Range(0, false, Double.POSITIVE_INFINITY, "0 or more");

  /** A share of the whole, ends included. */
  static final Range SHARE = new Range(0, false, 1, "0 % to 100 %");

  static Range between(double least, double most, String words) {
    return new Range(least, false, most, words);
  }

  /** What was expected, if the value is not in the range. */
  Optional<String> fault(Quantity value) {
    double si = value.si();
    boolean inside = (open ? si > least : si >= least) && si <= most;
    return inside ? Optional.empty() : Optional.of(words);
  }
}
