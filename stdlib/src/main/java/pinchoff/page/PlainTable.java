package pinchoff.page;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntFunction;
import java.util.function.IntUnaryOperator;
import java.util.stream.IntStream;
import pinchoff.page.Grid.Cell;
import pinchoff.page.Grid.Lane;

/** Sets a table as plain text: columns by spaces, one rule below the headings. */
final class PlainTable {
  private static final String GAP = "  ";
  private static final int NARROWEST = 16;

  private final Table table;
  private final Grid grid;
  private final String indent;
  private final int[] widths;

  private PlainTable(Table table) {
    this.table = table;
    this.grid = Grid.of(table);
    this.indent = grid.rows().stream().anyMatch(Table.Row.Group.class::isInstance) ? GAP : "";
    this.widths = IntStream.range(0, grid.columns().size()).map(this::needed).toArray();
    stretch();
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
      addLine(lines, i -> heading(grid.columns().get(i)), i -> 1);
      lines.add("─".repeat(total()));
    }
    for (int r = 0; r < grid.rows().size(); r++) {
      int row = r;
      if (grid.rows().get(r) instanceof Table.Row.Group group) {
        lines.add(group.title().text());
      } else {
        addLine(lines, i -> shown(grid.columns().get(i), row), i -> grid.reach(row, i));
      }
    }
  }

  /** One row, which takes several lines where text is broken. */
  private void addLine(List<String> lines, IntFunction<String> texts, IntUnaryOperator reaches) {
    List<List<String>> cells = new ArrayList<>();
    int height = 1;
    for (int i = 0; i < widths.length; i += reaches.applyAsInt(i)) {
      int width = width(i, i + reaches.applyAsInt(i));
      List<String> cell = new ArrayList<>();
      for (String line : TextWidth.wrapped(texts.apply(i), width)) {
        cell.add(aligned(grid.columns().get(i), line, width));
      }
      cells.add(cell);
      height = Math.max(height, cell.size());
    }
    for (int h = 0; h < height; h++) {
      StringBuilder line = new StringBuilder(indent);
      for (List<String> cell : cells) {
        line.append(line.length() > indent.length() ? GAP : "");
        line.append(h < cell.size() ? cell.get(h) : " ".repeat(TextWidth.of(cell.get(0))));
      }
      lines.add(line.toString().stripTrailing());
    }
  }

  /** The width of some columns and the gaps between them; at least one. */
  private int width(int from, int to) {
    return Math.max(1, Arrays.stream(widths, from, to).sum() + GAP.length() * (to - from - 1));
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
    String number = TextWidth.right(figure.whole(), lane.whole()) + figure.fraction();
    int decimals = lane.whole() + lane.fraction();
    if (figure.power() != 0) {
      return number + (lane.hasUnits() ? figure.behindText() : "e" + figure.power());
    }
    String aligned = TextWidth.left(number, decimals);
    return lane.hasUnits() ? aligned + TextWidth.left(figure.behindText(), lane.behind()) : aligned;
  }

  private static String heading(Lane lane) {
    String text = lane.column().heading().text();
    return lane.shared()
        .map(u -> u.symbol())
        .filter(u -> !u.isEmpty())
        .map(u -> text + " (" + u + ")")
        .orElse(text);
  }

  /** The width that a column needs, texts that may run on left aside. */
  private int needed(int column) {
    Lane lane = grid.columns().get(column);
    int width = TextWidth.of(heading(lane));
    for (int row = 0; row < lane.cells().size(); row++) {
      if (grid.reach(row, column) == 1) {
        width = Math.max(width, TextWidth.of(shown(lane, row)));
      }
    }
    return width;
  }

  /** Widens the last of the columns that a text runs over until it fits. */
  private void stretch() {
    for (int row = 0; row < grid.rows().size(); row++) {
      for (int i = 0; i < widths.length; i++) {
        int end = i + grid.reach(row, i);
        int text = TextWidth.of(shown(grid.columns().get(i), row));
        widths[end - 1] += Math.max(0, text - width(i, end));
      }
    }
  }

  private int total() {
    return indent.length() + width(0, widths.length);
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
