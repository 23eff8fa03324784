package pinchoff.testing;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/**
 * A table of values from outside the project, {@code reference/NAME.csv} among the test resources.
 *
 * <p>The first line names the columns, one of which is {@code source}: where the row's value comes
 * from. Fields may stand in double quotes; empty lines and lines that start with {@code #} are
 * skipped.
 */
public final class ReferenceTable {
  private static final String SOURCE = "source";

  private ReferenceTable() {}

  /** One row. */
  public record Row(String table, int line, Map<String, String> fields) {

    /** A field as text. */
    public String text(String column) {
      String field = fields.get(column);
      if (field == null) {
        throw new IllegalArgumentException(this + " has no column " + column + ": " + fields);
      }
      return field;
    }

    /** A field as a number. */
    public double number(String column) {
      return Double.parseDouble(text(column));
    }

    /** True if the field holds something. */
    public boolean has(String column) {
      return !fields.getOrDefault(column, "").isEmpty();
    }

    /** Where the value comes from. */
    public String source() {
      return text(SOURCE);
    }

    /** The place and the first field, as a name for the case. */
    @Override
    public String toString() {
      return table + ":" + line + " " + fields.values().iterator().next();
    }
  }

  /**
   * All rows of a table.
   *
   * @throws IllegalArgumentException if the table is missing or empty, a row has too few or too
   *     many fields, or a row names no source
   */
  public static Stream<Row> rows(String name) {
    List<String> lines = lines("/reference/" + name + ".csv");
    List<Row> rows = new ArrayList<>();
    List<String> columns = List.of();
    for (int i = 0; i < lines.size(); i++) {
      String line = lines.get(i);
      if (line.isBlank() || line.startsWith("#")) {
        continue;
      }
      List<String> fields = fields(line);
      if (columns.isEmpty()) {
        columns = fields;
      } else {
        rows.add(row(name, i + 1, columns, fields));
      }
    }
    if (rows.isEmpty()) {
      throw new IllegalArgumentException("reference table " + name + " has no rows");
    }
    return rows.stream();
  }

  private static Row row(String table, int line, List<String> columns, List<String> fields) {
    if (columns.size() != fields.size()) {
      throw new IllegalArgumentException(
          table + ":" + line + " has " + fields.size() + " fields: expected " + columns.size());
    }
    Map<String, String> byColumn = new LinkedHashMap<>();
    for (int i = 0; i < columns.size(); i++) {
      byColumn.put(columns.get(i), fields.get(i));
    }
    if (byColumn.getOrDefault(SOURCE, "").isBlank()) {
      throw new IllegalArgumentException(table + ":" + line + " names no source");
    }
    return new Row(table, line, byColumn);
  }

  private static List<String> lines(String resource) {
    try (InputStream in = ReferenceTable.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalArgumentException("no resource " + resource);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  private static List<String> fields(String line) {
    List<String> fields = new ArrayList<>();
    StringBuilder field = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      boolean doubled = quoted && c == '"' && i + 1 < line.length() && line.charAt(i + 1) == '"';
      if (doubled) {
        field.append(c);
        i++;
      } else if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        fields.add(field.toString().strip());
        field.setLength(0);
      } else {
        field.append(c);
      }
    }
    fields.add(field.toString().strip());
    return fields;
  }
}
