package pinchoff.kernel.notebook;

import java.util.Map;

/**
 * A cell of text: Markdown, or raw text that is for a converter.
 *
 * @param id see {@link NotebookCell#id}
 * @param kind which of the two
 * @param metadata see {@link NotebookCell#metadata}
 * @param source the text
 * @param others further fields, such as attached pictures, kept as read
 */
public record TextCell(
    String id, Kind kind, Map<String, Object> metadata, String source, Map<String, Object> others)
    implements NotebookCell {

  /** The kinds of text. */
  public enum Kind {
    MARKDOWN,
    RAW
  }

  /** Copies the trees. */
  public TextCell {
    metadata = Trees.frozen(metadata);
    others = Trees.frozen(others);
  }
}
