package pinchoff.chart;

import java.util.Optional;
import pinchoff.drawing.Dash;

/**
 * A curve.
 *
 * @param name its label, such as {@code V_GS = 0.8 V}; symbols in it are typeset
 * @param points where it runs
 * @param onRight true if its values belong to the panel's right axis
 * @param colour which colour of the palette, from 0; chosen by its place among the lines if empty
 * @param dash how it is broken; chosen if empty
 */
public record Line(
    String name, Points points, boolean onRight, Optional<Integer> colour, Optional<Dash> dash)
    implements Item {

  /** Checks the name. */
  public Line {
    Item.checkedName(name);
  }

  /** A curve through these points, in SI units. */
  public static Line of(String name, double[] xs, double[] ys) {
    return of(name, Points.of(xs, ys));
  }

  /** A curve through these points, in SI units. */
  public static Line of(String name, Points points) {
    return new Line(name, points, false, Optional.empty(), Optional.empty());
  }

  /** This curve against the panel's right axis. */
  public Line onRightAxis() {
    return new Line(name, points, true, colour, dash);
  }

  /**
   * This curve in a given colour of the palette, for example that of the curve that it is compared
   * with.
   *
   * @param index from 0
   */
  public Line coloured(int index) {
    return new Line(name, points, onRight, Optional.of(index), dash);
  }

  /** This curve with a given line pattern. */
  public Line dashed(Dash pattern) {
    return new Line(name, points, onRight, colour, Optional.of(pattern));
  }
}
