package pinchoff.kernel.eval;

/** Thrown where a cell calls a method whose body names something that is not declared yet. */
final class UnresolvedReference extends RuntimeException {
  private static final long serialVersionUID = 1L;

  UnresolvedReference(String message, StackTraceElement[] trace) {
    super(message);
    setStackTrace(trace);
  }
}
