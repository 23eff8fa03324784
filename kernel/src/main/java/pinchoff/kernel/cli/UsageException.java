package pinchoff.kernel.cli;

/** The user's mistake, in one sentence for the user. */
final class UsageException extends RuntimeException {
  UsageException(String message) {
    super(message);
  }
}
