package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Whether a text can be run as it stands.
 *
 * @param verdict complete, incomplete, invalid or unknown
 * @param indent start of the next line, if incomplete
 */
public record IsCompleteReply(String verdict, String indent) implements Content {
  /** The message type. */
  public static final String TYPE = "is_complete_reply";

  static IsCompleteReply read(Fields in) {
    return new IsCompleteReply(in.string("status"), in.string("indent", ""));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return verdict.equals("incomplete")
        ? Json.object("status", verdict, "indent", indent)
        : Json.object("status", verdict);
  }
}
