package pinchoff.kernel.session;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.function.Supplier;
import pinchoff.display.MimeBundle;
import pinchoff.kernel.eval.Cell;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.eval.CellOutcome;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ErrorOutput;
import pinchoff.kernel.protocol.ErrorReply;
import pinchoff.kernel.protocol.ExecuteInput;
import pinchoff.kernel.protocol.ExecuteReply;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.wire.Channel;

/** Runs cells: numbers, outputs, replies. */
final class Executions implements AutoCloseable {
  private static final String REPLY = "execute_reply";

  private final Outbox outbox;
  private final Questions questions;
  private final History history;
  private final Limits limits;
  private final ScheduledExecutorService timer =
      Executors.newSingleThreadScheduledExecutor(
          task -> {
            Thread thread = new Thread(task, "pinchoff-streams");
            thread.setDaemon(true);
            return thread;
          });
  private int count;

  Executions(Outbox outbox, Questions questions, History history, Limits limits) {
    this.outbox = outbox;
    this.questions = questions;
    this.history = history;
    this.limits = limits;
  }

  /**
   * Runs one cell and replies.
   *
   * @return the requests that waited when it failed and must be dealt with now, in order
   */
  List<Request> run(Request request, ExecuteRequest asked, Supplier<CellEvaluator> evaluators) {
    String started = outbox.messages().now();
    if (asked.code().isBlank()) {
      RequestOutput output = new RequestOutput(request, asked, outbox, questions, limits, timer);
      Map<String, Object> expressions =
          asked.userExpressions().isEmpty()
              ? Map.of()
              : express(asked.userExpressions(), evaluators.get(), output);
      output.flush();
      outbox.reply(
          Channel.SHELL, request, new ExecuteReply(count, expressions, List.of()), started);
      return List.of();
    }
    CellEvaluator evaluator = evaluators.get();
    int number = asked.storeHistory() ? ++count : count;
    RequestOutput output = new RequestOutput(request, asked, outbox, questions, limits, timer);
    output.send(new ExecuteInput(asked.code(), number));
    CellOutcome outcome = evaluator.run(new Cell(number, asked.code()), output);
    if (outcome instanceof CellOutcome.Success success) {
      success.result().ifPresent(bundle -> output.result(number, bundle));
      Map<String, Object> expressions = express(asked.userExpressions(), evaluator, output);
      output.flush();
      remember(asked, number, success.result());
      outbox.reply(
          Channel.SHELL, request, new ExecuteReply(number, expressions, output.payload()), started);
      return List.of();
    }
    // Taken before the front end can see the error: what it sends after that must run.
    List<Request> waiting =
        asked.stopOnError() && !asked.silent() ? outbox.port().takeWaiting() : List.of();
    ErrorInfo error = errorOf((CellOutcome.Failure) outcome);
    output.send(new ErrorOutput(error));
    output.flush();
    remember(asked, number, Optional.empty());
    outbox.reply(
        Channel.SHELL, request, new ErrorReply(REPLY, error, Optional.of(number)), started);
    return waiting;
  }

  /** Replies to a cell that cannot be run at all. */
  void refuse(Request request, ExecuteRequest asked, ErrorInfo error) {
    if (!asked.silent()) {
      outbox.broadcast(request.header(), new ErrorOutput(error));
    }
    outbox.reply(Channel.SHELL, request, new ErrorReply(REPLY, error, Optional.of(count)));
  }

  @Override
  public void close() {
    timer.shutdownNow();
  }

  private void remember(ExecuteRequest asked, int number, Optional<MimeBundle> result) {
    if (asked.storeHistory()) {
      history.add(number, asked.code(), result.map(MimeBundle::plainText));
    }
  }

  private static Map<String, Object> express(
      Map<String, Object> expressions, CellEvaluator evaluator, RequestOutput output) {
    Map<String, Object> values = new LinkedHashMap<>();
    expressions.forEach(
        (name, expression) ->
            values.put(name, toJson(evaluator.express(String.valueOf(expression), output))));
    return values;
  }

  private static Map<String, Object> toJson(CellOutcome outcome) {
    if (outcome instanceof CellOutcome.Success success) {
      MimeBundle bundle = success.result().orElseGet(() -> MimeBundle.text(""));
      return Json.object(
          "status", "ok", "data", bundle.data(), "metadata", RequestOutput.metadata(bundle));
    }
    Map<String, Object> tree = Json.object("status", "error");
    tree.putAll(errorOf((CellOutcome.Failure) outcome).toJson());
    return tree;
  }

  private static ErrorInfo errorOf(CellOutcome.Failure failure) {
    return new ErrorInfo(failure.name(), failure.message(), failure.traceback());
  }
}
