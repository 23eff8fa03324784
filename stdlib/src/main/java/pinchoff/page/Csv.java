package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** Writes a table as comma-separated values; {@link Table#csv} has the rules. */
final class Csv {
  private static final List<String> SHEET = List.of("name", "value", "remark");

  private final Table table;
  private final boolean grouped;
  private final List<Field> fields;

  /**
   * A column of the file.
   *
   * @param index the column of the table
   * @param dimension what all its quantities have in common
   * @param unlike true if quantities differ in dimension, so that the unit needs a field of its own
   */
  private record Field(int index, Optional<Dimension> dimension, boolean unlike) {}

  private Csv(Table table) {
    this.table = table;
    this.grouped = table.rows().stream().anyMatch(Table.Row.Group.class::isInstance);
    this.fields =
        IntStream.range(0, table.columns().size()).mapToObj(i -> field(table, i)).toList();
  }

  static String of(Table table) {
    Csv csv = new Csv(table);
    StringBuilder out = new StringBuilder();
    append(out, csv.headings());
    String group = "";
    for (Table.Row row : table.rows()) {
      if (row instanceof Table.Row.Group title) {
        group = title.title().text();
      } else if (row instanceof Table.Row.Cells cells) {
        append(out, csv.line(group, cells.entries()));
      }
    }
    return out.toString();
  }

  private static void append(StringBuilder out, List<String> line) {
    out.append(String.join(",", line)).append("\r\n");
  }

  private static Field field(Table table, int index) {
    List<Dimension> dimensions =
        table
            .entries(index)
            .flatMap(e -> si(e).stream())
            .map(Quantity::dimension)
            .distinct()
            .toList();
    Optional<Dimension> common =
        dimensions.size() == 1 ? Optional.of(dimensions.get(0)) : Optional.empty();
    return new Field(index, common, dimensions.size() > 1);
  }

  private List<String> headings() {
    List<String> line = new ArrayList<>();
    if (grouped) {
      line.add("group");
    }
    for (Field field : fields) {
      String name = name(field.index());
      Optional<String> unit = field.dimension().map(d -> unit(d)).filter(u -> !u.isEmpty());
      line.add(Escape.csv(unit.map(u -> name + " [" + u + "]").orElse(name)));
      if (field.unlike()) {
        line.add(Escape.csv(name + " unit"));
      }
    }
    return line;
  }

  private String name(int index) {
    Phrase heading = table.columns().get(index).heading();
    if (!heading.isEmpty()) {
      return heading.text();
    }
    boolean sheet = !table.hasHeadings() && index < SHEET.size();
    return sheet ? SHEET.get(index) : "column " + (index + 1);
  }

  private List<String> line(String group, List<Entry> entries) {
    List<String> line = new ArrayList<>();
    if (grouped) {
      line.add(Escape.csv(group));
    }
    for (Field field : fields) {
      Entry entry = entries.get(field.index());
      Optional<Quantity> quantity = si(entry);
      line.add(quantity.map(q -> SiNumber.of(q.si()).toString()).orElseGet(() -> text(entry)));
      if (field.unlike()) {
        line.add(quantity.map(q -> Escape.csv(unit(q.dimension()))).orElse(""));
      }
    }
    return line;
  }

  private static Optional<Quantity> si(Entry entry) {
    if (entry instanceof Entry.Amount amount) {
      return Optional.of(amount.quantity());
    } else if (entry instanceof Entry.Degrees degrees) {
      double kelvin = degrees.temperature().kelvin();
      return Optional.of(Quantity.ofSi(kelvin, Dimension.TEMPERATURE));
    }
    return Optional.empty();
  }

  private static String unit(Dimension dimension) {
    return dimension.equals(Dimension.NONE) ? "" : dimension.toString();
  }

  private static String text(Entry entry) {
    if (entry instanceof Entry.Count count) {
      return Long.toString(count.number());
    } else if (entry instanceof Entry.Judgement judgement) {
      Verdict verdict = judgement.verdict();
      String standing = verdict.standing().name().toLowerCase(Locale.ROOT);
      boolean said = verdict.words().equals(verdict.standing().word());
      return Escape.csv(said ? verdict.statement() : standing + ": " + verdict.statement());
    }
    return Escape.csv(PlainEntries.text(entry));
  }
}
