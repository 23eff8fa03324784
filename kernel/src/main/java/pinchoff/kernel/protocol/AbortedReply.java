package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Json;

/**
 * A request was not carried out because one before it failed. Front ends show such a cell as one
 * that never ran only if the reply says no more than this.
 *
 * @param type message type of the reply
 */
public record AbortedReply(String type) implements Content {
  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "aborted");
  }
}
