package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks the kernel to end.
 *
 * @param restart whether it will be started again
 */
public record ShutdownRequest(boolean restart) implements Content {
  /** The message type. */
  public static final String TYPE = "shutdown_request";

  static ShutdownRequest read(Fields in) {
    return new ShutdownRequest(in.flag("restart", false));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("restart", restart);
  }
}
