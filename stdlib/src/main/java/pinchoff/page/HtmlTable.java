package pinchoff.page;

import pinchoff.page.Column.Alignment;
import pinchoff.page.Grid.Cell;
import pinchoff.page.Grid.Lane;

/**
 * Sets a table as HTML.
 *
 * <p>Decimal marks stand under each other because numbers stand at the right, in digits of equal
 * width, and shorter fractions are filled up with spaces that are as wide as a digit: a number
 * stays one piece of text, for those who copy it and for those who hear it.
 */
final class HtmlTable {
  private static final char FIGURE_SPACE = '\u2007';
  private static final char PUNCTUATION_SPACE = '\u2008';

  private final StringBuilder out = new StringBuilder();
  private final Table table;
  private final Grid grid;

  private HtmlTable(Table table) {
    this.table = table;
    this.grid = Grid.of(table);
  }

  static String of(Table table) {
    HtmlTable html = new HtmlTable(table);
    html.write();
    return html.out.toString();
  }

  private void write() {
    boolean headed = table.hasHeadings();
    out.append("<table class=\"pinchoff-table ");
    out.append(headed ? "pinchoff-grid" : "pinchoff-sheet").append("\">");
    if (!table.caption().isEmpty()) {
      out.append("<caption>").append(HtmlEntries.html(table.caption())).append("</caption>");
    }
    if (headed) {
      writeHead();
    }
    out.append("<tbody>");
    for (int row = 0; row < grid.rows().size(); row++) {
      writeRow(row);
    }
    out.append("</tbody></table>");
    if (grid.hidden() > 0) {
      out.append("<p class=\"pinchoff-note\">… and ")
          .append(grid.hidden())
          .append(" more rows</p>");
    }
    if (!table.note().isEmpty()) {
      out.append("<p class=\"pinchoff-note\">").append(HtmlEntries.html(table.note()));
      out.append("</p>");
    }
  }

  private void writeHead() {
    out.append("<thead><tr>");
    for (Lane lane : grid.columns()) {
      out.append("<th scope=\"col\"");
      out.append(lane.numeric() ? " class=\"pinchoff-n\" align=\"right\"" : alignment(lane));
      out.append('>').append(HtmlEntries.html(lane.column().heading()));
      lane.shared()
          .filter(unit -> !unit.symbol().isEmpty())
          .ifPresent(
              unit ->
                  out.append(" <span class=\"pinchoff-unit\">(")
                      .append(unit.html())
                      .append(")</span>"));
      out.append("</th>");
      if (lane.hasUnits()) {
        out.append("<th></th>");
      }
    }
    out.append("</tr></thead>");
  }

  private void writeRow(int row) {
    if (grid.rows().get(row) instanceof Table.Row.Group group) {
      out.append("<tr class=\"pinchoff-group\"><th scope=\"rowgroup\" align=\"left\" colspan=\"");
      out.append(span(0, grid.columns().size()))
          .append("\">")
          .append(HtmlEntries.html(group.title()))
          .append("</th></tr>");
      return;
    }
    out.append("<tr>");
    for (int i = 0; i < grid.columns().size(); ) {
      Lane lane = grid.columns().get(i);
      Cell cell = lane.cells().get(row);
      int reach = grid.reach(row, i);
      if (cell.figure().isPresent()) {
        writeFigure(lane, cell.figure().get());
      } else {
        writeText(lane, cell.entry(), span(i, i + reach));
      }
      i += reach;
    }
    out.append("</tr>");
  }

  /** The columns of HTML that some columns of the table take. */
  private int span(int from, int to) {
    return grid.columns().subList(from, to).stream()
        .mapToInt(lane -> lane.hasUnits() ? 2 : 1)
        .sum();
  }

  private void writeFigure(Lane lane, Figure figure) {
    out.append("<td class=\"pinchoff-n\" align=\"right\">").append(figure.signedDigits());
    int missing = lane.fraction() - figure.fraction().length();
    if (missing > 0 && figure.fraction().isEmpty()) {
      out.append(PUNCTUATION_SPACE);
      missing--;
    }
    out.append(String.valueOf(FIGURE_SPACE).repeat(Math.max(0, missing)));
    if (lane.hasUnits()) {
      out.append("</td><td class=\"pinchoff-u\" align=\"left\">").append(figure.behindHtml());
    } else if (figure.power() != 0) {
      out.append("×10<sup>").append(figure.power()).append("</sup>");
    }
    out.append("</td>");
  }

  private void writeText(Lane lane, Entry entry, int span) {
    boolean asNumber = lane.numeric() && !lane.hasUnits();
    out.append(asNumber ? "<td class=\"pinchoff-n\" align=\"right\"" : "<td" + alignment(lane));
    out.append(span > 1 ? " colspan=\"" + span + "\">" : ">");
    out.append(HtmlEntries.html(entry)).append("</td>");
  }

  private static String alignment(Lane lane) {
    Alignment alignment = lane.column().alignment();
    if (alignment == Alignment.START) {
      return " align=\"left\"";
    }
    return alignment == Alignment.END
        ? " class=\"pinchoff-end\" align=\"right\""
        : " class=\"pinchoff-center\" align=\"center\"";
  }
}
