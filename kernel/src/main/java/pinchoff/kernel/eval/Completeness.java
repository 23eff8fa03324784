package pinchoff.kernel.eval;

/**
 * Whether a text can be run as it stands.
 *
 * @param status the verdict
 * @param indent what to start the next line with when the text is incomplete, else empty
 */
public record Completeness(Status status, String indent) {

  /** The verdicts that the protocol knows. */
  public enum Status {
    COMPLETE,
    INCOMPLETE,
    INVALID,
    UNKNOWN
  }
}
