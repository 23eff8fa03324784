package pinchoff.kernel.notebook;

/** A notebook file cannot be read or written. The message is one sentence that names the file. */
public final class NotebookException extends RuntimeException {
  /** Made with the sentence for the user. */
  public NotebookException(String message) {
    super(message);
  }

  /** Made with the sentence for the user and what lies behind it. */
  public NotebookException(String message, Throwable cause) {
    super(message, cause);
  }
}
