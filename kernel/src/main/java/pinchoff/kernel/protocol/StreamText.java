package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Text that a cell printed.
 *
 * @param name stdout or stderr
 * @param text the text
 */
public record StreamText(String name, String text) implements Content {
  /** The message type. */
  public static final String TYPE = "stream";

  static StreamText read(Fields in) {
    return new StreamText(in.string("name"), in.string("text"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("name", name, "text", text);
  }
}
