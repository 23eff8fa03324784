package pinchoff.device;

import pinchoff.numeric.LogSquare;

/**
 * How strongly the channel is inverted at the acting source: the inversion coefficient IC =
 * F(V_OV/(n U_T)) with F(u) = ln²(1 + e^(u/2)) (Enz, Krummenacher and Vittoz 1995), with V_OV and n
 * at the actual V_SB.
 *
 * @param coefficient IC
 * @param slope n that was used
 * @param slopeKnown false if the parameters state neither n nor a body factor, so that 1 was used
 */
public record Inversion(double coefficient, double slope, boolean slopeKnown) {
  private static final double WEAK_BELOW = 0.1;
  private static final double STRONG_ABOVE = 10;

  /** Levels of inversion (bounds as in Wulff's lecture notes on integrated circuits, NTNU). */
  public enum Level {
    /** IC below 0.1. */
    WEAK("weak"),
    /** IC of 0.1 to 10. */
    MODERATE("moderate"),
    /** IC above 10. */
    STRONG("strong");

    private final String word;

    Level(String word) {
      this.word = word;
    }

    /** The level as it is shown: {@code "strong"}. */
    public String word() {
      return word;
    }
  }

  static Inversion of(Channel c, double vgs, double vsb, Transistor t) {
    DeviceParameters p = t.device().parameters();
    double n = p.slopeFactor().isPresent() ? c.slope() : 1 + c.backGateRatio(vsb);
    double u = (vgs - c.thresholdAt(vsb)) / (n * c.thermal());
    boolean known = p.slopeFactor().isPresent() || !p.bodyFactor().isZero();
    return new Inversion(LogSquare.of(u), n, known);
  }

  /** Weak, moderate or strong. */
  public Level level() {
    if (coefficient < WEAK_BELOW) {
      return Level.WEAK;
    }
    return coefficient > STRONG_ABOVE ? Level.STRONG : Level.MODERATE;
  }
}
