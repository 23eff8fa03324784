package pinchoff.device;

import java.util.Optional;
import pinchoff.numeric.LogSquare;

/**
 * The all-region interpolation of Enz, Krummenacher and Vittoz (Analog Integr. Circ. Sig. Proc. 8
 * (1995) 83): I_D = I_S [F(u_f) − F(u_r)] (1 + λ|V_DS|), F(u) = ln²(1 + e^(u/2)), u_f = (V_P −
 * V_SB)/U_T, u_r = (V_P − V_DB)/U_T, I_S = 2 n β_a U_T².
 *
 * <p><b>Calibration.</b> In strong inversion and saturation this gives β_a V_OV²/(2n). With β_a = n
 * β it meets the square law there; in deep triode the conductance is then n times that of the
 * square law, which is an artefact of the calibration and not physics. With β_a = β it is the other
 * way round.
 */
public final class AllRegion implements ChannelModel {

  /** How the pinch-off voltage follows the gate. */
  public enum PinchOff {
    /**
     * V_P = (V_GB − V_TH0)/n with a constant n: the threshold at the source is then V_TH0 + (n − 1)
     * V_SB, in place of the root law of the body effect.
     */
    CONSTANT_SLOPE,
    /**
     * The exact form, equal to the root law of the body effect; n = 1 + γ/(2√(2φ_F + V_P)) changes
     * with the gate voltage (form from memory).
     */
    EXACT
  }

  /** What is matched to the square law. */
  public enum Calibration {
    /** β_a = n β: strong inversion in saturation agrees with the square law. */
    SATURATION,
    /** β_a = β, as the equations are published. */
    NONE
  }

  /** Constant n, calibrated in saturation. */
  public static final AllRegion STANDARD =
      new AllRegion(PinchOff.CONSTANT_SLOPE, Calibration.SATURATION);

  /** Surface potentials below this many kT/q are left to a straight line of V_P. */
  private static final double LEAST_SURFACE = 4;

  private final PinchOff pinchOff;
  private final Calibration calibration;

  private AllRegion(PinchOff pinchOff, Calibration calibration) {
    this.pinchOff = pinchOff;
    this.calibration = calibration;
  }

  /** The interpolation with these choices. */
  public static AllRegion with(PinchOff pinchOff, Calibration calibration) {
    return new AllRegion(pinchOff, calibration);
  }

  /** What is matched to the square law. */
  public Calibration calibration() {
    return calibration;
  }

  /** How the pinch-off voltage follows the gate. */
  public PinchOff pinchOff() {
    return pinchOff;
  }

  @Override
  public String name() {
    return "all-region, "
        + (pinchOff == PinchOff.EXACT ? "exact pinch-off" : "constant n")
        + (calibration == Calibration.SATURATION ? ", β_a = nβ" : ", β_a = β");
  }

  @Override
  public void evaluate(
      Channel c, double gate, double drain, double source, double body, double[] result) {
    int sign = c.sign();
    double vsb = sign * (source - body);
    double vdb = sign * (drain - body);
    double vgb = sign * (gate - body);
    double surface = surface(c, vgb);
    double n = slope(c, surface);
    double vp = pinchOff(c, vgb, surface);
    double ut = c.thermal();
    double forward = LogSquare.root((vp - vsb) / ut);
    double reverse = LogSquare.root((vp - vdb) / ut);
    double specific = specificCurrent(c, n);
    double difference = (forward - reverse) * (forward + reverse);
    double vds = sign * (drain - source);
    double factor = 1 + c.lambda() * Math.abs(vds);
    double bySource = -specific * factor * LogSquare.slope(forward) / ut;
    double byDrain = specific * factor * LogSquare.slope(reverse) / ut;
    double byLength = Math.signum(vds) * c.lambda() * specific * difference;
    double byGate = -(bySource + byDrain) / n;
    byGate += specific * relativeSlope(c, surface, n) * difference * factor;
    bySource -= byLength;
    byDrain += byLength;
    result[CURRENT] = sign * (specific * difference * factor);
    result[BY_GATE] = byGate;
    result[BY_DRAIN] = byDrain;
    result[BY_SOURCE] = bySource;
    result[BY_BODY] = -(byGate + byDrain + bySource);
  }

  /** I_S = 2 n β_a U_T². */
  private double specificCurrent(Channel c, double n) {
    double matched = calibration == Calibration.SATURATION ? n : 1;
    return 2 * n * matched * c.beta() * c.thermal() * c.thermal();
  }

  /** 2φ_F + V_P for the exact form; not used for the other. */
  private double surface(Channel c, double vgb) {
    if (pinchOff == PinchOff.CONSTANT_SLOPE) {
      return 0;
    }
    double driven = vgb - c.threshold() + c.phi() + c.gamma() * Math.sqrt(c.phi());
    double root = Math.sqrt(Math.max(0, driven) + c.gamma() * c.gamma() / 4) - c.gamma() / 2;
    return root * root;
  }

  private double slope(Channel c, double surface) {
    return pinchOff == PinchOff.CONSTANT_SLOPE
        ? c.slope()
        : 1 + c.gamma() / (2 * Math.sqrt(Math.max(surface, LEAST_SURFACE * c.thermal())));
  }

  private double pinchOff(Channel c, double vgb, double surface) {
    if (pinchOff == PinchOff.CONSTANT_SLOPE) {
      return (vgb - c.threshold()) / c.slope();
    }
    double least = LEAST_SURFACE * c.thermal();
    if (surface >= least) {
      return surface - c.phi();
    }
    double driven = vgb - c.threshold() + c.phi() + c.gamma() * Math.sqrt(c.phi());
    double drivenLeast = least + c.gamma() * Math.sqrt(least);
    return least - c.phi() + (driven - drivenLeast) / slope(c, surface);
  }

  /** (dI_S/dV_G)/I_S: zero for a constant n. */
  private double relativeSlope(Channel c, double surface, double n) {
    if (pinchOff == PinchOff.CONSTANT_SLOPE || surface <= LEAST_SURFACE * c.thermal()) {
      return 0;
    }
    double byPinchOff = -c.gamma() / (4 * surface * Math.sqrt(surface));
    double power = calibration == Calibration.SATURATION ? 2 : 1;
    return power * byPinchOff / (n * n);
  }

  /**
   * The inversion coefficient F(u_f) at the source, in the reflected voltages of the n equations.
   */
  public double inversionCoefficient(Channel c, double vgs, double vsb) {
    double surface = surface(c, vgs + vsb);
    return LogSquare.of((pinchOff(c, vgs + vsb, surface) - vsb) / c.thermal());
  }

  @Override
  public double saturationVoltage(Channel c, double vgs, double vsb) {
    double ic = inversionCoefficient(c, vgs, vsb);
    return c.thermal() * (2 * Math.sqrt(ic + 0.25) + 3);
  }

  @Override
  public String saturationDefinition() {
    return "V_DS,sat = U_T (2√(IC + 1/4) + 3)";
  }

  @Override
  public boolean conductsBelowThreshold() {
    return true;
  }

  @Override
  public boolean isContinuous() {
    return true;
  }

  @Override
  public Optional<String> lacking(Transistor transistor) {
    DeviceParameters p = transistor.device().parameters();
    if (pinchOff == PinchOff.CONSTANT_SLOPE
        && p.slopeFactor().isEmpty()
        && p.bodyFactor().isZero()) {
      return Optional.of("slopeFactor n (or a body factor, from which it follows)");
    }
    return Optional.empty();
  }
}
