package pinchoff.device;

import java.util.Optional;

/**
 * Where the parameters of a device come from.
 *
 * @param technology name of the technology file, or empty text if they stand in a cell
 * @param contentHash hash of the file's content, if there is a file
 */
public record Source(String technology, Optional<String> contentHash) {

  /** The parameters stand in a cell. */
  public static final Source CELL = new Source("", Optional.empty());

  /** A technology file with its content hash. */
  public static Source of(String technology, String contentHash) {
    return new Source(technology, Optional.of(contentHash));
  }
}
