package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * A cell is run now.
 *
 * @param code its source
 * @param executionCount its number
 */
public record ExecuteInput(String code, int executionCount) implements Content {
  /** The message type. */
  public static final String TYPE = "execute_input";

  static ExecuteInput read(Fields in) {
    return new ExecuteInput(in.string("code"), in.integer("execution_count", 0));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("code", code, "execution_count", executionCount);
  }
}
