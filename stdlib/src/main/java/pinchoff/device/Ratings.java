package pinchoff.device;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * What the process allows: magnitudes, above 0, each only if stated.
 *
 * @param gateSource |V_GS|
 * @param gateDrain |V_GD|
 * @param gateBody |V_GB|
 * @param drainSource |V_DS|
 * @param drainBody |V_DB|
 * @param bodySource |V_BS|
 * @param power dissipation of one unit device
 */
public record Ratings(
    Optional<Quantity> gateSource,
    Optional<Quantity> gateDrain,
    Optional<Quantity> gateBody,
    Optional<Quantity> drainSource,
    Optional<Quantity> drainBody,
    Optional<Quantity> bodySource,
    Optional<Quantity> power) {

  /** Nothing is stated. */
  public static final Ratings NONE =
      new Ratings(
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          Optional.empty());

  /** Checks dimensions and signs. */
  public Ratings {
    Check.positive("rating of V_GS", gateSource, Dimension.VOLTAGE);
    Check.positive("rating of V_GD", gateDrain, Dimension.VOLTAGE);
    Check.positive("rating of V_GB", gateBody, Dimension.VOLTAGE);
    Check.positive("rating of V_DS", drainSource, Dimension.VOLTAGE);
    Check.positive("rating of V_DB", drainBody, Dimension.VOLTAGE);
    Check.positive("rating of V_BS", bodySource, Dimension.VOLTAGE);
    Check.positive("rating of power", power, Dimension.POWER);
  }

  /** One limit for every voltage between two terminals. */
  public static Ratings of(Quantity everyVoltage) {
    Optional<Quantity> v = Optional.of(everyVoltage);
    return new Ratings(v, v, v, v, v, v, Optional.empty());
  }
}
