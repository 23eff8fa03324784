package pinchoff.kernel.notebook;

import java.util.List;
import java.util.Map;

/** One cell of a notebook. */
public sealed interface NotebookCell permits CodeCell, TextCell, UnknownCell {

  /** Its id: 1 to 64 letters, digits, hyphens and underscores, unique in the notebook. */
  String id();

  /** Its metadata, kept as read. */
  Map<String, Object> metadata();

  /** What its author wrote. */
  String source();

  /** The labels that its author gave it. */
  default List<String> tags() {
    return metadata().get("tags") instanceof List<?> list
        ? list.stream().filter(String.class::isInstance).map(String.class::cast).toList()
        : List.of();
  }
}
