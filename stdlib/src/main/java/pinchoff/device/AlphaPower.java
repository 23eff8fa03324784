package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Parameters of the alpha-power law (Sakurai and Newton, JSSC 25 (1990) 584, from memory). They
 * hold for one channel length and one supply.
 *
 * @param alpha exponent of the saturation current, 1 (velocity saturation) to 2 (long channel)
 * @param drainCurrent I_D0: drain current per width at V_GS = V_DS = supply (A/m), above 0
 * @param saturationVoltage V_D0: drain saturation voltage at V_GS = supply, above 0
 * @param supply the supply that the two are given at, above the threshold
 * @param threshold V_TH of this law as a magnitude: a fitted figure, not the threshold of the other
 *     models; negative for a depletion device
 * @param length the channel length that all of it was fitted at
 */
public record AlphaPower(
    double alpha,
    Quantity drainCurrent,
    Quantity saturationVoltage,
    Quantity supply,
    Quantity threshold,
    Quantity length) {

  /** Checks dimensions and ranges. */
  public AlphaPower {
    Check.within("alpha", alpha, 1, 2);
    Check.positive("drain current per width I_D0", drainCurrent, Dimension.CURRENT_PER_LENGTH);
    Check.positive("saturation voltage V_D0", saturationVoltage, Dimension.VOLTAGE);
    Check.positive("supply of the alpha-power law", supply, Dimension.VOLTAGE);
    threshold.requireDimension("threshold of the alpha-power law", Dimension.VOLTAGE);
    Check.positive("length of the alpha-power law", length, Dimension.LENGTH);
    if (threshold.compareTo(supply) >= 0) {
      throw new DeviceException(
          "threshold of the alpha-power law = "
              + threshold
              + ": expected less than its supply of "
              + supply);
    }
  }
}
