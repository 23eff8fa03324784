package pinchoff.device;

import pinchoff.quantity.Constants;
import pinchoff.quantity.Quantity;

/**
 * A sized transistor at its temperature as plain SI numbers of the n equations: a p device's
 * threshold is reflected, everything else is a magnitude.
 *
 * @param sign +1 for n, −1 for p
 * @param beta β = k' W/L of all unit devices together (A/V²)
 * @param threshold V_TH0, reflected (V)
 * @param gamma γ (√V)
 * @param phi 2φ_F (V)
 * @param lambda λ at this length (1/V)
 * @param slope n of weak inversion
 * @param thermal kT/q (V)
 * @param theta θ (1/V), 0 if not given
 * @param criticalVoltage E_c L (V), 0 if not given
 * @param alpha exponent of the alpha-power law, 0 if not given
 * @param alphaCurrent I_D0 of this width (A)
 * @param alphaVoltage V_D0 (V)
 * @param alphaThreshold threshold of the alpha-power law (V)
 * @param alphaDrive supply minus that threshold (V)
 */
public record Channel(
    int sign,
    double beta,
    double threshold,
    double gamma,
    double phi,
    double lambda,
    double slope,
    double thermal,
    double theta,
    double criticalVoltage,
    double alpha,
    double alphaCurrent,
    double alphaVoltage,
    double alphaThreshold,
    double alphaDrive) {

  /** Below this share of 2φ_F the root of the body effect is continued by a straight line. */
  private static final double LEAST_SHARE = 1e-3;

  /** The figures of a transistor. */
  static Channel of(Transistor t) {
    DeviceParameters p = t.device().parameters();
    double kelvin = t.temperature().kelvin();
    double ratio = kelvin / p.nominalTemperature().kelvin();
    double width = t.effectiveWidth().si() * t.multiplier();
    double length = t.effectiveLength().si();
    double drift = 0;
    double mobility = 1;
    if (p.temperatureCoefficients().isPresent() && ratio != 1) {
      TemperatureCoefficients c = p.temperatureCoefficients().get();
      drift = c.thresholdDrift().si() * t.temperature().minus(p.nominalTemperature()).si();
      mobility = StrictMath.pow(ratio, -c.mobilityExponent());
    }
    double relativeMobility = mobility;
    AlphaPower a = p.alphaPower().orElse(null);
    return new Channel(
        p.polarity().sign(),
        p.processTransconductance().si() * mobility * width / length,
        p.polarity().sign() * p.zeroBiasThreshold().si() - drift,
        p.bodyFactor().si(),
        p.surfacePotential().si(),
        p.channelLengthModulation().si() / length,
        p.slopeFactorOrDefault(),
        Constants.thermalVoltage(t.temperature()).si(),
        p.mobilityDegradation().map(MobilityDegradation::theta).map(Quantity::si).orElse(0.0),
        p.velocitySaturation()
            .map(v -> v.criticalField().si() * length / relativeMobility)
            .orElse(0.0),
        a == null ? 0 : a.alpha(),
        a == null ? 0 : a.drainCurrent().si() * width * mobility,
        a == null ? 0 : a.saturationVoltage().si(),
        a == null ? 0 : a.threshold().si() - drift,
        a == null ? 0 : a.supply().si() - (a.threshold().si() - drift));
  }

  /** √(2φ_F + V_SB), continued by a straight line where that is nearly zero or less. */
  double bodyRoot(double vsb) {
    double least = LEAST_SHARE * phi;
    double under = phi + vsb;
    return under >= least
        ? Math.sqrt(under)
        : Math.sqrt(least) + (under - least) / (2 * Math.sqrt(least));
  }

  /** γ (√(2φ_F + V_SB) − √2φ_F): by how much V_SB raises the threshold. */
  double bodyShift(double vsb) {
    return gamma == 0 ? 0 : gamma * (bodyRoot(vsb) - Math.sqrt(phi));
  }

  /** χ = dV_TH/dV_SB = γ/(2√(2φ_F + V_SB)). */
  double backGateRatio(double vsb) {
    return gamma == 0 ? 0 : gamma / (2 * Math.sqrt(Math.max(phi + vsb, LEAST_SHARE * phi)));
  }

  /** The threshold at V_SB, in the reflected voltages of the n equations. */
  double thresholdAt(double vsb) {
    return threshold + bodyShift(vsb);
  }
}
