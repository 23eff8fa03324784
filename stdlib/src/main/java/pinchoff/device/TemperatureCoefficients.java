package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * How threshold and mobility change with temperature: V_TH(T) = V_TH(T0) − a (T − T0) and µ(T) =
 * µ(T0) (T/T0)^−m.
 *
 * @param thresholdDrift a, in V/K: by how much V_TH of an n device, or −V_TH of a p device, falls
 *     per kelvin; 0 to 10 mV/K, as a rule 0.5 to 4 mV/K (from memory)
 * @param mobilityExponent m, 0 to 4: as a rule 1.2 to 2 (from memory)
 */
public record TemperatureCoefficients(Quantity thresholdDrift, double mobilityExponent) {

  /** Checks dimensions and ranges. */
  public TemperatureCoefficients {
    Check.notNegative("threshold drift", thresholdDrift, Dimension.VOLTAGE_PER_TEMPERATURE);
    if (thresholdDrift.si() > 0.01) {
      throw new DeviceException("threshold drift = " + thresholdDrift + ": expected 0 to 10 mV/K");
    }
    Check.within("mobility exponent", mobilityExponent, 0, 4);
  }
}
