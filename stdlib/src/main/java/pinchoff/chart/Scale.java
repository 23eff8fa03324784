package pinchoff.chart;

/**
 * From a value in SI to a place on the page.
 *
 * @param range the ends of the axis
 * @param logarithmic whether equal steps are factors
 * @param start where the lower end stands on the page
 * @param end where the upper end stands on the page
 */
record Scale(Range range, boolean logarithmic, double start, double end) {

  /** Where a value stands; NaN if it has no place, as those that are not positive on a log axis. */
  double at(double value) {
    return start + (end - start) * share(value);
  }

  private double share(double value) {
    if (!logarithmic) {
      return (value - range.low()) / range.span();
    }
    if (!(value > 0)) {
      return Double.NaN;
    }
    double low = StrictMath.log10(range.low());
    return (StrictMath.log10(value) - low) / (StrictMath.log10(range.high()) - low);
  }
}
