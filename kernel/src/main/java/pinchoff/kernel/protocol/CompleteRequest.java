package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks what could be typed at a place.
 *
 * @param code source of the cell
 * @param cursorPos place of the cursor in code points
 */
public record CompleteRequest(String code, int cursorPos) implements Content {
  /** The message type. */
  public static final String TYPE = "complete_request";

  static CompleteRequest read(Fields in) {
    return new CompleteRequest(in.string("code"), in.integer("cursor_pos"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("code", code, "cursor_pos", cursorPos);
  }
}
