package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Help on a name.
 *
 * @param found whether there is any
 * @param data MIME type to content
 * @param metadata hints for each type
 */
public record InspectReply(boolean found, Map<String, Object> data, Map<String, Object> metadata)
    implements Content {
  /** The message type. */
  public static final String TYPE = "inspect_reply";

  static InspectReply read(Fields in) {
    return new InspectReply(in.flag("found", false), in.object("data"), in.object("metadata"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "ok", "found", found, "data", data, "metadata", metadata);
  }
}
