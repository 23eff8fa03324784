package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Overlap capacitances of the gate.
 *
 * @param gateSource over the source, per width (F/m), 0 or more
 * @param gateDrain over the drain, per width (F/m), 0 or more
 */
public record Overlap(Quantity gateSource, Quantity gateDrain) {

  /** Checks dimensions and signs. */
  public Overlap {
    Check.notNegative("gate-source overlap", gateSource, Dimension.CAPACITANCE_PER_LENGTH);
    Check.notNegative("gate-drain overlap", gateDrain, Dimension.CAPACITANCE_PER_LENGTH);
  }

  /** The same on both sides. */
  public static Overlap of(Quantity perWidth) {
    return new Overlap(perWidth, perWidth);
  }
}
