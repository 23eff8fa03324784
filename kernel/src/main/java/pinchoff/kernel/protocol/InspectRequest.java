package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks for help on a name.
 *
 * @param code source of the cell
 * @param cursorPos place of the cursor in code points
 * @param detailLevel 0 for the usual, more for more
 */
public record InspectRequest(String code, int cursorPos, int detailLevel) implements Content {
  /** The message type. */
  public static final String TYPE = "inspect_request";

  static InspectRequest read(Fields in) {
    return new InspectRequest(
        in.string("code"), in.integer("cursor_pos"), in.integer("detail_level", 0));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("code", code, "cursor_pos", cursorPos, "detail_level", detailLevel);
  }
}
