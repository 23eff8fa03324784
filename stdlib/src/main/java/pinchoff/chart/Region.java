package pinchoff.chart;

/**
 * A filled area with its name inside, such as a region of operation. Areas may reach beyond the
 * axes; only what lies within is seen.
 *
 * @param name its label; symbols in it are typeset
 * @param outline its corners in order; it closes by itself
 */
public record Region(String name, Points outline) implements Item {

  /** Checks the name and that there are no gaps. */
  public Region {
    Item.checkedName(name);
    for (int i = 0; i < outline.size(); i++) {
      if (!outline.isPoint(i)) {
        throw new ChartException(
            "region \"%s\": corner %d is not a number; an outline has no gaps"
                .formatted(name, i + 1));
      }
    }
  }

  /** An area with these corners, in SI units. */
  public static Region of(String name, double[] xs, double[] ys) {
    return new Region(name, Points.of(xs, ys));
  }

  /** The area between two curves over the same values of x, in SI units. */
  public static Region between(String name, double[] xs, double[] lower, double[] upper) {
    int n = xs.length;
    if (lower.length != n || upper.length != n) {
      throw new ChartException(
          "region \"%s\": %d values of x, %d of the lower curve, %d of the upper one"
              .formatted(name, n, lower.length, upper.length));
    }
    double[] aroundX = new double[2 * n];
    double[] aroundY = new double[2 * n];
    for (int i = 0; i < n; i++) {
      aroundX[i] = xs[i];
      aroundY[i] = lower[i];
      aroundX[2 * n - 1 - i] = xs[i];
      aroundY[2 * n - 1 - i] = upper[i];
    }
    return of(name, aroundX, aroundY);
  }
}
