package pinchoff.drawing;

import java.util.Locale;

/**
 * A colour in sRGB with an opacity.
 *
 * @param red red from 0 to 255
 * @param green green from 0 to 255
 * @param blue blue from 0 to 255
 * @param opacity from 0, invisible, to 1, covering
 */
public record Colour(int red, int green, int blue, double opacity) {

  /** White, the paper of every picture. */
  public static final Colour WHITE = of(0xFFFFFF);

  /** Checks the ranges. */
  public Colour {
    if (((red | green | blue) & ~0xFF) != 0) {
      throw new IllegalArgumentException(
          "colour (%d, %d, %d): each part must be from 0 to 255".formatted(red, green, blue));
    }
    if (!(opacity >= 0 && opacity <= 1)) {
      throw new IllegalArgumentException("opacity " + opacity + ": expected from 0 to 1");
    }
  }

  /**
   * A covering colour.
   *
   * @param rgb red, green and blue in one number, as in {@code 0x0072B2}
   */
  public static Colour of(int rgb) {
    return new Colour(rgb >> 16, rgb >> 8 & 0xFF, rgb & 0xFF, 1);
  }

  /** This colour with another opacity. */
  public Colour withOpacity(double other) {
    return new Colour(red, green, blue, other);
  }

  /**
   * This colour mixed with white, covering.
   *
   * @param share how much of this colour stays, from 0, white, to 1
   */
  public Colour tint(double share) {
    return new Colour(tint(red, share), tint(green, share), tint(blue, share), 1);
  }

  /**
   * This colour, darkened as far as text on white needs: to a contrast of at least 4.5 to 1 (W3C
   * WCAG 2.1, success criterion 1.4.3).
   */
  public Colour shade() {
    Colour darker = this;
    for (int step = 19; step > 0 && darker.luminance() > 0.18; step--) {
      double share = step / 20.0;
      darker =
          new Colour(
              (int) Math.round(red * share),
              (int) Math.round(green * share),
              (int) Math.round(blue * share),
              opacity);
    }
    return darker;
  }

  /** Relative luminance (W3C WCAG 2.1), from 0 to 1. */
  private double luminance() {
    return 0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue);
  }

  private static double linear(int part) {
    double share = part / 255.0;
    return share <= 0.04045 ? share / 12.92 : StrictMath.pow((share + 0.055) / 1.055, 2.4);
  }

  private static int tint(int part, double share) {
    return (int) Math.round(255 - (255 - part) * share);
  }

  /** Red, green and blue in one number. */
  public int rgb() {
    return red << 16 | green << 8 | blue;
  }

  /** The colour without its opacity as in {@code #0072b2}. */
  public String hex() {
    return String.format(Locale.ROOT, "#%06x", rgb());
  }
}
