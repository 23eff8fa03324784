package pinchoff.chart;

/**
 * A boundary or a set of points with a property in common, such as the edge of saturation. Drawn as
 * a thin dashed line in the colour of the text.
 *
 * @param name its label; symbols in it are typeset
 * @param points where it runs
 */
public record Locus(String name, Points points) implements Item {

  /** Checks the name. */
  public Locus {
    Item.checkedName(name);
  }

  /** A locus through these points, in SI units. */
  public static Locus of(String name, double[] xs, double[] ys) {
    return new Locus(name, Points.of(xs, ys));
  }

  /** A locus through these points, in SI units. */
  public static Locus of(String name, Points points) {
    return new Locus(name, points);
  }
}
