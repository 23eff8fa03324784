package pinchoff.technology;

import java.util.Optional;
import pinchoff.device.DeviceParameters;
import pinchoff.device.VelocitySaturation;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * How the parameters of a device differ from the typical ones in a process corner. A corner is
 * common to the whole chip: it never applies to one of two matched devices alone.
 *
 * @param thresholdShift how much harder the device is to turn on (V): added to V_TH of an n device,
 *     taken from V_TH of a p device; positive is slower for both
 * @param transconductanceFactor k' is multiplied by this, above 0
 * @param oxideCapacitanceFactor C_ox is multiplied by this, above 0
 */
public record CornerShift(
    Quantity thresholdShift, double transconductanceFactor, double oxideCapacitanceFactor) {

  /** No difference. */
  public static final CornerShift NONE = new CornerShift(Quantity.ofSi(0, Dimension.VOLTAGE), 1, 1);

  /**
   * Checks dimension and range.
   *
   * @throws TechnologyException if a factor is not above 0 and finite
   * @throws pinchoff.quantity.QuantityException if the shift is no voltage
   */
  public CornerShift {
    thresholdShift.requireDimension("threshold shift of a corner", Dimension.VOLTAGE);
    requirePositive("transconductance factor of a corner", transconductanceFactor);
    requirePositive("oxide capacitance factor of a corner", oxideCapacitanceFactor);
  }

  private static void requirePositive(String what, double factor) {
    if (!(factor > 0) || Double.isInfinite(factor)) {
      throw new TechnologyException(what + " = " + factor + ": expected more than 0 and finite");
    }
  }

  /**
   * The parameters in this corner: V_TH0, k', C_ox, and the mobility of the set with velocity
   * saturation, which goes as k'/C_ox. All others stay.
   *
   * @throws pinchoff.device.DeviceException if the threshold changes sign, which makes another kind
   *     of device of it
   */
  public DeviceParameters applyTo(DeviceParameters typical) {
    Quantity shift = thresholdShift.times(typical.polarity().sign());
    DeviceParameters.Builder shifted =
        typical.toBuilder()
            .zeroBiasThreshold(typical.zeroBiasThreshold().plus(shift))
            .processTransconductance(
                typical.processTransconductance().times(transconductanceFactor));
    typical
        .oxideCapacitance()
        .ifPresent(c -> shifted.oxideCapacitance(c.times(oxideCapacitanceFactor)));
    Optional<VelocitySaturation> velocity = typical.velocitySaturation();
    velocity.ifPresent(
        v ->
            shifted.velocitySaturation(
                new VelocitySaturation(v.velocity(), v.mobility().times(mobilityFactor()))));
    return shifted.build();
  }

  private double mobilityFactor() {
    return transconductanceFactor / oxideCapacitanceFactor;
  }
}
