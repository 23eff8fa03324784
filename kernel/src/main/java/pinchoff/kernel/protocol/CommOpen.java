package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Opens a comm.
 *
 * @param commId its id
 * @param targetName what it is for
 * @param data first data
 */
public record CommOpen(String commId, String targetName, Map<String, Object> data)
    implements Content {
  /** The message type. */
  public static final String TYPE = "comm_open";

  static CommOpen read(Fields in) {
    return new CommOpen(in.string("comm_id"), in.string("target_name"), in.object("data"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("comm_id", commId, "target_name", targetName, "data", data);
  }
}
