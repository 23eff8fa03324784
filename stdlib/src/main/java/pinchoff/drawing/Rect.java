package pinchoff.drawing;

/**
 * An upright rectangle; y grows downwards.
 *
 * @param x left edge
 * @param y upper edge
 * @param width not negative
 * @param height not negative
 */
public record Rect(double x, double y, double width, double height) {

  /** Checks that the rectangle is finite and not inside out. */
  public Rect {
    if (!(Double.isFinite(x + y) && width >= 0 && height >= 0 && width + height < 1e9)) {
      throw new IllegalArgumentException(
          "rectangle at (%s, %s) of %s by %s".formatted(x, y, width, height));
    }
  }

  /** The right edge. */
  public double right() {
    return x + width;
  }

  /** The lower edge. */
  public double bottom() {
    return y + height;
  }

  /** The middle from left to right. */
  public double centreX() {
    return x + width / 2;
  }

  /** The middle from top to bottom. */
  public double centreY() {
    return y + height / 2;
  }

  /** This rectangle made larger on all sides; smaller for a negative margin. */
  public Rect grown(double margin) {
    return new Rect(
        x - margin, y - margin, Math.max(0, width + 2 * margin), Math.max(0, height + 2 * margin));
  }

  /** True if the point lies inside or on an edge. */
  public boolean contains(double px, double py) {
    return px >= x && px <= right() && py >= y && py <= bottom();
  }

  /** True if the other rectangle lies inside this one. */
  public boolean contains(Rect other) {
    return other.x >= x && other.right() <= right() && other.y >= y && other.bottom() <= bottom();
  }

  /** True if the two have an area in common. */
  public boolean overlaps(Rect other) {
    return x < other.right() && other.x < right() && y < other.bottom() && other.y < bottom();
  }
}
