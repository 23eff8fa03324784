package pinchoff.kernel.client;

import java.time.Clock;
import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.IdSource;
import pinchoff.kernel.protocol.InputReply;
import pinchoff.kernel.protocol.InterruptRequest;
import pinchoff.kernel.protocol.IopubWelcome;
import pinchoff.kernel.protocol.KernelInfoReply;
import pinchoff.kernel.protocol.KernelInfoRequest;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.protocol.Protocol;
import pinchoff.kernel.protocol.ShutdownReply;
import pinchoff.kernel.protocol.ShutdownRequest;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.Message;

/**
 * Speaks with a kernel that runs. Safe for use by several threads: one may interrupt what another
 * one waits for.
 */
public final class KernelClient implements AutoCloseable {
  private static final String USER = "pinchoff";

  private final MessageFactory messages =
      new MessageFactory(IdSource.random(), Clock.systemUTC(), USER);
  private final Map<String, Exchange> exchanges = new ConcurrentHashMap<>();
  private final CountDownLatch broadcastsArrive = new CountDownLatch(1);
  private final ClientSockets sockets;
  private volatile Optional<String> gone = Optional.empty();

  private KernelClient(ConnectionInfo connection, Limits limits) {
    sockets = new ClientSockets(connection, messages.session(), limits, this::received);
  }

  /**
   * Connects to a kernel. Returns at once, whether there is one or not: {@link #kernelInfo} tells.
   */
  public static KernelClient connect(ConnectionInfo connection) {
    return connect(connection, Limits.standard());
  }

  /** Connects to a kernel with limits of one's own on what is received. */
  public static KernelClient connect(ConnectionInfo connection, Limits limits) {
    KernelClient client = new KernelClient(connection, limits);
    client.sockets.start();
    return client;
  }

  /**
   * Asks the kernel what it is, and waits until its broadcasts arrive too: after this no output is
   * missed.
   *
   * @param limit how long to wait
   * @throws KernelTimeoutException if it does not answer in time
   * @throws KernelGoneException if it has ended
   */
  public KernelInfoReply kernelInfo(Duration limit) throws InterruptedException {
    long deadline = System.nanoTime() + limit.toNanos();
    Message message = messages.request(new KernelInfoRequest());
    Content reply;
    try (Exchange exchange = open(message)) {
      sockets.send(Channel.SHELL, message);
      // Not its idle status: that may be broadcast before this client's subscription is known.
      reply = exchange.awaitReply(limit);
    }
    long rest = Math.max(0, deadline - System.nanoTime());
    if (!broadcastsArrive.await(rest, TimeUnit.NANOSECONDS)) {
      throw new KernelTimeoutException("no broadcast of the kernel came within " + limit);
    }
    if (reply instanceof KernelInfoReply info) {
      return info;
    }
    throw new KernelGoneException("the kernel does not say what it is: " + reply);
  }

  /**
   * Runs a cell and waits for its reply and for its last output. An interrupt of the waiting thread
   * ends the wait, not the cell.
   *
   * @param listener receives the outputs on this thread
   * @throws KernelGoneException if the kernel ends meanwhile
   */
  public CellReply execute(ExecuteRequest request, OutputListener listener)
      throws InterruptedException {
    Message message = messages.request(request);
    try (Exchange exchange = open(message)) {
      sockets.send(Channel.SHELL, message);
      return CellReply.of(
          exchange.await(
              Optional.empty(),
              content -> Outputs.deliver(content, listener),
              asked -> {
                String answer =
                    listener.input(asked.prompt(), asked.password()).orElse(Protocol.END_OF_INPUT);
                sockets.send(Channel.STDIN, messages.request(new InputReply(answer)));
              }));
    }
  }

  /**
   * Sends any request and waits for its reply and its idle status.
   *
   * @param channel {@link Channel#SHELL} or {@link Channel#CONTROL}
   * @param limit how long to wait
   * @throws KernelTimeoutException if it is not finished in time
   * @throws KernelGoneException if the kernel ends meanwhile
   */
  public Content request(Channel channel, Content request, Duration limit)
      throws InterruptedException {
    Message message = messages.request(request);
    try (Exchange exchange = open(message)) {
      sockets.send(channel, message);
      return exchange.await(Optional.of(limit), content -> {}, asked -> {});
    }
  }

  /** Asks the kernel to end the cell that runs; returns at once. */
  public void interrupt() {
    sockets.send(Channel.CONTROL, messages.request(new InterruptRequest()));
  }

  /**
   * Asks the kernel to end, whatever it does.
   *
   * @param restart whether it will be started again with the same connection
   * @param limit how long to wait for its word
   * @return its word, or empty if none came in time
   */
  public Optional<ShutdownReply> shutdown(boolean restart, Duration limit)
      throws InterruptedException {
    Message message = messages.request(new ShutdownRequest(restart));
    try (Exchange exchange = open(message)) {
      sockets.send(Channel.CONTROL, message);
      return exchange.awaitReply(limit) instanceof ShutdownReply reply
          ? Optional.of(reply)
          : Optional.empty();
    } catch (KernelTimeoutException | KernelGoneException e) {
      return Optional.empty();
    }
  }

  /** Ends every wait for the kernel: it is gone, for this reason. */
  void abandon(String reason) {
    gone = Optional.of(reason);
    exchanges.values().forEach(exchange -> exchange.abandon(reason));
    broadcastsArrive.countDown();
  }

  @Override
  public void close() {
    abandon("the connection to the kernel was closed");
    sockets.close();
  }

  private Exchange open(Message request) {
    String id = request.header().id();
    Exchange exchange = new Exchange(request.header().type(), () -> exchanges.remove(id));
    exchanges.put(id, exchange);
    gone.ifPresent(exchange::abandon);
    return exchange;
  }

  private void received(Channel channel, Message message, Content content) {
    if (channel == Channel.IOPUB) {
      broadcastsArrive.countDown();
    }
    if (content instanceof IopubWelcome) {
      return;
    }
    message
        .parentId()
        .flatMap(id -> Optional.ofNullable(exchanges.get(id)))
        .ifPresent(exchange -> exchange.received(channel, content));
  }
}
