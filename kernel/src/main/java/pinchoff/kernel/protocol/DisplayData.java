package pinchoff.kernel.protocol;

import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * A result that a cell shows beside its value.
 *
 * @param data MIME type to content
 * @param metadata hints for each type
 * @param displayId name under which it can be replaced
 */
public record DisplayData(
    Map<String, Object> data, Map<String, Object> metadata, Optional<String> displayId)
    implements Content {
  /** The message type. */
  public static final String TYPE = "display_data";

  static DisplayData read(Fields in) {
    return new DisplayData(
        in.object("data"),
        in.object("metadata"),
        Fields.of(in.object("transient"), "transient").optionalString("display_id"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "data",
        data,
        "metadata",
        metadata,
        "transient",
        displayId.map(id -> Json.object("display_id", id)).orElseGet(Json::object));
  }
}
