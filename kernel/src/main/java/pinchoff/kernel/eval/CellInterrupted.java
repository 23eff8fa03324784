package pinchoff.kernel.eval;

/** Thrown in the threads of a cell that was asked to stop. An error, so that few catch it. */
final class CellInterrupted extends Error {
  private static final long serialVersionUID = 1L;

  CellInterrupted() {
    super("the cell was interrupted", null, false, false);
  }
}
