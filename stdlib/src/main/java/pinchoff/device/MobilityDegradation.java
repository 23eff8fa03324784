package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Mobility that falls with the gate field: k' becomes k'/(1 + θ V_OV).
 *
 * @param theta θ in 1/V, 0 or more; as a rule 0.1 to 0.4 /V (from memory)
 */
public record MobilityDegradation(Quantity theta) {

  /** Checks dimension and sign. */
  public MobilityDegradation {
    Check.notNegative("mobility degradation θ", theta, Dimension.PER_VOLTAGE);
  }
}
