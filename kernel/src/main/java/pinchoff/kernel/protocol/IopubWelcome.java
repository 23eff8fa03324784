package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * A subscription has arrived.
 *
 * @param subscription the topic; empty for everything
 */
public record IopubWelcome(String subscription) implements Content {
  /** The message type. */
  public static final String TYPE = "iopub_welcome";

  static IopubWelcome read(Fields in) {
    return new IopubWelcome(in.string("subscription", ""));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("subscription", subscription);
  }
}
