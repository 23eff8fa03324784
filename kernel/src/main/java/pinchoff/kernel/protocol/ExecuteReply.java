package pinchoff.kernel.protocol;

import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * A cell ran to its end.
 *
 * @param executionCount number of the cell
 * @param userExpressions name to value or error
 * @param payload actions for the front end, for example a text for its pager
 */
public record ExecuteReply(
    int executionCount, Map<String, Object> userExpressions, List<Object> payload)
    implements Content {
  /** The message type. */
  public static final String TYPE = "execute_reply";

  static ExecuteReply read(Fields in) {
    return new ExecuteReply(
        in.integer("execution_count", 0), in.object("user_expressions"), in.list("payload"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "status",
        "ok",
        "execution_count",
        executionCount,
        "user_expressions",
        userExpressions,
        "payload",
        payload);
  }
}
