package pinchoff.numeric;

/**
 * F(u) = ln²(1 + e^(u/2)), which passes smoothly from e^u far below zero to (u/2)² far above it. It
 * joins weak to strong inversion in the interpolation of Enz, Krummenacher and Vittoz (Analog
 * Integr. Circ. Sig. Proc. 8 (1995) 83).
 */
public final class LogSquare {
  private static final double FAR = 80;

  private LogSquare() {}

  /** F(u), above zero or, below about −745, zero. */
  public static double of(double u) {
    double root = root(u);
    return root * root;
  }

  /** √F(u) = ln(1 + e^(u/2)). */
  public static double root(double u) {
    return u > FAR ? u / 2 + StrictMath.exp(-u / 2) : StrictMath.log1p(StrictMath.exp(u / 2));
  }

  /** F'(u) from √F(u): √F (1 − e^(−√F)), which needs no second exponential of u. */
  public static double slope(double root) {
    return -root * StrictMath.expm1(-root);
  }

  /** The u at which F(u) is a given value above zero: 2 ln(e^√F − 1). */
  public static double inverse(double value) {
    double root = Math.sqrt(value);
    return root > 1
        ? 2 * (root + StrictMath.log1p(-StrictMath.exp(-root)))
        : 2 * StrictMath.log(StrictMath.expm1(root));
  }
}
