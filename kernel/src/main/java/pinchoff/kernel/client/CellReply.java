package pinchoff.kernel.client;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.kernel.protocol.AbortedReply;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ErrorReply;
import pinchoff.kernel.protocol.ExecuteReply;

/**
 * How a cell ended.
 *
 * @param status whether it ran to its end, failed, or was never run
 * @param executionCount its number, unless it was never run
 * @param error what went wrong, if it failed
 * @param userExpressions name to value or error of the expressions of the request
 * @param payload actions for the front end
 */
public record CellReply(
    Status status,
    Optional<Integer> executionCount,
    Optional<ErrorInfo> error,
    Map<String, Object> userExpressions,
    List<Object> payload) {

  /** The three ends of a cell. */
  public enum Status {
    /** It ran to its end. */
    OK,
    /** It failed or was interrupted. */
    ERROR,
    /** It was not run, because a cell before it failed. */
    ABORTED
  }

  /** Whether the cell ran to its end. */
  public boolean ok() {
    return status == Status.OK;
  }

  static CellReply of(Content reply) {
    if (reply instanceof ExecuteReply ok) {
      return new CellReply(
          Status.OK,
          Optional.of(ok.executionCount()),
          Optional.empty(),
          ok.userExpressions(),
          ok.payload());
    }
    if (reply instanceof ErrorReply failed) {
      return new CellReply(
          Status.ERROR, failed.executionCount(), Optional.of(failed.error()), Map.of(), List.of());
    }
    if (reply instanceof AbortedReply) {
      return new CellReply(Status.ABORTED, Optional.empty(), Optional.empty(), Map.of(), List.of());
    }
    throw new IllegalArgumentException("a " + reply.type() + " is no reply to a cell");
  }
}
