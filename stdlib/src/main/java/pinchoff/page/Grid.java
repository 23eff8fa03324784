package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.quantity.Unit;

/**
 * A table made ready for setting: numbers formatted, units chosen, columns without content left
 * out, rows that nobody would read cut off.
 *
 * @param columns the columns that have content
 * @param rows the rows that are shown
 * @param hidden how many rows are not shown
 */
record Grid(List<Lane> columns, List<Table.Row> rows, int hidden) {
  /** The most rows that are shown; a longer table says how many more there are. */
  static final int MAX_ROWS = 200;

  /** A cell: its entry, and the figure if it is a number. */
  record Cell(Entry entry, Optional<Figure> figure) {
    private static final Cell NONE = new Cell(Entry.EMPTY, Optional.empty());
  }

  /**
   * A column.
   *
   * @param column what was asked for
   * @param cells one for each row that is shown, empty ones in the rows of group titles
   * @param shared the unit that all share
   * @param whole the most characters before a decimal mark
   * @param fraction the most characters from a decimal mark on
   * @param unit the most characters of a unit beside its number
   */
  record Lane(
      Column column, List<Cell> cells, Optional<Unit> shared, int whole, int fraction, int unit) {

    /** True if it holds any number, so that decimal marks stand under each other. */
    boolean numeric() {
      return whole > 0;
    }

    /** True if units stand beside their numbers. */
    boolean hasUnits() {
      return unit > 0;
    }

    private boolean isEmpty() {
      return column.heading().isEmpty()
          && cells.stream().allMatch(c -> c.entry().equals(Entry.EMPTY));
    }
  }

  static Grid of(Table table) {
    int shown = Math.min(MAX_ROWS, table.rows().size());
    List<Table.Row> rows = table.rows().subList(0, shown);
    List<Lane> lanes = new ArrayList<>();
    for (int i = 0; i < table.columns().size(); i++) {
      Lane lane = lane(table, i, rows);
      if (!lane.isEmpty()) {
        lanes.add(lane);
      }
    }
    return new Grid(lanes, rows, table.rows().size() - shown);
  }

  private static Lane lane(Table table, int index, List<Table.Row> rows) {
    Column column = table.columns().get(index);
    Optional<Unit> shared = SharedUnit.of(column, table.entries(index));
    List<Cell> cells = new ArrayList<>(rows.size());
    for (Table.Row row : rows) {
      cells.add(
          row instanceof Table.Row.Cells r ? cell(r.entries().get(index), shared) : Cell.NONE);
    }
    if (shared.isPresent()) {
      evenOut(cells);
    }
    List<Figure> figures = cells.stream().flatMap(c -> c.figure().stream()).toList();
    return new Lane(
        column,
        cells,
        shared,
        figures.stream().mapToInt(Figure::wholeLength).max().orElse(0),
        figures.stream().mapToInt(Figure::fractionLength).max().orElse(0),
        shared.isPresent() ? 0 : figures.stream().mapToInt(f -> f.unit().length()).max().orElse(0));
  }

  private static Cell cell(Entry entry, Optional<Unit> shared) {
    if (shared.isPresent() && entry instanceof Entry.Amount amount) {
      var inUnit = new Entry.Amount(amount.quantity().to(shared.get()), amount.digits());
      return new Cell(entry, Figure.of(inUnit));
    }
    return new Cell(entry, Figure.of(entry));
  }

  /** Values of a sweep, 0.6 0.65 0.7, get the same number of decimals: they are exact. */
  private static void evenOut(List<Cell> cells) {
    if (cells.stream().flatMap(c -> c.figure().stream()).allMatch(Figure::exact)) {
      int fraction =
          cells.stream()
              .flatMap(c -> c.figure().stream())
              .mapToInt(Figure::fractionLength)
              .max()
              .orElse(0);
      cells.replaceAll(c -> new Cell(c.entry(), c.figure().map(f -> f.padded(fraction))));
    }
  }
}
