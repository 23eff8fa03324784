package pinchoff.device;

import java.util.Optional;
import java.util.OptionalDouble;
import pinchoff.numeric.NumericException;
import pinchoff.numeric.Roots;

/**
 * A model that ends at the threshold against the all-region model with the same parameters, at the
 * same V_OV, V_DS, length factor and, calibrated, the same current in strong inversion and
 * saturation. The threshold at the actual V_SB is held, so that only the shape of the current
 * differs.
 *
 * @param allRegionCurrent what flows by the all-region model (A)
 * @param currentError relative error of the model's I_D at equal V_GS
 * @param voltageError V_GS of the model minus that of the all-region model at equal I_D (V)
 * @param gmErrorAtVoltage relative error of g_m at equal V_GS
 * @param gmErrorAtCurrent relative error of g_m at equal I_D
 * @param triodeError relative error of the conductance at V_DS = 0: most of it is 1/n, an artefact
 *     of matching both models in saturation
 * @param slope the slope factor n that was used
 */
record TrustComparison(
    double allRegionCurrent,
    double currentError,
    OptionalDouble voltageError,
    double gmErrorAtVoltage,
    OptionalDouble gmErrorAtCurrent,
    OptionalDouble triodeError,
    double slope) {
  private static final double REACH = 5;

  /** Empty if the parameters do not support the all-region model, or nothing flows by it. */
  static Optional<TrustComparison> of(OperatingPoint op) {
    Transistor t = op.transistor();
    if (AllRegion.STANDARD.lacking(t).isPresent()) {
      return Optional.empty();
    }
    Channel c = op.channel();
    double vgs = c.threshold() + op.vov();
    double[] smooth = evaluate(AllRegion.STANDARD, c, vgs, op.vds());
    double current = c.sign() * smooth[ChannelModel.CURRENT];
    double gm = smooth[ChannelModel.BY_GATE];
    if (!(current > 0) || !(gm > 0)) {
      return Optional.empty();
    }
    double[] plain = evaluate(t.model(), c, vgs, op.vds());
    double shortfall = c.sign() * plain[ChannelModel.CURRENT] / current - 1;
    OptionalDouble equal = gateAt(t.model(), c, op.vds(), current);
    OptionalDouble gmAtCurrent = OptionalDouble.empty();
    OptionalDouble voltage = OptionalDouble.empty();
    if (equal.isPresent()) {
      double[] there = evaluate(t.model(), c, equal.getAsDouble(), op.vds());
      gmAtCurrent = OptionalDouble.of(there[ChannelModel.BY_GATE] / gm - 1);
      voltage = OptionalDouble.of(equal.getAsDouble() - vgs);
    }
    return Optional.of(
        new TrustComparison(
            current,
            shortfall,
            voltage,
            plain[ChannelModel.BY_GATE] / gm - 1,
            gmAtCurrent,
            triode(t.model(), c, vgs),
            c.slope()));
  }

  private static OptionalDouble triode(ChannelModel model, Channel c, double vgs) {
    double plain = evaluate(model, c, vgs, 0)[ChannelModel.BY_DRAIN];
    double smooth = evaluate(AllRegion.STANDARD, c, vgs, 0)[ChannelModel.BY_DRAIN];
    return plain > 0 && smooth > 0 ? OptionalDouble.of(plain / smooth - 1) : OptionalDouble.empty();
  }

  /** In the reflected voltages of the n equations, source and body at zero. */
  private static double[] evaluate(ChannelModel model, Channel c, double vgs, double vds) {
    double[] result = new double[ChannelModel.SIZE];
    model.evaluate(c, c.sign() * vgs, c.sign() * vds, 0, 0, result);
    return result;
  }

  /** The V_GS at which the model has a current. */
  private static OptionalDouble gateAt(ChannelModel model, Channel c, double vds, double current) {
    try {
      return OptionalDouble.of(
          Roots.between(
              "V_GS at equal I_D",
              vgs -> c.sign() * evaluate(model, c, vgs, vds)[ChannelModel.CURRENT] - current,
              c.threshold(),
              c.threshold() + REACH,
              1e-12));
    } catch (NumericException none) {
      return OptionalDouble.empty();
    }
  }
}
