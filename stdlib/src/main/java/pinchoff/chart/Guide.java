package pinchoff.chart;

import pinchoff.quantity.Quantity;

/**
 * A constant, drawn as a thin dotted line across the whole panel: a threshold, a limit, an
 * asymptote.
 *
 * @param name its label; symbols in it are typeset
 * @param value where it stands
 * @param vertical true if it stands upright at a value of x, false if it lies level at a value of y
 */
public record Guide(String name, Quantity value, boolean vertical) implements Item {

  /** Checks the name. */
  public Guide {
    Item.checkedName(name);
  }

  /** An upright line at a value of x. */
  public static Guide atX(String name, Quantity x) {
    return new Guide(name, x, true);
  }

  /** A level line at a value of y. */
  public static Guide atY(String name, Quantity y) {
    return new Guide(name, y, false);
  }
}
