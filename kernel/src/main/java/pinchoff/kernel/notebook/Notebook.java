package pinchoff.kernel.notebook;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * The content of a notebook file of format 4.
 *
 * @param minor the minor version of the format, from 5: older notebooks are raised when read
 * @param metadata what the notebook says of itself, kept as read
 * @param cells its cells in order
 * @param others top-level fields of a later minor version, kept as read
 */
public record Notebook(
    int minor, Map<String, Object> metadata, List<NotebookCell> cells, Map<String, Object> others) {

  /** The minor version that is written, unless the notebook came with a newer one. */
  public static final int MINOR = 5;

  /** Copies the collections. */
  public Notebook {
    if (minor < MINOR) {
      throw new IllegalArgumentException("minor version " + minor + ": expected at least " + MINOR);
    }
    metadata = Trees.frozen(metadata);
    cells = List.copyOf(cells);
    others = Trees.frozen(others);
  }

  /** The notebook with other cells. */
  public Notebook withCells(List<? extends NotebookCell> newCells) {
    return new Notebook(minor, metadata, List.copyOf(newCells), others);
  }

  /** The notebook with one field of its metadata set. */
  public Notebook withMetadata(String name, Map<String, Object> value) {
    return new Notebook(minor, Trees.with(metadata, name, value), cells, others);
  }

  /** What the notebook says of the kernel that it is for; empty if it says nothing. */
  public Map<String, Object> kernelspec() {
    return section("kernelspec");
  }

  /** What the notebook says of its language; empty if it says nothing. */
  public Map<String, Object> languageInfo() {
    return section("language_info");
  }

  /**
   * The language of its code cells in small letters, as the kernel or the language section says;
   * empty if neither does.
   */
  public Optional<String> language() {
    return Optional.ofNullable(languageInfo().getOrDefault("name", kernelspec().get("language")))
        .filter(String.class::isInstance)
        .map(name -> ((String) name).toLowerCase(Locale.ROOT));
  }

  private Map<String, Object> section(String name) {
    Map<String, Object> section = new LinkedHashMap<>();
    if (metadata.get(name) instanceof Map<?, ?> map) {
      map.forEach(
          (key, value) -> {
            if (value != null) {
              section.put(String.valueOf(key), value);
            }
          });
    }
    return section;
  }
}
