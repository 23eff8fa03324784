package pinchoff.derive;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.DoubleUnaryOperator;
import pinchoff.display.Host;
import pinchoff.numeric.NumericException;
import pinchoff.numeric.Roots;

/**
 * The roots of a function in an interval, found from samples: a change of sign between neighbours,
 * or a place where the function touches zero. Samples are evenly spaced over the whole and again
 * over the part that matters most, and closer and closer towards zero. Roots closer together than
 * these may be taken for none or one. A change of sign at a pole is no root.
 */
final class RootScan {
  private static final int SAMPLES = 2000;
  private static final int DECADES = 27;
  private static final int PER_DECADE = 60;
  private static final double SMALL = 1e-9;

  /** Zero, compared with what the function is at the neighbouring samples. */
  private static final double TOUCHING = 1e-6;

  private final DoubleUnaryOperator function;
  private final double low;
  private final double high;
  private final double innerLow;
  private final double innerHigh;
  private final List<Double> roots = new ArrayList<>();

  private RootScan(
      DoubleUnaryOperator function, double low, double high, double innerLow, double innerHigh) {
    this.function = function;
    this.low = low;
    this.high = high;
    this.innerLow = innerLow;
    this.innerHigh = innerHigh;
  }

  /**
   * The roots in an interval, in order.
   *
   * @param innerLow lower end of the part that matters most
   * @param innerHigh upper end of that part
   */
  static List<Double> of(
      DoubleUnaryOperator function, double low, double high, double innerLow, double innerHigh) {
    RootScan scan = new RootScan(function, low, high, innerLow, innerHigh);
    scan.run();
    return scan.roots;
  }

  private void run() {
    double[] x = places().stream().mapToDouble(Double::doubleValue).toArray();
    double[] y = new double[x.length];
    for (int i = 0; i < x.length; i++) {
      Host.current().checkpoint();
      y[i] = function.applyAsDouble(x[i]);
    }
    for (int i = 0; i < x.length; i++) {
      if (y[i] == 0) {
        add(x[i]);
      } else if (i > 0 && y[i - 1] * Math.signum(y[i]) < 0) {
        change(x[i - 1], x[i], Math.min(Math.abs(y[i - 1]), Math.abs(y[i])));
      } else if (i > 0 && i + 1 < x.length) {
        touch(x[i - 1], x[i + 1], y[i - 1], y[i], y[i + 1]);
      }
    }
  }

  private SortedSet<Double> places() {
    SortedSet<Double> places = new TreeSet<>();
    for (int i = 0; i <= SAMPLES; i++) {
      places.add(low + (high - low) * i / SAMPLES);
      places.add(innerLow + (innerHigh - innerLow) * i / SAMPLES);
    }
    double largest = Math.max(Math.abs(low), Math.abs(high));
    for (int i = 0; i <= DECADES * PER_DECADE; i++) {
      double size = largest * StrictMath.pow(10, -(double) i / PER_DECADE);
      places.add(size);
      places.add(-size);
    }
    places.removeIf(p -> p < low || p > high);
    return places;
  }

  private void change(double a, double b, double least) {
    try {
      double root =
          Roots.between("root", function, a, b, Math.ulp(Math.max(Math.abs(a), Math.abs(b))));
      double there = Math.abs(function.applyAsDouble(root));
      if (there <= least) {
        add(root);
      }
    } catch (NumericException none) {
      // a pole, or a gap where the function has no value
    }
  }

  /** Where the function comes closest to zero without passing it. */
  private void touch(double a, double b, double ya, double ym, double yb) {
    double sign = Math.signum(ym);
    if (!(sign * ym < sign * ya && sign * ym <= sign * yb)) {
      return;
    }
    double l = a;
    double h = b;
    for (int i = 0; i < 100; i++) {
      double one = l + (h - l) / 3;
      double two = h - (h - l) / 3;
      if (sign * function.applyAsDouble(one) < sign * function.applyAsDouble(two)) {
        h = two;
      } else {
        l = one;
      }
    }
    double best = l + (h - l) / 2;
    double there = function.applyAsDouble(best);
    if (sign * there < 0) {
      change(a, best, Math.abs(there));
      change(best, b, Math.abs(there));
    } else if (Math.abs(there) <= TOUCHING * Math.min(Math.abs(ya), Math.abs(yb))) {
      add(best);
    }
  }

  private void add(double root) {
    double last = roots.isEmpty() ? Double.NaN : roots.get(roots.size() - 1);
    if (!(Math.abs(root - last) <= SMALL * Math.max(Math.abs(root), Math.abs(last)))) {
      roots.add(root);
    }
  }
}
