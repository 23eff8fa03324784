package pinchoff.technology;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import pinchoff.quantity.QuantityException;
import pinchoff.quantity.Temperature;

/** Absolute temperatures as text: {@code "27 degC"}, {@code "300.15 K"}. */
final class TemperatureText {
  private static final Pattern TEXT =
      Pattern.compile(
          "\\s*(?<number>[-+−]?\\d{1,20}(?:\\.\\d{1,20})?(?:[eE][-+]?\\d{1,3})?)"
              + "\\s*(?<unit>degC|°C|\u2103|K)\\s*");

  private TemperatureText() {}

  /**
   * Reads a temperature.
   *
   * @return empty if the text is no number with degC or K
   * @throws QuantityException if it is at or below absolute zero
   */
  static Optional<Temperature> parse(String text) {
    Matcher matcher = TEXT.matcher(text);
    if (!matcher.matches()) {
      return Optional.empty();
    }
    double number = Double.parseDouble(matcher.group("number").replace('−', '-'));
    return Optional.of(
        matcher.group("unit").equals("K")
            ? Temperature.ofKelvin(number)
            : Temperature.ofCelsius(number));
  }
}
