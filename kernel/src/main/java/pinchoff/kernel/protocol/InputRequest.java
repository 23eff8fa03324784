package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks the user for a line.
 *
 * @param prompt what to ask
 * @param password whether to hide what is typed
 */
public record InputRequest(String prompt, boolean password) implements Content {
  /** The message type. */
  public static final String TYPE = "input_request";

  static InputRequest read(Fields in) {
    return new InputRequest(in.string("prompt", ""), in.flag("password", false));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("prompt", prompt, "password", password);
  }
}
