package pinchoff.kernel.transport;

import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.function.Consumer;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.session.Request;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.Mailbox;
import pinchoff.kernel.wire.WireException;
import pinchoff.kernel.wire.WireFormat;

/** The thread of the sockets on which front ends ask and are asked: shell, control, stdin. */
final class RequestLoop implements Runnable {
  private static final List<Channel> CHANNELS =
      List.of(Channel.SHELL, Channel.CONTROL, Channel.STDIN);

  private final ZContext context;
  private static final int MESSAGES_KEPT = 1000;

  private final Limits limits;
  private final Map<Channel, ZMQ.Socket> sockets;
  private final WireFormat wire;
  private final Map<Channel, Consumer<Request>> receivers;
  private final Consumer<String> log;
  private final Mailbox<Letter> outbox = new Mailbox<>();

  /** A message to send, or with no frames a request to read the sockets empty. */
  private record Letter(
      Channel channel, List<byte[]> frames, CompletableFuture<Boolean> done, boolean last) {}

  RequestLoop(
      ZContext context,
      ConnectionInfo connection,
      Limits limits,
      WireFormat wire,
      Map<Channel, Consumer<Request>> receivers,
      Consumer<String> log) {
    this.context = context;
    this.limits = limits;
    this.wire = wire;
    this.receivers = receivers;
    this.log = log;
    this.sockets =
        Map.of(
            Channel.SHELL, router(Channel.SHELL, connection, limits),
            Channel.CONTROL, router(Channel.CONTROL, connection, limits),
            Channel.STDIN, router(Channel.STDIN, connection, limits));
  }

  private ZMQ.Socket router(Channel channel, ConnectionInfo connection, Limits limits) {
    ZMQ.Socket socket =
        Sockets.bind(context, SocketType.ROUTER, channel, connection, limits, MESSAGES_KEPT);
    // A front end that comes back under its old name takes over from its former self.
    socket.setRouterHandover(true);
    if (channel == Channel.STDIN) {
      socket.setRouterMandatory(true);
    }
    return socket;
  }

  /** Sends a message. */
  void send(Channel channel, List<byte[]> frames) {
    outbox.put(new Letter(channel, frames, new CompletableFuture<>(), false));
  }

  /** Sends a message; the future tells whether there was somebody to send it to. */
  CompletableFuture<Boolean> deliver(Channel channel, List<byte[]> frames) {
    CompletableFuture<Boolean> done = new CompletableFuture<>();
    outbox.put(new Letter(channel, frames, done, false));
    return done;
  }

  /** Completes when everything that had arrived at this moment has been handed on. */
  CompletableFuture<Boolean> readEmpty() {
    return deliver(Channel.SHELL, List.of());
  }

  /** Ends the thread after what was left before has been sent. */
  void stop() {
    outbox.put(new Letter(Channel.SHELL, List.of(), new CompletableFuture<>(), true));
  }

  @Override
  public void run() {
    try (ZMQ.Poller poller = context.createPoller(CHANNELS.size() + 1)) {
      for (Channel channel : CHANNELS) {
        poller.register(socket(channel), ZMQ.Poller.POLLIN);
      }
      int mail = poller.register(outbox.arrival(), ZMQ.Poller.POLLIN);
      boolean open = true;
      while (open) {
        poller.poll();
        for (int i = 0; i < CHANNELS.size(); i++) {
          if (poller.pollin(i)) {
            receiveAll(CHANNELS.get(i));
          }
        }
        open = !poller.pollin(mail) || sendAll();
      }
    } finally {
      sockets.values().forEach(ZMQ.Socket::close);
    }
  }

  private ZMQ.Socket socket(Channel channel) {
    ZMQ.Socket socket = sockets.get(channel);
    if (socket == null) {
      throw new IllegalArgumentException("no socket for " + channel);
    }
    return socket;
  }

  private void receiveAll(Channel channel) {
    ZMQ.Socket socket = socket(channel);
    for (var frames = Sockets.receive(socket, limits);
        !frames.isEmpty();
        frames = Sockets.receive(socket, limits)) {
      receive(channel, frames);
    }
  }

  private void receive(Channel channel, List<byte[]> frames) {
    try {
      Request request = Request.of(wire.decode(frames));
      receivers.getOrDefault(channel, ignored -> {}).accept(request);
    } catch (WireException | RuntimeException e) {
      log.accept(
          channel.label()
              + ": dropped a message: "
              + WireException.printable(String.valueOf(e.getMessage())));
    }
  }

  private boolean sendAll() {
    outbox.acknowledge();
    for (var next = outbox.poll(); next.isPresent(); next = outbox.poll()) {
      Letter letter = next.get();
      if (letter.last()) {
        return false;
      }
      if (letter.frames().isEmpty()) {
        receiveAll(letter.channel());
        letter.done().complete(true);
      } else {
        letter
            .done()
            .complete(Sockets.send(socket(letter.channel()), letter.frames(), ZMQ.DONTWAIT));
      }
    }
    return true;
  }
}
