package pinchoff.device;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Random differences between two devices that are drawn alike: σ² = A²/(W L) + S² D², with A as the
 * figure for the <em>difference</em> of the pair (Pelgrom et al., JSSC 24 (1989) 1433).
 *
 * @param threshold A_VT in V·m, 0 or more
 * @param currentFactor A_β in m (a relative spread times a length), 0 or more
 * @param thresholdDistance S_VT in V/m, 0 or more
 * @param currentFactorDistance S_β in 1/m, 0 or more
 */
public record Mismatch(
    Quantity threshold,
    Quantity currentFactor,
    Optional<Quantity> thresholdDistance,
    Optional<Quantity> currentFactorDistance) {

  /** Checks dimensions and signs. */
  public Mismatch {
    Check.notNegative("mismatch A_VT", threshold, Dimension.VOLTAGE_LENGTH);
    Check.notNegative("mismatch A_β", currentFactor, Dimension.LENGTH);
    Check.notNegative("mismatch S_VT", thresholdDistance, Dimension.FIELD);
    Check.notNegative("mismatch S_β", currentFactorDistance, Dimension.PER_LENGTH);
  }

  /** Without a distance term. */
  public static Mismatch of(Quantity threshold, Quantity currentFactor) {
    return new Mismatch(threshold, currentFactor, Optional.empty(), Optional.empty());
  }
}
