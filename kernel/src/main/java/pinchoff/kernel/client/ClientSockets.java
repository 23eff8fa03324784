package pinchoff.kernel.client;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import pinchoff.kernel.json.JsonException;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ContentReader;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.CurveKeys;
import pinchoff.kernel.wire.Mailbox;
import pinchoff.kernel.wire.Message;
import pinchoff.kernel.wire.WireException;
import pinchoff.kernel.wire.WireFormat;

/** The sockets of a client and the one thread that owns them. */
final class ClientSockets implements AutoCloseable {
  private static final int LINGER_MILLIS = 300;
  private static final List<Channel> CHANNELS =
      List.of(Channel.SHELL, Channel.CONTROL, Channel.STDIN, Channel.IOPUB);

  private final ConnectionInfo connection;
  private final String session;
  private final Limits limits;
  private final Receiver receiver;
  private final WireFormat wire;
  private final Mailbox<Letter> outbox = new Mailbox<>();
  private final Thread thread = new Thread(this::run, "pinchoff-client");

  /** Takes what was received; called on the thread of the sockets, so it returns at once. */
  interface Receiver {
    void received(Channel channel, Message message, Content content);
  }

  /** A message to send; no frames: the end. */
  private record Letter(Channel channel, List<byte[]> frames) {}

  ClientSockets(ConnectionInfo connection, String session, Limits limits, Receiver receiver) {
    this.connection = connection;
    this.session = session;
    this.limits = limits;
    this.receiver = receiver;
    this.wire = new WireFormat(connection.signer(), limits);
    thread.setDaemon(true);
  }

  void start() {
    thread.start();
  }

  void send(Channel channel, Message message) {
    outbox.put(new Letter(channel, wire.encode(message)));
  }

  @Override
  public void close() {
    outbox.put(new Letter(Channel.SHELL, List.of()));
    boolean interrupted = false;
    while (thread.isAlive()) {
      try {
        thread.join();
      } catch (InterruptedException e) {
        interrupted = true;
      }
    }
    if (interrupted) {
      Thread.currentThread().interrupt();
    }
  }

  private void run() {
    try (ZContext context = new ZContext();
        ZMQ.Poller poller = context.createPoller(CHANNELS.size() + 1)) {
      context.setLinger(LINGER_MILLIS);
      List<ZMQ.Socket> sockets = new ArrayList<>();
      for (Channel channel : CHANNELS) {
        ZMQ.Socket socket = connect(context, channel);
        sockets.add(socket);
        poller.register(socket, ZMQ.Poller.POLLIN);
      }
      int mail = poller.register(outbox.arrival(), ZMQ.Poller.POLLIN);
      boolean open = true;
      while (open) {
        poller.poll();
        for (int i = 0; i < sockets.size(); i++) {
          if (poller.pollin(i)) {
            receiveAll(CHANNELS.get(i), sockets.get(i));
          }
        }
        open = !poller.pollin(mail) || sendAll(sockets);
      }
    } finally {
      outbox.close();
    }
  }

  private ZMQ.Socket connect(ZContext context, Channel channel) {
    ZMQ.Socket socket =
        context.createSocket(channel == Channel.IOPUB ? SocketType.SUB : SocketType.DEALER);
    socket.setLinger(LINGER_MILLIS);
    socket.setHWM(0);
    socket.setMaxMsgSize(limits.frameBytes());
    connection.curve().ifPresent(keys -> encrypt(socket, keys));
    if (channel == Channel.IOPUB) {
      socket.subscribe(ZMQ.SUBSCRIPTION_ALL);
    } else {
      socket.setIdentity(session.getBytes(StandardCharsets.UTF_8));
    }
    socket.connect(connection.endpoint(channel));
    return socket;
  }

  /** The connection file holds one pair of keys, which serves both ends. */
  private static void encrypt(ZMQ.Socket socket, CurveKeys keys) {
    socket.setCurveServerKey(ZMQ.Curve.z85Decode(keys.publicKey()));
    socket.setCurvePublicKey(ZMQ.Curve.z85Decode(keys.publicKey()));
    socket.setCurveSecretKey(ZMQ.Curve.z85Decode(keys.secretKey()));
  }

  private void receiveAll(Channel channel, ZMQ.Socket socket) {
    byte[] first = socket.recv(ZMQ.DONTWAIT);
    while (first != null) {
      List<byte[]> frames = new ArrayList<>();
      frames.add(first);
      while (socket.hasReceiveMore()) {
        frames.add(socket.recv());
      }
      accept(channel, frames);
      first = socket.recv(ZMQ.DONTWAIT);
    }
  }

  /** What is not signed by the kernel, or makes no sense, is none of its words. */
  private void accept(Channel channel, List<byte[]> frames) {
    try {
      Message message = wire.decode(frames);
      receiver.received(channel, message, ContentReader.read(message));
    } catch (WireException | JsonException e) {
      return;
    }
  }

  private boolean sendAll(List<ZMQ.Socket> sockets) {
    outbox.acknowledge();
    for (var letter = outbox.poll(); letter.isPresent(); letter = outbox.poll()) {
      List<byte[]> frames = letter.get().frames();
      if (frames.isEmpty()) {
        return false;
      }
      ZMQ.Socket socket = sockets.get(CHANNELS.indexOf(letter.get().channel()));
      for (int i = 0; i < frames.size(); i++) {
        socket.send(frames.get(i), i + 1 < frames.size() ? ZMQ.SNDMORE : 0);
      }
    }
    return true;
  }
}
