package pinchoff.kernel.client;

/** The kernel did not answer in time; the text says what was asked and how long it was awaited. */
public final class KernelTimeoutException extends RuntimeException {
  /** Made with the reason. */
  public KernelTimeoutException(String reason) {
    super(reason);
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
