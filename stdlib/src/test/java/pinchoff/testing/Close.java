package pinchoff.testing;

import org.opentest4j.AssertionFailedError;

/** Comparison of doubles with a stated tolerance. NaN and infinity are close to nothing. */
public final class Close {

  private Close() {}

  /** True if the values differ by at most a fraction of the expected one. */
  public static boolean relative(double expected, double actual, double tolerance) {
    return Double.isFinite(actual) && Math.abs(actual - expected) <= tolerance * Math.abs(expected);
  }

  /** True if at most this many doubles lie between the two. */
  public static boolean ulps(double expected, double actual, int ulps) {
    return Double.isFinite(actual)
        && Math.abs(actual - expected)
            <= ulps * Math.ulp(Math.max(Math.abs(expected), Math.abs(actual)));
  }

  /** Asserts {@link #relative}. */
  public static void assertRelative(double expected, double actual, double tolerance, String what) {
    if (!relative(expected, actual, tolerance)) {
      throw new AssertionFailedError(
          what + ": relative difference " + Math.abs(actual / expected - 1) + " above " + tolerance,
          expected,
          actual);
    }
  }

  /** Asserts that the values differ by at most an amount. */
  public static void assertAbsolute(double expected, double actual, double tolerance, String what) {
    if (!(Math.abs(actual - expected) <= tolerance)) {
      throw new AssertionFailedError(
          what + ": difference " + Math.abs(actual - expected) + " above " + tolerance,
          expected,
          actual);
    }
  }

  /** Asserts {@link #ulps}. */
  public static void assertUlps(double expected, double actual, int ulps, String what) {
    if (!ulps(expected, actual, ulps)) {
      throw new AssertionFailedError(what + ": more than " + ulps + " ulp", expected, actual);
    }
  }
}
