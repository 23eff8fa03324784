package pinchoff.kernel.wire;

/** A connection file that cannot be used; the text names the file, the key and the value. */
public final class ConnectionException extends RuntimeException {
  /** Made with the reason. */
  public ConnectionException(String message) {
    super(message);
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
