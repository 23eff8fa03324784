package pinchoff.page;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Unit;

/** The one unit that all quantities of a column are shown in. */
final class SharedUnit {
  /** A number below this in the unit would lose its digits behind zeros. */
  private static final double SMALLEST = 1e-3;

  private SharedUnit() {}

  /** The unit of a column, or empty if each entry has its own. */
  static Optional<Unit> of(Column column, Stream<Entry> entries) {
    if (column.units() == Column.UnitStyle.OWN || column.unit().isPresent()) {
      return column.unit();
    }
    List<Quantity> quantities =
        entries
            .filter(Entry.Amount.class::isInstance)
            .map(e -> ((Entry.Amount) e).quantity())
            .toList();
    return quantities.isEmpty() || !alike(quantities) ? Optional.empty() : fitting(quantities);
  }

  private static boolean alike(List<Quantity> quantities) {
    return quantities.stream().map(Quantity::dimension).distinct().count() == 1;
  }

  private static Optional<Unit> fitting(List<Quantity> quantities) {
    Quantity largest =
        quantities.stream().max(Comparator.comparingDouble(q -> Math.abs(q.si()))).orElseThrow();
    Unit unit = Engineering.of(largest, Entry.DIGITS).in();
    boolean fits =
        quantities.stream().allMatch(q -> q.isZero() || Math.abs(q.in(unit)) >= SMALLEST);
    return fits ? Optional.of(unit) : Optional.empty();
  }
}
