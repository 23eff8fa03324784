package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;

/**
 * The failure of a cell.
 *
 * @param error what went wrong
 */
public record ErrorOutput(ErrorInfo error) implements Content {
  /** The message type. */
  public static final String TYPE = "error";

  static ErrorOutput read(Fields in) {
    return new ErrorOutput(ErrorInfo.read(in));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return error.toJson();
  }
}
