package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * The line that the user typed.
 *
 * @param value the line; U+0004 alone for the end of input
 */
public record InputReply(String value) implements Content {
  /** The message type. */
  public static final String TYPE = "input_reply";

  static InputReply read(Fields in) {
    return new InputReply(in.string("value"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("value", value);
  }
}
