package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Which comms are open.
 *
 * @param comms id to an object with the target_name
 */
public record CommInfoReply(Map<String, Object> comms) implements Content {
  /** The message type. */
  public static final String TYPE = "comm_info_reply";

  static CommInfoReply read(Fields in) {
    return new CommInfoReply(in.object("comms"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "ok", "comms", comms);
  }
}
