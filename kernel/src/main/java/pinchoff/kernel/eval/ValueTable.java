package pinchoff.kernel.eval;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import pinchoff.display.MimeBundle;

/**
 * A value that reads best as a table: a list of records, a map, a record, a matrix.
 *
 * @param head names of the columns; may be empty
 * @param rows the cells as plain text
 * @param more how many rows were left out
 */
record ValueTable(List<String> head, List<List<String>> rows, int more) {

  /** The value as a table, if it is of such a kind. */
  static Optional<ValueTable> of(Object value) {
    if (value instanceof Collection<?> c && !c.isEmpty() && areRecordsOfOneType(c)) {
      Class<?> type = c.iterator().next().getClass();
      return Optional.of(
          new ValueTable(
              names(type),
              c.stream().limit(ValueText.MAX_ELEMENTS).map(ValueTable::components).toList(),
              Math.max(0, c.size() - ValueText.MAX_ELEMENTS)));
    }
    if (value instanceof Map<?, ?> map && !map.isEmpty()) {
      List<List<String>> rows = new ArrayList<>();
      map.entrySet().stream()
          .limit(ValueText.MAX_ELEMENTS)
          .forEach(e -> rows.add(List.of(ValueText.of(e.getKey()), ValueText.of(e.getValue()))));
      return Optional.of(new ValueTable(List.of(), rows, map.size() - rows.size()));
    }
    if (value instanceof Record r) {
      List<String> names = names(r.getClass());
      List<String> values = components(r);
      List<List<String>> rows = new ArrayList<>();
      for (int i = 0; i < names.size(); i++) {
        rows.add(List.of(names.get(i), values.get(i)));
      }
      return rows.isEmpty() ? Optional.empty() : Optional.of(new ValueTable(List.of(), rows, 0));
    }
    if (value instanceof double[][] matrix && matrix.length > 0) {
      return Optional.of(
          new ValueTable(
              List.of(),
              Arrays.stream(matrix)
                  .limit(ValueText.MAX_ELEMENTS)
                  .map(row -> Arrays.stream(row).mapToObj(String::valueOf).toList())
                  .toList(),
              Math.max(0, matrix.length - ValueText.MAX_ELEMENTS)));
    }
    return Optional.empty();
  }

  /** Columns under each other. */
  String asText() {
    List<List<String>> all = new ArrayList<>();
    if (!head.isEmpty()) {
      all.add(head);
    }
    all.addAll(rows);
    int columns = all.stream().mapToInt(List::size).max().orElse(0);
    int[] widths = new int[columns];
    for (List<String> row : all) {
      for (int i = 0; i < row.size(); i++) {
        widths[i] = Math.max(widths[i], row.get(i).length());
      }
    }
    StringBuilder text = new StringBuilder();
    for (List<String> row : all) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < row.size(); i++) {
        line.append(row.get(i)).append(" ".repeat(widths[i] - row.get(i).length() + 2));
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
    if (more > 0) {
      text.append("… ").append(more).append(" more rows");
    }
    return text.toString().stripTrailing();
  }

  /** The same for a page. */
  String asHtml() {
    StringBuilder html = new StringBuilder("<table>");
    if (!head.isEmpty()) {
      html.append("<thead>").append(row("th", head)).append("</thead>");
    }
    html.append("<tbody>");
    rows.forEach(row -> html.append(row("td", row)));
    html.append("</tbody></table>");
    if (more > 0) {
      html.append("<p>… ").append(more).append(" more rows</p>");
    }
    return html.toString();
  }

  MimeBundle asBundle(String plainText) {
    return MimeBundle.builder(plainText).with(MimeBundle.HTML, asHtml()).build();
  }

  private static String row(String tag, List<String> cells) {
    return cells.stream()
        .map(cell -> "<" + tag + ">" + Html.escape(cell) + "</" + tag + ">")
        .collect(Collectors.joining("", "<tr>", "</tr>"));
  }

  private static boolean areRecordsOfOneType(Collection<?> values) {
    Class<?> first = null;
    for (Object value : values) {
      if (!(value instanceof Record) || (first != null && value.getClass() != first)) {
        return false;
      }
      first = value.getClass();
    }
    return first != null && first.getRecordComponents().length > 0;
  }

  private static List<String> names(Class<?> type) {
    return Arrays.stream(type.getRecordComponents()).map(RecordComponent::getName).toList();
  }

  private static List<String> components(Object value) {
    List<String> texts = new ArrayList<>();
    for (RecordComponent component : value.getClass().getRecordComponents()) {
      texts.add(ValueText.guarded(() -> ValueText.of(read(component, value)), value));
    }
    return texts;
  }

  private static @Nullable Object read(RecordComponent component, Object value) {
    try {
      component.getAccessor().setAccessible(true);
      return component.getAccessor().invoke(value);
    } catch (IllegalAccessException | InvocationTargetException | RuntimeException e) {
      return "(cannot be read: " + e.getClass().getSimpleName() + ")";
    }
  }
}
