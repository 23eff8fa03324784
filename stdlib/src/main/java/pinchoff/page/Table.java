package pinchoff.page;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/**
 * A table. There are two sorts: one with columns under headings, and a <em>sheet</em>, whose lines
 * are a name, a value and perhaps a remark.
 *
 * @param caption a sentence above it; may be empty
 * @param columns its columns; those of a sheet have no headings
 * @param rows its rows in order
 * @param note a sentence below it; may be empty
 */
public record Table(Phrase caption, List<Column> columns, List<Row> rows, Phrase note)
    implements Block, Displayable {

  /** A row of a table. */
  public sealed interface Row {

    /** One entry for each column. */
    record Cells(List<Entry> entries) implements Row {

      /** Copies the entries. */
      public Cells {
        entries = List.copyOf(entries);
      }
    }

    /** A title for the rows after it, as wide as the table. */
    record Group(Phrase title) implements Row {}
  }

  /** Copies the lists and checks that each row fits the columns. */
  public Table {
    columns = List.copyOf(columns);
    rows = List.copyOf(rows);
    if (columns.isEmpty()) {
      throw new IllegalArgumentException("a table needs at least one column, found none");
    }
    for (Row row : rows) {
      if (row instanceof Row.Cells cells && cells.entries().size() != columns.size()) {
        throw new IllegalArgumentException(
            "a row of "
                + cells.entries().size()
                + " entries in a table of "
                + columns.size()
                + " columns: "
                + PlainEntries.text(cells.entries()));
      }
    }
    for (int i = 0; i < columns.size(); i++) {
      requireUnit(columns.get(i), i, rows);
    }
  }

  private static void requireUnit(Column column, int index, List<Row> rows) {
    column
        .unit()
        .ifPresent(
            unit ->
                entries(rows, index)
                    .filter(Entry.Amount.class::isInstance)
                    .forEach(
                        e ->
                            ((Entry.Amount) e)
                                .quantity()
                                .requireDimension(
                                    "column \"" + column.heading() + "\"", unit.dimension())));
  }

  private static Stream<Entry> entries(List<Row> rows, int index) {
    return rows.stream()
        .filter(Row.Cells.class::isInstance)
        .map(row -> ((Row.Cells) row).entries().get(index));
  }

  /** The entries of one column from top to bottom; groups have none. */
  Stream<Entry> entries(int index) {
    return entries(rows, index);
  }

  /** Starts a table with headings above its columns. */
  public static Builder of(Column... columns) {
    return new Builder(List.of(columns));
  }

  /**
   * Starts a sheet: each {@linkplain Builder#line line} is a name, a value and perhaps a remark.
   */
  public static Builder sheet() {
    return of(Column.of(""), Column.of(""), Column.of(""));
  }

  /** True if any column has a heading. */
  boolean hasHeadings() {
    return columns.stream().anyMatch(c -> !c.heading().isEmpty());
  }

  /**
   * The table as comma-separated values (RFC 4180: lines end in CR LF, fields are quoted where
   * needed), for other programs to read.
   *
   * <p>Quantities are in SI units at full precision, never in display units. A column whose
   * quantities share a dimension has the SI unit in its heading, as in {@code I_D [A]}; in a column
   * of unlike quantities the unit has a column of its own. Group titles become a first column. A
   * text that begins with {@code = + - @} or their full-width forms gets an apostrophe in front, so
   * that no spreadsheet takes it for a formula; numbers are left alone.
   */
  public String csv() {
    return Csv.of(this);
  }

  /** The table by itself. */
  @Override
  public MimeBundle display() {
    return Page.of(this).display();
  }

  /** Collects the rows of a table. */
  public static final class Builder {
    private final List<Column> columns;
    private final List<Row> rows = new ArrayList<>();
    private Phrase caption = Phrase.plain("");
    private Phrase note = Phrase.plain("");

    private Builder(List<Column> columns) {
      this.columns = columns;
    }

    /** A sentence above the table. Places and arguments as in {@link Phrase#of}. */
    public Builder caption(String template, Object... arguments) {
      caption = Phrase.of(template, arguments);
      return this;
    }

    /** A sentence below the table. Places and arguments as in {@link Phrase#of}. */
    public Builder note(String template, Object... arguments) {
      note = Phrase.of(template, arguments);
      return this;
    }

    /** A row of whatever {@link Entry#from} accepts, one for each column. */
    public Builder row(Object... cells) {
      return row(Arrays.stream(cells).map(Entry::from).toList());
    }

    /** A row of entries, one for each column. */
    public Builder row(List<Entry> entries) {
      rows.add(new Row.Cells(entries));
      return this;
    }

    /** A title for the rows after it. Places and arguments as in {@link Phrase#of}. */
    public Builder group(String template, Object... arguments) {
      rows.add(new Row.Group(Phrase.of(template, arguments)));
      return this;
    }

    /** A line of a sheet: a name and a value. */
    public Builder line(Object name, Object value) {
      return line(name, value, Entry.EMPTY);
    }

    /** A line of a sheet: a name, a value and a remark. */
    public Builder line(Object name, Object value, Object remark) {
      return row(name, value, remark);
    }

    /**
     * The finished table.
     *
     * @throws IllegalArgumentException if a row does not fit the columns
     */
    public Table build() {
      return new Table(caption, columns, rows, note);
    }
  }
}
