package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * The value of a cell.
 *
 * @param executionCount number of the cell
 * @param data MIME type to content
 * @param metadata hints for each type
 */
public record ExecuteResult(
    int executionCount, Map<String, Object> data, Map<String, Object> metadata) implements Content {
  /** The message type. */
  public static final String TYPE = "execute_result";

  static ExecuteResult read(Fields in) {
    return new ExecuteResult(
        in.integer("execution_count", 0), in.object("data"), in.object("metadata"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("execution_count", executionCount, "data", data, "metadata", metadata);
  }
}
