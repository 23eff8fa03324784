package pinchoff.chart;

import java.util.Optional;

/**
 * Separate points, such as measured ones, drawn as small open circles.
 *
 * @param name their label; symbols in it are typeset
 * @param points where they stand
 * @param colour which colour of the palette, from 0, for example that of the line they belong to;
 *     chosen by their place among lines and dots if empty
 */
public record Dots(String name, Points points, Optional<Integer> colour) implements Item {

  /** Checks the name. */
  public Dots {
    Item.checkedName(name);
  }

  /** Dots at these points, in SI units. */
  public static Dots of(String name, double[] xs, double[] ys) {
    return new Dots(name, Points.of(xs, ys), Optional.empty());
  }

  /** These dots in a given colour of the palette, from 0. */
  public Dots coloured(int index) {
    return new Dots(name, points, Optional.of(index));
  }
}
