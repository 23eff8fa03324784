package pinchoff.kernel.cli;

/** What a command's exit code says. */
final class ExitCode {
  /** All is fine. */
  static final int FINE = 0;

  /** It worked, and found something: a cell failed. */
  static final int FINDING = 1;

  /** The command line makes no sense, or an input cannot be read. */
  static final int USAGE = 2;

  /** A fault of our own. */
  static final int FAULT = 3;

  private ExitCode() {}
}
