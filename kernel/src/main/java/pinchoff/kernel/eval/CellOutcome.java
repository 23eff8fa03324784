package pinchoff.kernel.eval;

import java.util.List;
import java.util.Optional;
import pinchoff.display.MimeBundle;

/** How a cell ended. */
public sealed interface CellOutcome {

  /**
   * It ran to its end.
   *
   * @param result what its last expression shows, if it has a value to show
   */
  record Success(Optional<MimeBundle> result) implements CellOutcome {}

  /**
   * It failed or was interrupted.
   *
   * @param name kind of failure, for example an exception's simple class name
   * @param message what went wrong; empty rather than null
   * @param traceback lines for the reader: cell line and column, source line with a caret, causes
   */
  record Failure(String name, String message, List<String> traceback) implements CellOutcome {
    /** Copies the lines. */
    public Failure {
      traceback = List.copyOf(traceback);
    }
  }
}
