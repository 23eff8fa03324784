package pinchoff.kernel.notebook;

import java.util.Map;

/**
 * A cell of a later minor version of the format, kept as it came.
 *
 * @param id see {@link NotebookCell#id}
 * @param fields all its fields but the id
 */
public record UnknownCell(String id, Map<String, Object> fields) implements NotebookCell {

  /** Copies the tree. */
  public UnknownCell {
    fields = Trees.frozen(fields);
  }

  @Override
  @SuppressWarnings("unchecked")
  public Map<String, Object> metadata() {
    return fields.get("metadata") instanceof Map<?, ?> map ? (Map<String, Object>) map : Map.of();
  }

  @Override
  public String source() {
    return MultilineText.join(fields.get("source")).orElse("");
  }
}
