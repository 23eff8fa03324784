package pinchoff.claims;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.page.Column;
import pinchoff.page.Page;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.page.Verdict;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Quantity;

/**
 * A named result with limits.
 *
 * @param name tells it from the other specs of a notebook
 * @param value what it is worth
 * @param limits least, typical and most
 */
public record Spec(String name, Quantity value, Limits limits) implements Displayable {
  private static final double BAND = 1e-12;

  /** Checks the name and the dimensions. */
  public Spec {
    Names.checked("spec", name);
    Dimension dimension = value.dimension();
    limits.min().ifPresent(q -> q.requireDimension("min of spec " + name, dimension));
    limits.typ().ifPresent(q -> q.requireDimension("typ of spec " + name, dimension));
    limits.max().ifPresent(q -> q.requireDimension("max of spec " + name, dimension));
  }

  /** A result whose limits follow. */
  public static Spec of(String name, Quantity value) {
    return new Spec(name, value, Limits.NONE);
  }

  /** The same spec with the least value that is accepted. */
  public Spec min(Quantity least) {
    return new Spec(name, value, limits.withMin(least));
  }

  /** The same spec with the value that is aimed at. */
  public Spec typ(Quantity typical) {
    return new Spec(name, value, limits.withTyp(typical));
  }

  /** The same spec with the most that is accepted. */
  public Spec max(Quantity most) {
    return new Spec(name, value, limits.withMax(most));
  }

  /** Whether the value keeps to its limits; unknown if there are none. */
  public Verdict verdict() {
    Optional<Quantity> margin = limits.margin(value);
    return margin
        .map(m -> Verdict.of(m, value.abs().times(BAND)))
        .orElseGet(() -> Verdict.unknown().saying("no limits"));
  }

  /** Several specs as one table: min, typ, max, value and verdict with the margin. */
  public static Page table(List<Spec> specs) {
    Table.Builder table =
        Table.of(
            Column.of("Spec"),
            Column.of("min"),
            Column.of("typ"),
            Column.of("max"),
            Column.of("value"),
            Column.of("verdict"));
    Page.Builder page = Page.untitled();
    for (Spec spec : specs) {
      Limits l = spec.limits();
      table.row(spec.name(), l.min(), l.typ(), l.max(), spec.value(), spec.verdict());
      page.value(Value.spec("spec " + spec.name(), spec.name(), spec.value(), l, spec.verdict()));
    }
    return page.table(table).build();
  }

  /** Several specs as one table. */
  public static Page table(Spec... specs) {
    return table(Arrays.asList(specs));
  }

  /** The spec as a table of one line. */
  public Page page() {
    return table(List.of(this));
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }
}
