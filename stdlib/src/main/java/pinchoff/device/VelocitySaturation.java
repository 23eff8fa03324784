package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Velocity saturation in the two-segment law: v = µE/(1+E/E_c) below E_c, v_sat above, with E_c = 2
 * v_sat/µ.
 *
 * @param velocity v_sat (m/s), above 0
 * @param mobility µ at low field (m²/V/s), above 0
 */
public record VelocitySaturation(Quantity velocity, Quantity mobility) {

  /** Checks dimensions and signs. */
  public VelocitySaturation {
    Check.positive("saturation velocity", velocity, Dimension.VELOCITY);
    Check.positive("mobility", mobility, Dimension.MOBILITY);
  }

  /** The critical field 2 v_sat/µ of the two-segment law; the one-segment law has half of it. */
  public Quantity criticalField() {
    return velocity.times(2).per(mobility);
  }
}
