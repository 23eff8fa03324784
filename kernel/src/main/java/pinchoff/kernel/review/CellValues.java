package pinchoff.kernel.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Output;

/**
 * What one code cell says: its values, what they rest on, and the text that it prints.
 *
 * @param id the cell's id
 * @param place its place among the code cells, from 1
 * @param values its values by id, in order
 * @param repeated ids that stand for more than one value
 * @param technologies technology files by name, with the hash of their content
 * @param premises premises by name, with their values
 * @param printed standard output
 * @param failed the name of its error, if it failed
 */
record CellValues(
    String id,
    int place,
    Map<String, StoredValue> values,
    List<String> repeated,
    Map<String, String> technologies,
    Map<String, String> premises,
    String printed,
    Optional<String> failed) {
  private static final String VALUES = "application/vnd.pinchoff.values+json";

  static CellValues of(CodeCell cell, int place) {
    Map<String, StoredValue> values = new LinkedHashMap<>();
    List<String> repeated = new ArrayList<>();
    Map<String, String> technologies = new LinkedHashMap<>();
    Map<String, String> premises = new LinkedHashMap<>();
    StringBuilder printed = new StringBuilder();
    Optional<String> failed = Optional.empty();
    for (Output output : cell.outputs()) {
      if (output instanceof Output.Rich rich && rich.data().get(VALUES) instanceof Map<?, ?> tree) {
        for (Map<String, Object> fields : StoredValue.maps(tree.get("values"))) {
          StoredValue value = new StoredValue(fields);
          if (values.put(value.id(), value) != null) {
            repeated.add(value.id());
          }
        }
        StoredValue.maps(tree.get("technologies"))
            .forEach(
                t ->
                    technologies.put(
                        String.valueOf(t.get("name")), String.valueOf(t.get("contentHash"))));
        StoredValue.maps(tree.get("premises"))
            .forEach(
                p ->
                    premises.put(
                        String.valueOf(p.get("name")), p.get("value") + " " + p.get("dimension")));
      } else if (output instanceof Output.StreamText text && text.name().equals("stdout")) {
        printed.append(text.text());
      } else if (output instanceof Output.Failure failure) {
        failed = Optional.of(failure.name() + ": " + failure.message());
      }
    }
    return new CellValues(
        cell.id(), place, values, repeated, technologies, premises, printed.toString(), failed);
  }
}
