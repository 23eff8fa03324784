package pinchoff.quantity;

import java.math.BigDecimal;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/**
 * An absolute temperature. It is no quantity, because 27 °C and 27 °C do not add to anything: the
 * difference of two temperatures is a quantity in kelvin, and a difference can be added.
 */
public final class Temperature implements Comparable<Temperature>, Displayable {
  private static final BigDecimal ZERO_CELSIUS = new BigDecimal("273.15");

  private final double kelvin;

  private Temperature(double kelvin) {
    this.kelvin = kelvin;
  }

  /**
   * A temperature in kelvin.
   *
   * @throws QuantityException unless it is finite and above absolute zero
   */
  public static Temperature ofKelvin(double kelvin) {
    if (!(kelvin > 0) || Double.isInfinite(kelvin)) {
      throw new QuantityException(
          "temperature " + Decimal.text(kelvin) + " K: expected above 0 K and finite");
    }
    return new Temperature(kelvin);
  }

  /**
   * A temperature in degrees Celsius.
   *
   * @throws QuantityException unless it is finite and above -273.15 °C
   */
  public static Temperature ofCelsius(double celsius) {
    double kelvin =
        Double.isFinite(celsius) ? Decimal.of(celsius).add(ZERO_CELSIUS).doubleValue() : celsius;
    if (!(kelvin > 0) || Double.isInfinite(kelvin)) {
      throw new QuantityException(
          "temperature " + Decimal.text(celsius) + " degC: expected above -273.15 degC and finite");
    }
    return new Temperature(kelvin);
  }

  /**
   * Reads a temperature: {@code "27 degC"}, {@code "27 °C"} or {@code "300.15 K"}.
   *
   * @throws QuantityException with the place of the fault
   */
  public static Temperature parse(String text) {
    return QuantityParser.temperature(text);
  }

  /** In kelvin. */
  public double kelvin() {
    return kelvin;
  }

  /** In degrees Celsius. */
  public double celsius() {
    return Decimal.of(kelvin).subtract(ZERO_CELSIUS).doubleValue();
  }

  /** How much warmer this is than another, in kelvin; negative if it is colder. */
  public Quantity minus(Temperature other) {
    double difference = Decimal.of(kelvin).subtract(Decimal.of(other.kelvin)).doubleValue();
    return Quantity.ofSi(difference, Dimension.TEMPERATURE);
  }

  /**
   * The temperature that is warmer by a difference in kelvin.
   *
   * @throws QuantityException if the difference is in another unit or leads to absolute zero or
   *     below
   */
  public Temperature plus(Quantity difference) {
    difference.requireDimension("temperature difference", Dimension.TEMPERATURE);
    return ofKelvin(Decimal.of(kelvin).add(Decimal.of(difference.si())).doubleValue());
  }

  @Override
  public int compareTo(Temperature other) {
    return Double.compare(kelvin, other.kelvin);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Temperature t && kelvin == t.kelvin;
  }

  @Override
  public int hashCode() {
    return Double.hashCode(kelvin);
  }

  /** In degrees Celsius: {@code "27 °C"}. */
  @Override
  public String toString() {
    return Engineering.brief(Quantity.ofSi(celsius(), Dimension.NONE)).number() + " °C";
  }

  /**
   * In kelvin, full precision and ASCII: {@link #parse} of it gives the same temperature to the
   * bit.
   */
  public String asciiText() {
    return Decimal.text(kelvin) + " K";
  }

  @Override
  public MimeBundle display() {
    return MimeBundle.text(toString());
  }
}
