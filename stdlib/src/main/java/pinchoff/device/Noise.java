package pinchoff.device;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Noise of the channel.
 *
 * @param excessFactor γ_n in S_I = 4kT γ_n g_m, referred to the gate transconductance in strong
 *     inversion and saturation, above 0; 2/3 n where empty
 * @param flicker K in S_V = K/(W L C_ox f), in V²F, 0 or more; no flicker noise is stated where
 *     empty
 */
public record Noise(Optional<Double> excessFactor, Optional<Quantity> flicker) {

  /** Nothing is known: thermal noise by the long-channel rule, no flicker noise. */
  public static final Noise LONG_CHANNEL = new Noise(Optional.empty(), Optional.empty());

  /** Dimension of K: V²F. */
  static final Dimension FLICKER = Dimension.VOLTAGE_SQUARED.times(Dimension.CAPACITANCE);

  /** Checks dimensions and ranges. */
  public Noise {
    excessFactor.ifPresent(f -> Check.within("noise excess factor", f, 1e-3, 100));
    Check.notNegative("flicker noise K", flicker, FLICKER);
  }
}
