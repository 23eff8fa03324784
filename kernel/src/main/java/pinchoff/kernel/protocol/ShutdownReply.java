package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * The kernel ends now.
 *
 * @param restart whether it will be started again
 */
public record ShutdownReply(boolean restart) implements Content {
  /** The message type. */
  public static final String TYPE = "shutdown_reply";

  static ShutdownReply read(Fields in) {
    return new ShutdownReply(in.flag("restart", false));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "ok", "restart", restart);
  }
}
