package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Data on an open comm.
 *
 * @param commId its id
 * @param data the data
 */
public record CommMsg(String commId, Map<String, Object> data) implements Content {
  /** The message type. */
  public static final String TYPE = "comm_msg";

  static CommMsg read(Fields in) {
    return new CommMsg(in.string("comm_id"), in.object("data"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("comm_id", commId, "data", data);
  }
}
