package pinchoff.technology;

import pinchoff.quantity.Temperature;

/**
 * The temperatures that a process is made for.
 *
 * @param minimum the coldest
 * @param maximum the hottest, above the coldest
 */
public record TemperatureRange(Temperature minimum, Temperature maximum) {

  /** Checks the order. */
  public TemperatureRange {
    if (minimum.compareTo(maximum) >= 0) {
      throw new TechnologyException(
          "temperature range from "
              + minimum
              + " to "
              + maximum
              + ": expected the first to be colder");
    }
  }

  /** True if the temperature lies in the range, ends included. */
  public boolean contains(Temperature temperature) {
    return temperature.compareTo(minimum) >= 0 && temperature.compareTo(maximum) <= 0;
  }
}
