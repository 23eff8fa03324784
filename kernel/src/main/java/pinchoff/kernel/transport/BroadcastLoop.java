package pinchoff.kernel.transport;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.IopubWelcome;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.Mailbox;
import pinchoff.kernel.wire.WireFormat;

/**
 * The thread of the broadcasts: sends in order what everybody leaves, welcomes each subscriber, and
 * keeps memory bounded when a subscriber does not read: first everybody waits for it a little, then
 * it loses messages until it reads again.
 */
final class BroadcastLoop implements Runnable {
  private static final int STEP_MILLIS = 5;
  private static final int LONGEST_TOPIC = 1024;

  private final ZContext context;
  private final ZMQ.Socket socket;
  private final Limits limits;
  private final Consumer<String> log;
  private final Function<String, List<byte[]>> welcome;
  private final Mailbox<Letter> outbox = new Mailbox<>();
  private final Object room = new Object();
  private long waitingBytes;
  private boolean patient = true;

  /** Frames to send; none means the end. */
  private record Letter(List<byte[]> frames, long bytes) {}

  BroadcastLoop(
      ZContext context,
      ConnectionInfo connection,
      Limits limits,
      WireFormat wire,
      MessageFactory messages,
      Consumer<String> log) {
    this.context = context;
    this.limits = limits;
    this.log = log;
    this.welcome =
        topic -> wire.encode(messages.broadcast(topic, Map.of(), new IopubWelcome(topic)));
    this.socket =
        Sockets.bind(
            context,
            SocketType.XPUB,
            Channel.IOPUB,
            connection,
            limits,
            limits.subscriberMessages());
    // Without this only the first of several equal subscriptions would be seen and welcomed.
    socket.setXpubVerbose(true);
    socket.setXpubNoDrop(true);
  }

  /** Leaves a message; waits while too many bytes wait already. */
  void send(List<byte[]> frames) {
    long bytes = frames.stream().mapToLong(frame -> frame.length).sum();
    synchronized (room) {
      try {
        while (waitingBytes > limits.queueBytes()) {
          room.wait();
        }
      } catch (InterruptedException e) {
        // The cell is being stopped: its message still goes out, and it sees the interrupt later.
        Thread.currentThread().interrupt();
      }
      waitingBytes += bytes;
      outbox.put(new Letter(frames, bytes));
    }
  }

  /** Ends the thread after what was left before has been sent. */
  void stop() {
    outbox.put(new Letter(List.of(), 0));
  }

  @Override
  public void run() {
    try (ZMQ.Poller poller = context.createPoller(2)) {
      int subscriptions = poller.register(socket, ZMQ.Poller.POLLIN);
      int mail = poller.register(outbox.arrival(), ZMQ.Poller.POLLIN);
      boolean open = true;
      while (open) {
        poller.poll();
        if (poller.pollin(subscriptions)) {
          welcomeAll();
        }
        open = !poller.pollin(mail) || sendAll();
      }
    } finally {
      socket.close();
      synchronized (room) {
        waitingBytes = Long.MIN_VALUE / 2;
        room.notifyAll();
      }
    }
  }

  private void welcomeAll() {
    for (var event = Sockets.receive(socket, limits);
        !event.isEmpty();
        event = Sockets.receive(socket, limits)) {
      topicOf(event.get(0)).ifPresent(topic -> deliver(welcome.apply(topic)));
    }
  }

  /** The topic of a new subscription; nothing for its end, or for a topic that is no text. */
  private static Optional<String> topicOf(byte[] event) {
    if (event.length == 0 || event[0] != 1 || event.length > LONGEST_TOPIC) {
      return Optional.empty();
    }
    try {
      return Optional.of(
          StandardCharsets.UTF_8
              .newDecoder()
              .decode(ByteBuffer.wrap(event, 1, event.length - 1))
              .toString());
    } catch (CharacterCodingException e) {
      return Optional.empty();
    }
  }

  private boolean sendAll() {
    outbox.acknowledge();
    for (var next = outbox.poll(); next.isPresent(); next = outbox.poll()) {
      Letter letter = next.get();
      if (letter.frames().isEmpty()) {
        return false;
      }
      deliver(letter.frames());
      synchronized (room) {
        waitingBytes -= letter.bytes();
        room.notifyAll();
      }
    }
    return true;
  }

  private void deliver(List<byte[]> frames) {
    long deadline = System.nanoTime() + limits.slowReader().toNanos();
    while (!Sockets.send(socket, frames, ZMQ.DONTWAIT)) {
      if (!patient || System.nanoTime() > deadline) {
        if (patient) {
          log.accept("iopub: a subscriber does not read: it will miss messages");
        }
        patient = false;
        socket.setXpubNoDrop(false);
        Sockets.send(socket, frames, ZMQ.DONTWAIT);
        socket.setXpubNoDrop(true);
        return;
      }
      pause();
    }
    patient = true;
  }

  private static void pause() {
    try {
      Thread.sleep(STEP_MILLIS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
