package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntFunction;
import pinchoff.page.Grid.Cell;
import pinchoff.page.Grid.Lane;

/** Sets a table as plain text: columns by spaces, one rule below the headings. */
final class PlainTable {
  private static final String GAP = "  ";
  private static final int NARROWEST = 16;

  private final Table table;
  private final Grid grid;
  private final int[] widths;

  private PlainTable(Table table) {
    this.table = table;
    this.grid = Grid.of(table);
    this.widths = grid.columns().stream().mapToInt(PlainTable::width).toArray();
    fit();
  }

  static List<String> lines(Table table) {
    PlainTable plain = new PlainTable(table);
    List<String> lines = new ArrayList<>();
    if (!table.caption().isEmpty()) {
      lines.addAll(TextWidth.wrapped(table.caption().text(), PlainPage.PROSE));
    }
    plain.addRows(lines);
    if (plain.grid.hidden() > 0) {
      lines.add("… and " + plain.grid.hidden() + " more rows");
    }
    if (!table.note().isEmpty()) {
      lines.addAll(TextWidth.wrapped(table.note().text(), PlainPage.PROSE));
    }
    return lines;
  }

  private void addRows(List<String> lines) {
    if (table.hasHeadings()) {
      addLine(lines, i -> heading(grid.columns().get(i)));
      lines.add("─".repeat(total()));
    }
    for (int r = 0; r < grid.rows().size(); r++) {
      int row = r;
      if (grid.rows().get(r) instanceof Table.Row.Group group) {
        lines.add(group.title().text());
      } else {
        addLine(lines, i -> shown(grid.columns().get(i), row));
      }
    }
  }

  /** One row, which takes several lines where text is broken. */
  private void addLine(List<String> lines, IntFunction<String> texts) {
    List<List<String>> cells = new ArrayList<>();
    int height = 1;
    for (int i = 0; i < widths.length; i++) {
      List<String> cell = TextWidth.wrapped(texts.apply(i), Math.max(1, widths[i]));
      cells.add(cell);
      height = Math.max(height, cell.size());
    }
    for (int h = 0; h < height; h++) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < widths.length; i++) {
        String text = h < cells.get(i).size() ? cells.get(i).get(h) : "";
        line.append(i > 0 ? GAP : "").append(aligned(grid.columns().get(i), text, widths[i]));
      }
      lines.add(line.toString().stripTrailing());
    }
  }

  private static String aligned(Lane lane, String text, int width) {
    boolean atEnd = lane.column().alignment() == Column.Alignment.END;
    if (atEnd || (lane.numeric() && lane.shared().isPresent())) {
      return TextWidth.right(text, width);
    }
    return lane.column().alignment() == Column.Alignment.CENTER
        ? TextWidth.centered(text, width)
        : TextWidth.left(text, width);
  }

  private static String shown(Lane lane, int row) {
    Cell cell = lane.cells().get(row);
    return cell.figure().map(f -> figure(lane, f)).orElseGet(() -> PlainEntries.text(cell.entry()));
  }

  private static String figure(Lane lane, Figure figure) {
    return " ".repeat(lane.whole() - figure.wholeLength())
        + figure.number()
        + " ".repeat(lane.fraction() - figure.fractionLength())
        + (lane.hasUnits() ? " " + TextWidth.left(figure.unit(), lane.unit()) : "");
  }

  private static String heading(Lane lane) {
    String text = lane.column().heading().text();
    return lane.shared()
        .map(u -> u.symbol())
        .filter(u -> !u.isEmpty())
        .map(u -> text + " (" + u + ")")
        .orElse(text);
  }

  private static int width(Lane lane) {
    int width = TextWidth.of(heading(lane));
    for (int row = 0; row < lane.cells().size(); row++) {
      width = Math.max(width, TextWidth.of(shown(lane, row)));
    }
    return width;
  }

  private int total() {
    int total = GAP.length() * (widths.length - 1);
    for (int width : widths) {
      total += width;
    }
    return total;
  }

  /** Makes the widest columns of text narrower until the table fits or none can give way. */
  private void fit() {
    for (int excess = total() - PlainPage.WIDEST; excess > 0; ) {
      int widest = widestText();
      if (widest < 0) {
        return;
      }
      int cut = Math.min(excess, widths[widest] - NARROWEST);
      widths[widest] -= cut;
      excess -= cut;
    }
  }

  private int widestText() {
    int widest = -1;
    for (int i = 0; i < widths.length; i++) {
      boolean gives = !grid.columns().get(i).numeric() && widths[i] > NARROWEST;
      if (gives && (widest < 0 || widths[i] > widths[widest])) {
        widest = i;
      }
    }
    return widest;
  }
}
