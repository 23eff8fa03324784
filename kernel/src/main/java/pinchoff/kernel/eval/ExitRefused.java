package pinchoff.kernel.eval;

/** Thrown where a cell's code asks to end the process that its session lives in. */
final class ExitRefused extends RuntimeException {
  private static final long serialVersionUID = 1L;

  ExitRefused(String call) {
    super(
        call
            + " was not carried out: it would end the whole session with all its variables. To end"
            + " the session, shut the kernel down in the front end.");
  }
}
