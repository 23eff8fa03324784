package pinchoff.kernel.eval;

import java.util.Optional;
import pinchoff.display.MimeBundle;

/**
 * Where the outputs of one cell go, in the order in which they are made. Safe for use by several
 * threads.
 */
public interface CellOutput {

  /** The two text streams: standard output and standard error. */
  enum Stream {
    OUT,
    ERR
  }

  /** Text printed on a stream. */
  void write(Stream stream, String text);

  /** A result shown beside the cell's value; with an id it can be updated later. */
  void publish(Optional<String> displayId, MimeBundle bundle);

  /** Replaces every result published under an id. */
  void update(String displayId, MimeBundle bundle);

  /** Shows a long text in the front end's pager, beside the notebook. */
  default void page(MimeBundle bundle) {
    publish(Optional.empty(), bundle);
  }

  /** Removes the cell's outputs, at once or when the next output comes. */
  void clear(boolean wait);

  /**
   * Asks the user for a line.
   *
   * @throws IllegalStateException if nobody can be asked, with the reason
   * @throws InterruptedException if the wait was interrupted
   */
  String ask(String prompt, boolean password) throws InterruptedException;
}
