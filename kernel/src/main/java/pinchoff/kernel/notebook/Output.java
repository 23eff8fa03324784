package pinchoff.kernel.notebook;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/** One stored output of a code cell. */
public sealed interface Output {

  /**
   * Printed text.
   *
   * @param name {@code stdout} or {@code stderr}
   * @param text what was printed
   */
  record StreamText(String name, String text) implements Output {}

  /** A result in several forms. */
  sealed interface Rich extends Output {
    /**
     * MIME type to content: text, base64 text, or a JSON tree for JSON types. Texts are whole
     * strings, however the file holds them.
     */
    Map<String, Object> data();

    /** Hints for each type. */
    Map<String, Object> metadata();

    /** The same output with other content. */
    Rich with(Map<String, Object> data, Map<String, Object> metadata);

    /** The plain form, if there is one. */
    default Optional<String> plainText() {
      return data().get("text/plain") instanceof String s ? Optional.of(s) : Optional.empty();
    }
  }

  /**
   * Something shown while a cell ran.
   *
   * @param data see {@link Rich#data}
   * @param metadata see {@link Rich#metadata}
   */
  record Display(Map<String, Object> data, Map<String, Object> metadata) implements Rich {
    /** Copies the trees. */
    public Display {
      data = Trees.frozen(data);
      metadata = Trees.frozen(metadata);
    }

    @Override
    public Display with(Map<String, Object> newData, Map<String, Object> newMetadata) {
      return new Display(newData, newMetadata);
    }
  }

  /**
   * The value of a cell's last expression.
   *
   * @param executionCount the number beside it, from 0
   * @param data see {@link Rich#data}
   * @param metadata see {@link Rich#metadata}
   */
  record Result(
      Optional<Integer> executionCount, Map<String, Object> data, Map<String, Object> metadata)
      implements Rich {
    /** Copies the trees. */
    public Result {
      data = Trees.frozen(data);
      metadata = Trees.frozen(metadata);
    }

    @Override
    public Result with(Map<String, Object> newData, Map<String, Object> newMetadata) {
      return new Result(executionCount, newData, newMetadata);
    }
  }

  /**
   * Why a cell failed.
   *
   * @param name kind of failure
   * @param message what went wrong; may be empty
   * @param traceback lines for the reader
   */
  record Failure(String name, String message, List<String> traceback) implements Output {
    /** Copies the lines. */
    public Failure {
      traceback = List.copyOf(traceback);
    }
  }

  /**
   * An output of a later minor version of the format, kept as it came.
   *
   * @param fields all its fields
   */
  record Unknown(Map<String, Object> fields) implements Output {
    /** Copies the tree. */
    public Unknown {
      fields = Trees.frozen(fields);
    }
  }
}
