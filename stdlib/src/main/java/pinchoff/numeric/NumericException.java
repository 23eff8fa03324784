package pinchoff.numeric;

/** A numeric search that did not succeed; the message has its interval and values. */
public final class NumericException extends ArithmeticException {

  /** With the sentence that the user reads. */
  public NumericException(String message) {
    super(message);
  }
}
