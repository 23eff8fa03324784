package pinchoff.kernel.notebook;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A cell of code with its stored outputs.
 *
 * @param id see {@link NotebookCell#id}
 * @param metadata see {@link NotebookCell#metadata}
 * @param source the code
 * @param outputs what it showed when it last ran
 * @param executionCount the number beside it, from 0; empty if it has not run
 * @param others fields that are not understood, kept as read
 */
public record CodeCell(
    String id,
    Map<String, Object> metadata,
    String source,
    List<Output> outputs,
    Optional<Integer> executionCount,
    Map<String, Object> others)
    implements NotebookCell {

  /** Copies the collections. */
  public CodeCell {
    metadata = Trees.frozen(metadata);
    outputs = List.copyOf(outputs);
    others = Trees.frozen(others);
  }

  /** Whether there is nothing to run. */
  public boolean isBlank() {
    return source.isBlank();
  }

  /**
   * The cell after another run. Times of an earlier run, which some front ends store, are dropped:
   * they would be of another run than the outputs.
   */
  public CodeCell with(List<Output> newOutputs, Optional<Integer> newCount) {
    return new CodeCell(
        id, Trees.without(metadata, "execution"), source, newOutputs, newCount, others);
  }

  /** The cell as if it had never run. */
  public CodeCell withoutOutputs() {
    return with(List.of(), Optional.empty());
  }
}
