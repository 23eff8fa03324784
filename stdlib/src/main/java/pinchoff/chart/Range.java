package pinchoff.chart;

import pinchoff.quantity.Quantity;

/** The ends of an axis in SI: finite, the lower one below the upper one. */
record Range(double low, double high) {
  /** Automatic logarithmic ranges reach at most this far down from their upper end. */
  private static final double MOST_DECADES = 1e18;

  private static final double ROOT_TEN = 3.1622776601683795;
  private static final double NEAR_ZERO = 0.3;
  private static final double NEAR_ORIGIN = 0.02;
  private static final double MARGIN = 0.05;

  /** Collects the values that an axis has to show. */
  static final class Finder {
    private final Axis axis;
    private double low = Double.POSITIVE_INFINITY;
    private double high = Double.NEGATIVE_INFINITY;

    Finder(Axis axis) {
      this.axis = axis;
    }

    void add(double value) {
      if (Double.isNaN(value) || (axis.logarithmic() && value <= 0)) {
        return;
      }
      low = Math.min(low, value);
      high = Math.max(high, value);
    }

    boolean isEmpty() {
      return low > high;
    }

    /**
     * The range with ends that suit the values.
     *
     * @param roomy true to leave room between the values and the ends
     */
    Range range(boolean roomy) {
      double from = axis.from().map(Quantity::si).orElse(Double.NaN);
      double to = axis.to().map(Quantity::si).orElse(Double.NaN);
      Range found = isEmpty() ? new Range(1, 1) : new Range(low, high);
      Range suited = axis.logarithmic() ? found.logarithmic(roomy) : linear(found, roomy);
      Range ends =
          new Range(Double.isNaN(from) ? suited.low : from, Double.isNaN(to) ? suited.high : to);
      return ends.low < ends.high ? ends : ends.opened(!Double.isNaN(from), axis.logarithmic());
    }

    private Range linear(Range found, boolean roomy) {
      return isEmpty() ? new Range(0, 1) : found.linear(roomy);
    }
  }

  /** One value is given, and the data lie on the wrong side of it. */
  private Range opened(boolean lowIsGiven, boolean logarithmic) {
    double given = lowIsGiven ? low : high;
    double size = given == 0 ? 1 : Math.abs(given);
    double other;
    if (logarithmic) {
      other = lowIsGiven ? given * 10 : given / 10;
    } else {
      other = lowIsGiven ? given + size : given - size;
    }
    return lowIsGiven ? new Range(given, other) : new Range(other, given);
  }

  private Range linear(boolean roomy) {
    double span = high - low;
    double size = Math.max(Math.abs(low), Math.abs(high));
    if (span <= size * 1e-12) {
      double half = size == 0 ? 1 : size / 10;
      return size == 0 ? new Range(-1, 1) : new Range(low - half, high + half);
    }
    double near = roomy ? NEAR_ZERO : NEAR_ORIGIN;
    double margin = roomy ? MARGIN * span : 0;
    double from = low >= 0 && low <= near * high ? 0 : low - margin;
    double to = high <= 0 && high >= near * low ? 0 : high + margin;
    return new Range(from, to);
  }

  private Range logarithmic(boolean roomy) {
    double bottom = Math.max(low, high / MOST_DECADES);
    double decades = StrictMath.log10(high / bottom);
    if (decades < 1e-6) {
      return new Range(bottom / ROOT_TEN, high * ROOT_TEN);
    }
    if (!roomy) {
      return new Range(bottom, high);
    }
    double margin = StrictMath.pow(10, MARGIN * decades);
    return new Range(bottom / margin, high * margin);
  }

  /** The distance between the ends. */
  double span() {
    return high - low;
  }

  /** The larger distance of an end from zero. */
  double size() {
    return Math.max(Math.abs(low), Math.abs(high));
  }

  boolean contains(double value) {
    return value >= low && value <= high;
  }
}
