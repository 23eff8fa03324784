package pinchoff.kernel.protocol;

import java.util.List;
import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * What went wrong.
 *
 * @param name kind of failure, for example an exception's name
 * @param value message of the failure; empty rather than null
 * @param traceback lines for the reader
 */
public record ErrorInfo(String name, String value, List<String> traceback) {

  /** Copies the lines. */
  public ErrorInfo {
    traceback = List.copyOf(traceback);
  }

  /** The failure of something of our own. */
  public static ErrorInfo of(Throwable failure) {
    String name = failure.getClass().getSimpleName();
    String value = failure.getMessage() == null ? "" : failure.getMessage();
    return new ErrorInfo(name, value, List.of(value.isEmpty() ? name : name + ": " + value));
  }

  static ErrorInfo read(Fields in) {
    return new ErrorInfo(in.string("ename", ""), in.string("evalue", ""), in.strings("traceback"));
  }

  /** The three fields that every form of an error has. */
  public Map<String, Object> toJson() {
    return Json.object("ename", name, "evalue", value, "traceback", traceback);
  }
}
