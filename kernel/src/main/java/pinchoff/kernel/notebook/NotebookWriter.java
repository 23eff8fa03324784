package pinchoff.kernel.notebook;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Builds the JSON tree of a notebook's file. */
final class NotebookWriter {
  private NotebookWriter() {}

  /** The tree with the fields of every object in order. */
  static Map<String, Object> tree(Notebook notebook) {
    Map<String, Object> top = new LinkedHashMap<>(notebook.others());
    top.put("nbformat", 4L);
    top.put("nbformat_minor", (long) notebook.minor());
    top.put("metadata", notebook.metadata());
    top.put("cells", notebook.cells().stream().map(NotebookWriter::cell).toList());
    return Trees.sorted(top);
  }

  private static Map<String, Object> cell(NotebookCell cell) {
    if (cell instanceof UnknownCell unknown) {
      Map<String, Object> fields = new LinkedHashMap<>(unknown.fields());
      fields.put("id", unknown.id());
      return fields;
    }
    Map<String, Object> fields = new LinkedHashMap<>();
    if (cell instanceof CodeCell code) {
      fields.putAll(code.others());
      fields.put("cell_type", "code");
      fields.put("outputs", code.outputs().stream().map(NotebookWriter::output).toList());
      putCount(fields, code.executionCount());
    } else if (cell instanceof TextCell text) {
      fields.putAll(text.others());
      fields.put("cell_type", text.kind().name().toLowerCase(Locale.ROOT));
    }
    fields.put("id", cell.id());
    fields.put("metadata", cell.metadata());
    fields.put("source", MultilineText.split(cell.source()));
    return fields;
  }

  private static Map<String, Object> output(Output output) {
    Map<String, Object> fields = new LinkedHashMap<>();
    if (output instanceof Output.StreamText stream) {
      fields.put("output_type", "stream");
      fields.put("name", stream.name());
      fields.put("text", MultilineText.split(stream.text()));
    } else if (output instanceof Output.Rich rich) {
      fields.put("output_type", "display_data");
      fields.put("data", bundle(rich.data()));
      fields.put("metadata", rich.metadata());
      if (rich instanceof Output.Result result) {
        fields.put("output_type", "execute_result");
        putCount(fields, result.executionCount());
      }
    } else if (output instanceof Output.Failure failure) {
      fields.put("output_type", "error");
      fields.put("ename", failure.name());
      fields.put("evalue", failure.message());
      fields.put("traceback", failure.traceback());
    } else if (output instanceof Output.Unknown unknown) {
      fields.putAll(unknown.fields());
    }
    return fields;
  }

  private static Map<String, Object> bundle(Map<String, Object> data) {
    Map<String, Object> cut = new LinkedHashMap<>(data);
    cut.replaceAll(
        (type, value) ->
            value instanceof String text && MimeTypes.isCut(type)
                ? List.copyOf(MultilineText.split(text))
                : value);
    return cut;
  }

  private static void putCount(Map<String, Object> fields, Optional<Integer> count) {
    put(fields, "execution_count", count.map(Integer::longValue).orElse(null));
  }

  @SuppressWarnings("NullAway") // the value of a JSON field may be null
  private static void put(Map<String, Object> fields, String name, @Nullable Object value) {
    fields.put(name, value);
  }
}
