package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import pinchoff.quantity.Unit;

/**
 * A table made ready for setting: numbers formatted, units chosen, columns without content left
 * out, rows that nobody would read cut off.
 *
 * @param columns the columns that have content
 * @param rows the rows that are shown
 * @param hidden how many rows are not shown
 * @param runsOn true if text may run on into empty cells behind it
 */
record Grid(List<Lane> columns, List<Table.Row> rows, int hidden, boolean runsOn) {
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
   * @param behind the most characters behind a number: its unit, rarely a power of ten
   */
  record Lane(
      Column column, List<Cell> cells, Optional<Unit> shared, int whole, int fraction, int behind) {

    /** True if it holds any number, so that decimal marks stand under each other. */
    boolean numeric() {
      return whole > 0;
    }

    /** True if units stand beside their numbers. */
    boolean hasUnits() {
      return behind > 0;
    }

    private boolean isEmpty() {
      return column.heading().isEmpty()
          && cells.stream().allMatch(c -> c.entry().equals(Entry.EMPTY));
    }
  }

  /**
   * How many lanes a text may take: in a sheet it may run on where nothing stands behind it, so
   * that one long text does not push all numbers apart.
   */
  int reach(int row, int lane) {
    Cell cell = columns.get(lane).cells().get(row);
    int reach = 1;
    if (runsOn && cell.figure().isEmpty()) {
      while (lane + reach < columns.size()
          && columns.get(lane + reach).cells().get(row).entry().equals(Entry.EMPTY)) {
        reach++;
      }
    }
    return reach;
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
    return new Grid(lanes, rows, table.rows().size() - shown, !table.hasHeadings());
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
    List<Figure> figures = figures(cells);
    return new Lane(
        column,
        cells,
        shared,
        longest(figures, Figure::whole),
        longest(figures, Figure::fraction),
        shared.isPresent() ? 0 : longest(figures, Figure::behindText));
  }

  private static List<Figure> figures(List<Cell> cells) {
    return cells.stream().flatMap(c -> c.figure().stream()).toList();
  }

  private static int longest(List<Figure> figures, Function<Figure, String> part) {
    return figures.stream().mapToInt(f -> part.apply(f).length()).max().orElse(0);
  }

  private static Cell cell(Entry entry, Optional<Unit> shared) {
    if (shared.isPresent() && entry instanceof Entry.Amount amount) {
      var inUnit = new Entry.Amount(amount.quantity().to(shared.get()), amount.digits());
      return new Cell(entry, Figure.of(inUnit));
    }
    return new Cell(entry, Figure.of(entry));
  }

  /**
   * Gives the values of a sweep digits alike: if all are exact, so many decimals as the longest has
   * (0.50 0.55 0.60), else as many digits as were asked for.
   */
  private static void evenOut(List<Cell> cells) {
    List<Figure> figures = figures(cells);
    boolean exact = figures.stream().allMatch(Figure::exact);
    int fraction = longest(figures, Figure::fraction);
    cells.replaceAll(
        cell ->
            new Cell(
                cell.entry(), cell.figure().map(f -> exact ? f.padded(fraction) : f.inFull())));
  }
}
