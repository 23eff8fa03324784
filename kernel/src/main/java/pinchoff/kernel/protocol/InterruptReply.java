package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/** The interrupt is on its way. */
public record InterruptReply() implements Content {
  /** The message type. */
  public static final String TYPE = "interrupt_reply";

  static InterruptReply read(Fields in) {
    return new InterruptReply();
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("status", "ok");
  }
}
