package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;

/** Asks what this kernel is. */
public record KernelInfoRequest() implements Content {
  /** The message type. */
  public static final String TYPE = "kernel_info_request";

  static KernelInfoRequest read(Fields in) {
    return new KernelInfoRequest();
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
