package pinchoff.device;

/**
 * The tolerance band of a region edge: 1 nV + 1e-12 relative. Rounded voltages never decide a
 * region: what falls into the band is called the edge.
 */
final class Band {
  static final double RELATIVE = 1e-12;
  private static final double ABSOLUTE = 1e-9;

  private Band() {}

  /** Half the width of the band around the edge between two voltages. */
  static double of(double a, double b) {
    return ABSOLUTE + RELATIVE * Math.max(Math.abs(a), Math.abs(b));
  }
}
