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
      int span = grid.columns().stream().mapToInt(lane -> lane.hasUnits() ? 2 : 1).sum();
      out.append("<tr class=\"pinchoff-group\"><th scope=\"rowgroup\" align=\"left\" colspan=\"");
      out.append(span).append("\">").append(HtmlEntries.html(group.title())).append("</th></tr>");
      return;
    }
    out.append("<tr>");
    for (Lane lane : grid.columns()) {
      Cell cell = lane.cells().get(row);
      cell.figure()
          .ifPresentOrElse(
              figure -> writeFigure(lane, figure), () -> writeText(lane, cell.entry()));
    }
    out.append("</tr>");
  }

  private void writeFigure(Lane lane, Figure figure) {
    out.append("<td class=\"pinchoff-n\" align=\"right\">").append(figure.numberHtml());
    int missing = lane.fraction() - figure.fractionLength();
    if (missing > 0 && figure.fractionLength() == 0) {
      out.append(PUNCTUATION_SPACE);
      missing--;
    }
    for (int i = 0; i < missing; i++) {
      out.append(FIGURE_SPACE);
    }
    out.append("</td>");
    if (lane.hasUnits()) {
      out.append("<td class=\"pinchoff-u\" align=\"left\">")
          .append(figure.unitHtml())
          .append("</td>");
    }
  }

  private void writeText(Lane lane, Entry entry) {
    boolean beside = lane.numeric() && !lane.hasUnits();
    out.append(beside ? "<td class=\"pinchoff-n\" align=\"right\"" : "<td" + alignment(lane));
    out.append(lane.hasUnits() ? " colspan=\"2\">" : ">");
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
