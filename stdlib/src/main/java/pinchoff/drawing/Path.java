package pinchoff.drawing;

import java.util.Arrays;

/**
 * Lines and curves one after the other, in any number of pieces. Immutable.
 *
 * <p>Coordinates are finite and within ±10⁶ CSS pixels.
 */
public final class Path {
  private static final double FARTHEST = 1e6;
  private static final double QUARTER = 0.5522847498307936; // 4/3 (√2 - 1): a cubic for 90°

  private final byte[] steps;
  private final double[] coordinates;

  private Path(byte[] steps, double[] coordinates) {
    this.steps = steps;
    this.coordinates = coordinates;
  }

  /** Told each step of a path in order. */
  public interface Walker {
    /** A new piece begins here. */
    void moveTo(double x, double y);

    /** A straight line to here. */
    void lineTo(double x, double y);

    /** A quadratic curve to (x, y), drawn towards its control point. */
    void quadTo(double controlX, double controlY, double x, double y);

    /** A cubic curve to (x, y). */
    void cubicTo(double x1, double y1, double x2, double y2, double x, double y);

    /** A straight line back to where the piece began. */
    void close();
  }

  /** Starts an empty path. */
  public static Builder builder() {
    return new Builder();
  }

  /** A single straight line. */
  public static Path line(double x1, double y1, double x2, double y2) {
    return builder().moveTo(x1, y1).lineTo(x2, y2).build();
  }

  /** An upright rectangle. */
  public static Path rectangle(Rect r) {
    return builder()
        .moveTo(r.x(), r.y())
        .lineTo(r.right(), r.y())
        .lineTo(r.right(), r.bottom())
        .lineTo(r.x(), r.bottom())
        .close()
        .build();
  }

  /** A circle. */
  public static Path circle(double x, double y, double radius) {
    double k = radius * QUARTER;
    return builder()
        .moveTo(x + radius, y)
        .cubicTo(x + radius, y + k, x + k, y + radius, x, y + radius)
        .cubicTo(x - k, y + radius, x - radius, y + k, x - radius, y)
        .cubicTo(x - radius, y - k, x - k, y - radius, x, y - radius)
        .cubicTo(x + k, y - radius, x + radius, y - k, x + radius, y)
        .close()
        .build();
  }

  /** True if there is nothing to draw. */
  public boolean isEmpty() {
    return steps.length == 0;
  }

  /** How many steps the path has. */
  public int size() {
    return steps.length;
  }

  /** Tells the walker every step. */
  public void walk(Walker walker) {
    double[] c = coordinates;
    int i = 0;
    for (byte step : steps) {
      switch (step) {
        case Builder.MOVE -> walker.moveTo(c[i], c[i + 1]);
        case Builder.LINE -> walker.lineTo(c[i], c[i + 1]);
        case Builder.QUAD -> walker.quadTo(c[i], c[i + 1], c[i + 2], c[i + 3]);
        case Builder.CUBIC ->
            walker.cubicTo(c[i], c[i + 1], c[i + 2], c[i + 3], c[i + 4], c[i + 5]);
        default -> walker.close();
      }
      i += Builder.COORDINATES[step];
    }
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Path p
        && Arrays.equals(steps, p.steps)
        && Arrays.equals(coordinates, p.coordinates);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(coordinates);
  }

  @Override
  public String toString() {
    return "Path of " + steps.length + " steps";
  }

  /** Collects the steps of a path. */
  public static final class Builder {
    private static final byte MOVE = 0;
    private static final byte LINE = 1;
    private static final byte QUAD = 2;
    private static final byte CUBIC = 3;
    private static final byte CLOSE = 4;
    private static final int[] COORDINATES = {2, 2, 4, 6, 0};

    private byte[] steps = new byte[16];
    private double[] coordinates = new double[32];
    private int stepCount;
    private int coordinateCount;

    private Builder() {}

    /** Begins a new piece. */
    public Builder moveTo(double x, double y) {
      step(MOVE);
      return at(x, y);
    }

    /** Draws a straight line. */
    public Builder lineTo(double x, double y) {
      step(LINE);
      return at(x, y);
    }

    /** Draws a quadratic curve. */
    public Builder quadTo(double controlX, double controlY, double x, double y) {
      step(QUAD);
      return at(controlX, controlY).at(x, y);
    }

    /** Draws a cubic curve. */
    public Builder cubicTo(double x1, double y1, double x2, double y2, double x, double y) {
      step(CUBIC);
      return at(x1, y1).at(x2, y2).at(x, y);
    }

    /** Closes the piece. */
    public Builder close() {
      step(CLOSE);
      return this;
    }

    /** The finished path. */
    public Path build() {
      return new Path(Arrays.copyOf(steps, stepCount), Arrays.copyOf(coordinates, coordinateCount));
    }

    private void step(byte step) {
      if (stepCount == 0 && step != MOVE) {
        throw new IllegalStateException("a path begins with moveTo");
      }
      if (stepCount == steps.length) {
        steps = Arrays.copyOf(steps, 2 * stepCount);
      }
      steps[stepCount++] = step;
    }

    private Builder at(double x, double y) {
      if (!(Math.abs(x) <= FARTHEST && Math.abs(y) <= FARTHEST)) {
        throw new IllegalArgumentException(
            "path point (%s, %s): expected within ±%s px".formatted(x, y, FARTHEST));
      }
      if (coordinateCount + 2 > coordinates.length) {
        coordinates = Arrays.copyOf(coordinates, 2 * coordinates.length);
      }
      coordinates[coordinateCount++] = x;
      coordinates[coordinateCount++] = y;
      return this;
    }
  }
}
