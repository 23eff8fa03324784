package pinchoff.device;

/**
 * A device, size or bias that cannot be meant. The message names the value with its unit and what
 * was expected.
 */
public final class DeviceException extends IllegalArgumentException {

  /** With the sentence that the user reads. */
  public DeviceException(String message) {
    super(message);
  }
}
