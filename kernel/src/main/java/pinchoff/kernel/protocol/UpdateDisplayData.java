package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Replaces every result that is shown under a name.
 *
 * @param data MIME type to content
 * @param metadata hints for each type
 * @param displayId the name
 */
public record UpdateDisplayData(
    Map<String, Object> data, Map<String, Object> metadata, String displayId) implements Content {
  /** The message type. */
  public static final String TYPE = "update_display_data";

  static UpdateDisplayData read(Fields in) {
    return new UpdateDisplayData(
        in.object("data"),
        in.object("metadata"),
        Fields.of(in.object("transient"), "transient").string("display_id"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "data", data, "metadata", metadata, "transient", Json.object("display_id", displayId));
  }
}
