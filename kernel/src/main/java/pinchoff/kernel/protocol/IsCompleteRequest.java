package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks whether a text can be run as it stands.
 *
 * @param code the text
 */
public record IsCompleteRequest(String code) implements Content {
  /** The message type. */
  public static final String TYPE = "is_complete_request";

  static IsCompleteRequest read(Fields in) {
    return new IsCompleteRequest(in.string("code"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("code", code);
  }
}
