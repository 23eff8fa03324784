package pinchoff.chart;

import java.util.Optional;
import pinchoff.drawing.TextLine;
import pinchoff.page.Symbol;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Unit;

/**
 * What is measured along an axis, and how.
 *
 * @param label what it is called; symbols in it are typeset
 * @param dimension the dimension of its values
 * @param logarithmic true for equal steps per factor, false for equal steps per difference
 * @param from its lower end; chosen to fit the data if empty
 * @param to its upper end; chosen to fit the data if empty
 * @param unit the unit of its numbers; chosen to suit the range if empty
 */
public record Axis(
    TextLine label,
    Dimension dimension,
    boolean logarithmic,
    Optional<Quantity> from,
    Optional<Quantity> to,
    Optional<Unit> unit) {

  /** Checks dimensions and order of the ends. */
  public Axis {
    String what = "axis " + label.text();
    from.ifPresent(q -> q.requireDimension("lower end of " + what, dimension));
    to.ifPresent(q -> q.requireDimension("upper end of " + what, dimension));
    if (unit.filter(u -> !u.dimension().equals(dimension)).isPresent()) {
      throw new ChartException(
          "%s measures %s: its unit cannot be %s"
              .formatted(what, dimension, unit.orElseThrow().symbol()));
    }
    if (logarithmic && from.filter(q -> q.si() <= 0).isPresent()) {
      throw new ChartException(
          "%s is logarithmic: its lower end must be above 0, found %s"
              .formatted(what, from.orElseThrow()));
    }
    if (from.isPresent() && to.isPresent() && !(from.get().si() < to.get().si())) {
      throw new ChartException(
          "%s: its lower end %s must be below its upper end %s"
              .formatted(what, from.get(), to.get()));
    }
  }

  /**
   * A linear axis.
   *
   * @param label such as {@code V_DS}, {@code g_m/I_D} or {@code error}
   */
  public static Axis of(String label, Dimension dimension) {
    return of(TextLine.of(Item.checkedName(label)), dimension);
  }

  /** A linear axis for a quantity in trade notation. */
  public static Axis of(Symbol symbol, Dimension dimension) {
    return of(TextLine.of(symbol), dimension);
  }

  private static Axis of(TextLine label, Dimension dimension) {
    return new Axis(label, dimension, false, Optional.empty(), Optional.empty(), Optional.empty());
  }

  /** This axis with equal steps per factor. */
  public Axis log() {
    return new Axis(label, dimension, true, from, to, unit);
  }

  /** This axis with both ends given. */
  public Axis range(Quantity lower, Quantity upper) {
    return new Axis(label, dimension, logarithmic, Optional.of(lower), Optional.of(upper), unit);
  }

  /** This axis with its lower end given. */
  public Axis from(Quantity lower) {
    return new Axis(label, dimension, logarithmic, Optional.of(lower), to, unit);
  }

  /** This axis with its upper end given. */
  public Axis to(Quantity upper) {
    return new Axis(label, dimension, logarithmic, from, Optional.of(upper), unit);
  }

  /** This axis with its numbers in a given unit. */
  public Axis in(Unit other) {
    return new Axis(label, dimension, logarithmic, from, to, Optional.of(other));
  }

  /** This axis with its numbers in a given unit, such as {@code mV}. */
  public Axis in(String other) {
    return in(Unit.parse(other));
  }
}
