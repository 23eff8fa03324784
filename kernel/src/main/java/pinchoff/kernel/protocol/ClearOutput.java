package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Removes the outputs of a cell.
 *
 * @param later true to remove them when the next output comes
 */
public record ClearOutput(boolean later) implements Content {
  /** The message type. */
  public static final String TYPE = "clear_output";

  static ClearOutput read(Fields in) {
    return new ClearOutput(in.flag("wait", false));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("wait", later);
  }
}
