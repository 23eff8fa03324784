package pinchoff.numeric;

import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.exception.MathRuntimeException;

/** Roots of functions of one variable. */
public final class Roots {
  private static final int MOST_EVALUATIONS = 200;
  private static final int ORDER = 5;

  private Roots() {}

  /**
   * The root in an interval at whose ends the function has different signs (or is zero).
   *
   * @param what what is sought, for the message
   * @param accuracy largest error of the root
   * @throws NumericException if the signs are the same, or there is no convergence
   */
  public static double between(
      String what, DoubleUnaryOperator function, double low, double high, double accuracy) {
    double atLow = function.applyAsDouble(low);
    double atHigh = function.applyAsDouble(high);
    if (atLow == 0) {
      return low;
    }
    if (atHigh == 0) {
      return high;
    }
    if (!(atLow * Math.signum(atHigh) < 0)) {
      throw new NumericException(
          "%s: no change of sign between %s and %s (values %s and %s)"
              .formatted(what, low, high, atLow, atHigh));
    }
    try {
      return new BracketingNthOrderBrentSolver(1e-15, accuracy, 0, ORDER)
          .solve(MOST_EVALUATIONS, function::applyAsDouble, low, high);
    } catch (MathRuntimeException e) {
      throw new NumericException(
          "%s: no root found between %s and %s: %s".formatted(what, low, high, e.getMessage()));
    }
  }
}
