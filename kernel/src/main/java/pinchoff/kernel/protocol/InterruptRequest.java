package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;

/** Asks to end the running cell. */
public record InterruptRequest() implements Content {
  /** The message type. */
  public static final String TYPE = "interrupt_request";

  static InterruptRequest read(Fields in) {
    return new InterruptRequest();
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Map.of();
  }
}
