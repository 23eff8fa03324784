package pinchoff.chart;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * Points of a curve in order, in SI units. NaN in either coordinate is a gap. Immutable.
 *
 * <p>There may be none; there are at most {@value #MAX_COUNT}.
 */
public final class Points {

  /** The largest number of points of one item. */
  public static final int MAX_COUNT = 4_000_000;

  private static final double FARTHEST = 1e100;

  private final double[] xs;
  private final double[] ys;

  private Points(double[] xs, double[] ys) {
    this.xs = xs;
    this.ys = ys;
  }

  /**
   * Points with these coordinates.
   *
   * @throws ChartException if the numbers of coordinates differ, there are too many, or one of them
   *     is infinite
   */
  public static Points of(double[] xs, double[] ys) {
    if (xs.length != ys.length) {
      throw new ChartException(
          "%d values of x but %d of y: a curve needs as many of each"
              .formatted(xs.length, ys.length));
    }
    if (xs.length > MAX_COUNT) {
      throw new ChartException(
          "%d points: at most %d are allowed in one curve".formatted(xs.length, MAX_COUNT));
    }
    Points points = new Points(xs.clone(), ys.clone());
    points.refuseWhatHasNoPlace();
    return points;
  }

  /**
   * Values of a function at evenly spaced places.
   *
   * @param count how many, at least 2
   */
  public static Points sampled(DoubleUnaryOperator function, double from, double to, int count) {
    if (count < 2) {
      throw new ChartException(count + " samples: at least 2 are needed");
    }
    double[] xs = new double[count];
    for (int i = 0; i < count; i++) {
      xs[i] = i == count - 1 ? to : from + (to - from) * i / (count - 1);
    }
    return of(xs, Arrays.stream(xs).map(function).toArray());
  }

  private void refuseWhatHasNoPlace() {
    for (int i = 0; i < xs.length; i++) {
      if (Math.abs(xs[i]) > FARTHEST || Math.abs(ys[i]) > FARTHEST) {
        boolean infinite = Double.isInfinite(xs[i]) || Double.isInfinite(ys[i]);
        throw new ChartException(
            "point %d is (%s, %s): %s cannot be drawn; use NaN for a gap"
                .formatted(
                    i + 1, xs[i], ys[i], infinite ? "infinity" : "a number beyond " + FARTHEST));
      }
    }
  }

  /** How many points there are, gaps included. */
  public int size() {
    return xs.length;
  }

  /** The horizontal coordinate of a point, counted from 0. */
  public double x(int index) {
    return xs[index];
  }

  /** The vertical coordinate of a point, counted from 0. */
  public double y(int index) {
    return ys[index];
  }

  /** True if neither coordinate of the point is NaN. */
  public boolean isPoint(int index) {
    return !Double.isNaN(xs[index]) && !Double.isNaN(ys[index]);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Points p && Arrays.equals(xs, p.xs) && Arrays.equals(ys, p.ys);
  }

  @Override
  public int hashCode() {
    return 31 * Arrays.hashCode(xs) + Arrays.hashCode(ys);
  }

  @Override
  public String toString() {
    return xs.length + " points";
  }
}
