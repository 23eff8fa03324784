package pinchoff.quantity;

/**
 * Ratios in decibels, for display only: calculations use the plain ratio.
 *
 * <p>Convention: a ratio of amplitudes (voltages, currents, a voltage gain) is 20·log10 of its
 * magnitude, a ratio of powers 10·log10. The sign of an amplitude ratio is a phase of 180° and does
 * not show. Zero has no value in decibels and is refused.
 */
public final class Decibels {
  private static final double PER_DECADE_OF_AMPLITUDE = 20;
  private static final double PER_DECADE_OF_POWER = 10;

  private Decibels() {}

  /**
   * A ratio of amplitudes, 20·log10|<i>r</i>|.
   *
   * @param ratio a pure number other than zero
   */
  public static double ofAmplitude(Quantity ratio) {
    return PER_DECADE_OF_AMPLITUDE * log10(ratio);
  }

  /**
   * A ratio of powers, 10·log10(<i>r</i>).
   *
   * @param ratio a pure number above zero
   */
  public static double ofPower(Quantity ratio) {
    if (ratio.ratio() < 0) {
      throw new QuantityException(
          "a power ratio of " + ratio + " in dB: expected a ratio above zero");
    }
    return PER_DECADE_OF_POWER * log10(ratio);
  }

  /**
   * A ratio of amplitudes as text: {@code "26.02 dB"} for 20 and 4 digits.
   *
   * @param digits significant digits, 1 to 17
   */
  public static String amplitudeText(Quantity ratio, int digits) {
    return text(ofAmplitude(ratio), digits);
  }

  /**
   * A ratio of powers as text: {@code "13.01 dB"} for 20 and 4 digits.
   *
   * @param digits significant digits, 1 to 17
   */
  public static String powerText(Quantity ratio, int digits) {
    return text(ofPower(ratio), digits);
  }

  private static double log10(Quantity ratio) {
    if (ratio.ratio() == 0) {
      throw new QuantityException("a ratio of zero in dB: expected a ratio other than zero");
    }
    return StrictMath.log10(Math.abs(ratio.ratio()));
  }

  private static String text(double decibels, int digits) {
    return Quantity.ofSi(decibels, Dimension.NONE).format(digits) + " dB";
  }
}
