package pinchoff.claims;

/** A premise, claim or spec that makes no sense; the message names it and its values. */
public final class ClaimException extends IllegalArgumentException {

  private static final long serialVersionUID = 1L;

  /** With the sentence that the user reads. */
  public ClaimException(String message) {
    super(message);
  }
}
