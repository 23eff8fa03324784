package pinchoff.kernel.client;

/** The kernel's process has ended, or cannot be reached any more; the text says what is known. */
public final class KernelGoneException extends RuntimeException {
  /** Made with the reason. */
  public KernelGoneException(String reason) {
    super(reason);
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
