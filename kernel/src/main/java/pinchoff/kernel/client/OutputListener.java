package pinchoff.kernel.client;

import java.util.Optional;
import pinchoff.kernel.protocol.DisplayData;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.protocol.UpdateDisplayData;

/**
 * Receives what a cell puts out, in order, on the thread that asked for the cell. Each method does
 * nothing unless it is overridden.
 */
public interface OutputListener {

  /** A listener that ignores everything and answers no question. */
  OutputListener NONE = new OutputListener() {};

  /**
   * The kernel runs the cell now.
   *
   * @param executionCount the number that it gave the cell
   */
  default void started(int executionCount) {}

  /**
   * Text printed by the cell.
   *
   * @param name stdout or stderr
   */
  default void stream(String name, String text) {}

  /** A result that the cell shows beside its value. */
  default void display(DisplayData display) {}

  /** Replaces every result shown under an id, in any cell. */
  default void update(UpdateDisplayData update) {}

  /** The value of the cell. */
  default void result(ExecuteResult result) {}

  /** The failure of the cell. */
  default void error(ErrorInfo error) {}

  /**
   * The outputs of the cell so far are to be removed.
   *
   * @param later true to remove them only when the next output comes
   */
  default void clear(boolean later) {}

  /**
   * The cell asks its user. Only requests that allow it can be asked.
   *
   * @param prompt what is asked
   * @param password whether to hide what is typed
   * @return the answer, or empty to end the input
   */
  default Optional<String> input(String prompt, boolean password) {
    return Optional.empty();
  }
}
