package pinchoff.derive;

/** A derivation, or what is asked of it, has a fault; the message has the place. */
public final class DerivationException extends IllegalArgumentException {

  private static final long serialVersionUID = 1L;

  /** With the text that the user reads. */
  public DerivationException(String message) {
    super(message);
  }
}
