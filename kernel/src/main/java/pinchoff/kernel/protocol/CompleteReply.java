package pinchoff.kernel.protocol;

import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * What could be typed at a place.
 *
 * @param matches the texts, best first
 * @param cursorStart start of what they replace, in code points
 * @param cursorEnd its end
 * @param metadata more on each match
 */
public record CompleteReply(
    List<String> matches, int cursorStart, int cursorEnd, Map<String, Object> metadata)
    implements Content {
  /** The message type. */
  public static final String TYPE = "complete_reply";

  static CompleteReply read(Fields in) {
    return new CompleteReply(
        in.strings("matches"),
        in.integer("cursor_start", 0),
        in.integer("cursor_end", 0),
        in.object("metadata"));
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
        "matches",
        matches,
        "cursor_start",
        cursorStart,
        "cursor_end",
        cursorEnd,
        "metadata",
        metadata);
  }
}
