package pinchoff.drawing;

/**
 * What a path is stroked with. Joins are round, ends are cut.
 *
 * @param colour the ink
 * @param width in CSS pixels, above 0 and at most 100
 * @param dash how the line is broken
 */
public record Pen(Colour colour, double width, Dash dash) {

  /** Checks the width. */
  public Pen {
    if (!(width > 0 && width <= 100)) {
      throw new IllegalArgumentException("pen width " + width + ": expected above 0, at most 100");
    }
  }

  /** A pen for unbroken lines. */
  public static Pen of(Colour colour, double width) {
    return new Pen(colour, width, Dash.SOLID);
  }

  /** This pen with another pattern. */
  public Pen with(Dash other) {
    return new Pen(colour, width, other);
  }
}
