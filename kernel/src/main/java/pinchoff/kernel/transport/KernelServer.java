package pinchoff.kernel.transport;

import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import org.zeromq.ZMQException;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.IdSource;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.session.KernelSession;
import pinchoff.kernel.session.MessagePort;
import pinchoff.kernel.session.Request;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.Message;
import pinchoff.kernel.wire.WireException;
import pinchoff.kernel.wire.WireFormat;

/**
 * A running kernel. The sockets come first, so that front ends get an answer at once; the evaluator
 * starts in the background.
 */
public final class KernelServer implements MessagePort, AutoCloseable {
  private static final String USER = "pinchoff";

  private final Limits limits;
  private final Consumer<String> log;
  private final ZContext context = new ZContext();
  private final BlockingQueue<Request> shell = new LinkedBlockingQueue<>();
  private final BlockingQueue<Request> control = new LinkedBlockingQueue<>();
  private final CountDownLatch ended = new CountDownLatch(1);
  private final List<Thread> workers = new ArrayList<>();
  private final WireFormat wire;
  private final BroadcastLoop broadcasts;
  private final RequestLoop requests;
  private final KernelSession session;
  private final Thread broadcastThread;
  private final Thread requestThread;

  /**
   * Opens the sockets and begins to answer.
   *
   * @param connection where to listen
   * @param limits limits on what comes in and goes out
   * @param evaluator makes the evaluator, on a thread of its own
   * @param log receives one line for each thing that is refused
   * @throws pinchoff.kernel.wire.ConnectionException if an address cannot be had
   */
  public KernelServer(
      ConnectionInfo connection,
      Limits limits,
      Supplier<? extends CellEvaluator> evaluator,
      Consumer<String> log) {
    this.limits = limits;
    this.log = log;
    this.wire = new WireFormat(connection.signer(), limits);
    MessageFactory messages = new MessageFactory(IdSource.random(), Clock.systemUTC(), USER);
    boolean bound = false;
    try {
      this.broadcasts = new BroadcastLoop(context, connection, limits, wire, messages, log);
      this.requests =
          new RequestLoop(
              context,
              connection,
              limits,
              wire,
              Map.of(
                  Channel.SHELL, shell::add,
                  Channel.CONTROL, control::add,
                  Channel.STDIN, this::input),
              log);
      ZMQ.Socket heartbeat =
          Sockets.bind(context, SocketType.REP, Channel.HEARTBEAT, connection, limits, 100);
      CompletableFuture<CellEvaluator> ready = new CompletableFuture<>();
      this.session = new KernelSession(ready, messages, this, limits, log, ended::countDown);
      this.broadcastThread = start("pinchoff-iopub", broadcasts);
      this.requestThread = start("pinchoff-requests", requests);
      start("pinchoff-heartbeat", () -> echo(heartbeat));
      workers.add(start("pinchoff-control", () -> serve(control, session::control)));
      workers.add(start("pinchoff-shell", () -> serve(shell, session::shell)));
      start("pinchoff-start", () -> create(evaluator, ready));
      bound = true;
    } finally {
      if (!bound) {
        context.close();
      }
    }
  }

  /** Ends the kernel when a process is gone; see the launcher's variable JPY_PARENT_PID. */
  public void endWith(String parentProcessId) {
    ParentWatch.on(parentProcessId, ended::countDown)
        .ifPresent(watch -> start("pinchoff-parent", watch));
  }

  /** Waits until the kernel is asked to end. */
  public void awaitEnd() throws InterruptedException {
    ended.await();
  }

  /** Sends what is still to be sent, for a short time, and closes the sockets. */
  @Override
  public void close() {
    workers.forEach(Thread::interrupt);
    broadcasts.stop();
    requests.stop();
    long deadline = System.nanoTime() + limits.shutdown().toNanos();
    join(broadcastThread, deadline);
    join(requestThread, deadline);
    session.close();
    // A thread that is stuck in a socket must not hold up the end of the process.
    join(start("pinchoff-close", context::close), deadline);
  }

  @Override
  public void send(Channel channel, Message message) {
    List<byte[]> frames = wire.encode(message);
    if (channel == Channel.IOPUB) {
      broadcasts.send(frames);
    } else {
      requests.send(channel, frames);
    }
  }

  @Override
  public boolean ask(Message question) throws InterruptedException {
    try {
      return requests.deliver(Channel.STDIN, wire.encode(question)).get();
    } catch (ExecutionException e) {
      return false;
    }
  }

  @Override
  public List<Request> takeWaiting() {
    List<Request> waiting = new ArrayList<>();
    try {
      requests.readEmpty().get(limits.shutdown().toMillis(), TimeUnit.MILLISECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    } catch (ExecutionException | TimeoutException e) {
      log.accept("shell: what waits could not be read: " + e);
    }
    shell.drainTo(waiting);
    return waiting;
  }

  private void input(Request reply) {
    session.input(reply);
  }

  private void serve(BlockingQueue<Request> queue, Consumer<Request> handler) {
    try {
      while (true) {
        Request request = queue.take();
        try {
          handler.accept(request);
        } catch (Throwable e) {
          // Errors too: these two threads serve every request.
          log.accept(WireException.printable(request.message().header().type() + ": " + e));
        }
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void create(
      Supplier<? extends CellEvaluator> evaluator, CompletableFuture<CellEvaluator> ready) {
    try {
      ready.complete(evaluator.get());
    } catch (Throwable e) {
      log.accept("the evaluator could not be started: " + e);
      ready.completeExceptionally(e);
    }
  }

  private static void echo(ZMQ.Socket socket) {
    try {
      ZMQ.proxy(socket, socket, null);
    } catch (ZMQException e) {
      // The context was closed: the kernel ends.
      return;
    } finally {
      socket.close();
    }
  }

  private static Thread start(String name, Runnable work) {
    Thread thread = new Thread(work, name);
    thread.setDaemon(true);
    thread.start();
    return thread;
  }

  private static void join(Thread thread, long deadline) {
    try {
      long millis = (deadline - System.nanoTime()) / 1_000_000;
      thread.join(Math.max(1, millis));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
