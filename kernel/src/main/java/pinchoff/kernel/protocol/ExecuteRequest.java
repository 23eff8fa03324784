package pinchoff.kernel.protocol;

import java.util.Map;
import pinchoff.kernel.json.Fields;
import pinchoff.kernel.json.Json;

/**
 * Asks to run a cell.
 *
 * @param code source of the cell; may be empty
 * @param silent true to run without any output, history or counting
 * @param storeHistory false to run without history and counting
 * @param userExpressions name to expression, evaluated after a successful run
 * @param allowStdin whether the sender can answer questions
 * @param stopOnError whether a failure ends the cells that wait already
 */
public record ExecuteRequest(
    String code,
    boolean silent,
    boolean storeHistory,
    Map<String, Object> userExpressions,
    boolean allowStdin,
    boolean stopOnError)
    implements Content {
  /** The message type. */
  public static final String TYPE = "execute_request";

  /** A silent request is never stored. */
  public ExecuteRequest {
    storeHistory = storeHistory && !silent;
  }

  /** A request to run a cell that is stored and may not ask. */
  public static ExecuteRequest of(String code) {
    return new ExecuteRequest(code, false, true, Map.of(), false, true);
  }

  /** This request from a sender that can answer questions, or cannot. */
  public ExecuteRequest withStdin(boolean allowed) {
    return new ExecuteRequest(code, silent, storeHistory, userExpressions, allowed, stopOnError);
  }

  /** This request with another rule for the cells that wait. */
  public ExecuteRequest withStopOnError(boolean stop) {
    return new ExecuteRequest(code, silent, storeHistory, userExpressions, allowStdin, stop);
  }

  /** This request with expressions to evaluate afterwards. */
  public ExecuteRequest withUserExpressions(Map<String, String> expressions) {
    return new ExecuteRequest(
        code, silent, storeHistory, Map.copyOf(expressions), allowStdin, stopOnError);
  }

  static ExecuteRequest read(Fields in) {
    return new ExecuteRequest(
        in.string("code"),
        in.flag("silent", false),
        in.flag("store_history", true),
        in.object("user_expressions"),
        in.flag("allow_stdin", true),
        in.flag("stop_on_error", true));
  }

  @Override
  public String type() {
    return TYPE;
  }

  @Override
  public Map<String, Object> toJson() {
    return Json.object(
        "code",
        code,
        "silent",
        silent,
        "store_history",
        storeHistory,
        "user_expressions",
        userExpressions,
        "allow_stdin",
        allowStdin,
        "stop_on_error",
        stopOnError);
  }
}
