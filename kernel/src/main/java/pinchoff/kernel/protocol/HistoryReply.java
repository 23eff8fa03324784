package pinchoff.kernel.protocol;

import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Inputs of the past.
 *
 * @param history lists of session, line and input, or input and output
 */
public record HistoryReply(List<Object> history) implements Content {
  /** The message type. */
  public static final String TYPE = "history_reply";

  static HistoryReply read(Fields in) {
    return new HistoryReply(in.list("history"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "ok", "history", history);
  }
}
