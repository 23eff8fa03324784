package pinchoff.kernel.protocol;

import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.json.Json;

/**
 * A request failed.
 *
 * @param type message type of the reply
 * @param error what went wrong
 * @param executionCount number of the cell, in replies to execute requests
 */
public record ErrorReply(String type, ErrorInfo error, Optional<Integer> executionCount)
    implements Content {
  private Map<String, Object> tree() {
    Map<String, Object> tree = Json.object("status", "error");
    tree.putAll(error.toJson());
    executionCount.ifPresent(count -> tree.put("execution_count", count));
    return tree;
  }

  @Override
  public Map<String, Object> toJson() {
    return tree();
  }
}
