package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks for inputs of the past.
 *
 * @param output whether outputs are wanted too
 * @param raw whether inputs are wanted as typed; they always are
 * @param accessType tail, range or search
 * @param n how many at most; in tail and search
 * @param session session of a range; 0 for this one, negative counts back
 * @param start first line of a range
 * @param stop line after the last of a range
 * @param pattern what to search, with * and ?
 * @param unique whether a search gives each input once
 */
public record HistoryRequest(
    boolean output,
    boolean raw,
    String accessType,
    int n,
    int session,
    int start,
    int stop,
    String pattern,
    boolean unique)
    implements Content {
  /** The message type. */
  public static final String TYPE = "history_request";

  static HistoryRequest read(Fields in) {
    return new HistoryRequest(
        in.flag("output", false),
        in.flag("raw", true),
        in.string("hist_access_type", "tail"),
        in.integer("n", Integer.MAX_VALUE),
        in.integer("session", 0),
        in.integer("start", 0),
        in.integer("stop", Integer.MAX_VALUE),
        in.string("pattern", "*"),
        in.flag("unique", false));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "output",
        output,
        "raw",
        raw,
        "hist_access_type",
        accessType,
        "n",
        n,
        "session",
        session,
        "start",
        start,
        "stop",
        stop,
        "pattern",
        pattern,
        "unique",
        unique);
  }
}
