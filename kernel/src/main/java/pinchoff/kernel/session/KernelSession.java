package pinchoff.kernel.session;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Consumer;
import java.util.function.Supplier;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.AbortedReply;
import pinchoff.kernel.protocol.CommClose;
import pinchoff.kernel.protocol.CommInfoReply;
import pinchoff.kernel.protocol.CommInfoRequest;
import pinchoff.kernel.protocol.CommMsg;
import pinchoff.kernel.protocol.CommOpen;
import pinchoff.kernel.protocol.CompleteRequest;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ErrorReply;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.HistoryRequest;
import pinchoff.kernel.protocol.InspectRequest;
import pinchoff.kernel.protocol.InterruptReply;
import pinchoff.kernel.protocol.InterruptRequest;
import pinchoff.kernel.protocol.IsCompleteRequest;
import pinchoff.kernel.protocol.KernelInfoRequest;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.protocol.Protocol;
import pinchoff.kernel.protocol.ShutdownReply;
import pinchoff.kernel.protocol.ShutdownRequest;
import pinchoff.kernel.protocol.Status;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.WireException;

/**
 * One session of a kernel: answers every request, with busy before and idle after it.
 *
 * <p>{@link #shell} is called by one thread, {@link #control} by another, {@link #input} by any.
 */
public final class KernelSession implements AutoCloseable {
  private final EvaluatorGate evaluator;
  private final Outbox outbox;
  private final Questions questions;
  private final Executions executions;
  private final History history;
  private final Consumer<String> log;
  private final Runnable onShutdown;

  /**
   * A session at its start; broadcasts that it is starting.
   *
   * @param evaluator runs the cells; requests that need it wait for it
   * @param messages makes the messages
   * @param port where they leave
   * @param limits limits on outputs and history
   * @param log receives one line for each thing that is refused
   * @param onShutdown called after the reply to a request to end
   */
  public KernelSession(
      CompletableFuture<CellEvaluator> evaluator,
      MessageFactory messages,
      MessagePort port,
      Limits limits,
      Consumer<String> log,
      Runnable onShutdown) {
    this.evaluator = new EvaluatorGate(evaluator);
    this.outbox = new Outbox(messages, port);
    this.questions = new Questions(outbox);
    this.history = new History(limits.historyEntries());
    this.executions = new Executions(outbox, questions, history, limits);
    this.log = log;
    this.onShutdown = onShutdown;
    outbox.broadcast(Map.of(), Status.STARTING);
  }

  /** Handles a request of the shell channel to its end. */
  public void shell(Request request) {
    List<Request> waiting = within(request, () -> answerShell(request));
    for (Request next : waiting) {
      if (next.content() instanceof ExecuteRequest) {
        abort(next);
      } else {
        shell(next);
      }
    }
    endIfAsked(request);
  }

  /** Handles a request of the control channel to its end. */
  public void control(Request request) {
    within(
        request,
        () -> {
          answerControl(request);
          return List.of();
        });
    endIfAsked(request);
  }

  /** Takes a message of the stdin channel. */
  public void input(Request reply) {
    questions.received(reply);
  }

  @Override
  public void close() {
    executions.close();
  }

  private List<Request> within(Request request, Supplier<List<Request>> work) {
    outbox.broadcast(request.header(), Status.BUSY);
    try {
      return work.get();
    } finally {
      outbox.broadcast(request.header(), Status.IDLE);
    }
  }

  private List<Request> answerShell(Request request) {
    Content content = request.content();
    if (content instanceof ExecuteRequest asked) {
      return execute(request, asked);
    }
    if (content instanceof CompleteRequest asked) {
      answer(request, () -> HelpRequests.complete(asked, evaluator.await()));
    } else if (content instanceof InspectRequest asked) {
      answer(request, () -> HelpRequests.inspect(asked, evaluator.await()));
    } else if (content instanceof IsCompleteRequest asked) {
      answer(request, () -> HelpRequests.isComplete(asked, evaluator.await()));
    } else if (content instanceof HistoryRequest asked) {
      answer(request, () -> history.answer(asked));
    } else if (content instanceof KernelInfoRequest) {
      answer(request, KernelInfo::reply);
    } else if (content instanceof CommInfoRequest) {
      answer(request, () -> new CommInfoReply(Map.of()));
    } else if (content instanceof CommOpen open) {
      // No targets are known here: whoever opens a channel is told that it is closed.
      outbox.broadcast(request.header(), new CommClose(open.commId(), Map.of()));
    } else if (content instanceof ShutdownRequest asked) {
      answer(request, () -> new ShutdownReply(asked.restart()));
    } else if (!(content instanceof CommMsg || content instanceof CommClose)) {
      refuse(Channel.SHELL, request);
    }
    return List.of();
  }

  private List<Request> execute(Request request, ExecuteRequest asked) {
    try {
      return executions.run(request, asked, evaluator::await);
    } catch (Throwable e) {
      // Errors too: a full stack or memory must not end the thread that serves every request.
      if (!(e instanceof EvaluatorGate.NotReadyException)) {
        log.accept("a cell failed inside the kernel: " + WireException.printable(e.toString()));
      }
      executions.refuse(request, asked, ErrorInfo.of(e));
    }
    return List.of();
  }

  private void answer(Request request, Supplier<Content> work) {
    Content reply;
    try {
      reply = work.get();
    } catch (Throwable e) {
      String type = Protocol.replyType(request.message().header().type());
      reply = new ErrorReply(type, ErrorInfo.of(e), Optional.empty());
    }
    outbox.reply(Channel.SHELL, request, reply);
  }

  private void answerControl(Request request) {
    Content content = request.content();
    if (content instanceof InterruptRequest) {
      questions.interrupt();
      evaluator.interrupt();
      outbox.reply(Channel.CONTROL, request, new InterruptReply());
    } else if (content instanceof KernelInfoRequest) {
      outbox.reply(Channel.CONTROL, request, KernelInfo.reply());
    } else if (content instanceof ShutdownRequest asked) {
      outbox.reply(Channel.CONTROL, request, new ShutdownReply(asked.restart()));
    } else {
      refuse(Channel.CONTROL, request);
    }
  }

  private void refuse(Channel channel, Request request) {
    log.accept(
        channel.label()
            + ": unknown message type "
            + WireException.printable(request.message().header().type()));
  }

  private void endIfAsked(Request request) {
    if (request.content() instanceof ShutdownRequest) {
      onShutdown.run();
    }
  }

  private void abort(Request request) {
    within(
        request,
        () -> {
          String type = Protocol.replyType(ExecuteRequest.TYPE);
          outbox.reply(Channel.SHELL, request, new AbortedReply(type));
          return List.of();
        });
  }
}
