package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * What the kernel does now.
 *
 * @param state busy, idle or starting
 */
public record Status(String state) implements Content {
  /** The message type. */
  public static final String TYPE = "status";

  /** A request is being served. */
  public static final Status BUSY = new Status("busy");

  /** The request has been served, all its outputs have left. */
  public static final Status IDLE = new Status("idle");

  /** The process has started. */
  public static final Status STARTING = new Status("starting");

  static Status read(Fields in) {
    return new Status(in.string("execution_state"));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object("execution_state", state);
  }
}
