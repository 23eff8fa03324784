package pinchoff.chart;

import pinchoff.quantity.Quantity;

/**
 * A single point with its name beside it, such as a bias point.
 *
 * @param name its label; symbols in it are typeset
 * @param x where it stands
 * @param y where it stands, against the left axis
 */
public record Marker(String name, Quantity x, Quantity y) implements Item {

  /** Checks the name. */
  public Marker {
    Item.checkedName(name);
  }

  /** A named point. */
  public static Marker of(String name, Quantity x, Quantity y) {
    return new Marker(name, x, y);
  }
}
