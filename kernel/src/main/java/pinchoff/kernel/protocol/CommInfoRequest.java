package pinchoff.kernel.protocol;

import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks which comms are open.
 *
 * @param targetName only those of this target
 */
public record CommInfoRequest(Optional<String> targetName) implements Content {
  /** The message type. */
  public static final String TYPE = "comm_info_request";

  static CommInfoRequest read(Fields in) {
    return new CommInfoRequest(in.optionalString("target_name"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return targetName.map(name -> Json.object("target_name", name)).orElseGet(Json::object);
  }
}
