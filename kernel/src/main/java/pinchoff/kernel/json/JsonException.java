package pinchoff.kernel.json;

/** A text is no JSON, passes a limit, or a field is missing or of the wrong type. */
public final class JsonException extends RuntimeException {
  /** Made with the place and what was expected there. */
  public JsonException(String message) {
    super(message);
  }

  @Override
  public String getMessage() {
    return String.valueOf(super.getMessage());
  }
}
