package pinchoff.kernel.transport;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import org.zeromq.ZMQException;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionException;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.CurveKeys;

/** Makes, binds and reads sockets. */
final class Sockets {
  private static final int RETRY_MILLIS = 100;

  private Sockets() {}

  /**
   * A socket of the kernel, bound to its channel's address.
   *
   * @param messagesKept how many messages wait for, and from, each peer at most
   * @throws ConnectionException if the address cannot be had, with the reason
   */
  static ZMQ.Socket bind(
      ZContext context,
      SocketType type,
      Channel channel,
      ConnectionInfo connection,
      Limits limits,
      int messagesKept) {
    ZMQ.Socket socket = context.createSocket(type);
    // Options of this kind only hold for addresses that are bound afterwards.
    socket.setHWM(messagesKept);
    socket.setLinger((int) limits.shutdown().toMillis());
    socket.setMaxMsgSize(limits.frameBytes());
    connection.curve().ifPresent(keys -> encrypt(socket, keys));
    long deadline = System.nanoTime() + limits.bindRetry().toNanos();
    String address = connection.endpoint(channel);
    while (true) {
      try {
        if (socket.bind(address)) {
          return socket;
        }
      } catch (ZMQException e) {
        if (e.getErrorCode() != ZMQ.Error.EADDRINUSE.getCode()) {
          throw new ConnectionException(
              channel.label() + ": cannot listen on " + address + ": " + e.getMessage());
        }
      }
      if (System.nanoTime() > deadline) {
        throw new ConnectionException(
            channel.label() + ": cannot listen on " + address + ": the address is in use");
      }
      pause();
    }
  }

  private static void pause() {
    try {
      Thread.sleep(RETRY_MILLIS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new ConnectionException("interrupted while waiting for an address");
    }
  }

  private static void encrypt(ZMQ.Socket socket, CurveKeys keys) {
    socket.setCurveServer(true);
    socket.setCurvePublicKey(ZMQ.Curve.z85Decode(keys.publicKey()));
    socket.setCurveSecretKey(ZMQ.Curve.z85Decode(keys.secretKey()));
  }

  /** The frames of the next message, or an empty list if none has come. */
  static List<byte[]> receive(ZMQ.Socket socket, Limits limits) {
    byte @Nullable [] first = socket.recv(ZMQ.DONTWAIT);
    if (first == null) {
      return List.of();
    }
    List<byte[]> frames = new ArrayList<>();
    frames.add(first);
    while (socket.hasReceiveMore()) {
      byte @Nullable [] next = socket.recv();
      // One more than allowed shows that there were too many; the rest is not worth its memory.
      if (next != null && frames.size() <= limits.frames()) {
        frames.add(next);
      }
    }
    return frames;
  }

  /** Sends the frames of one message; false if there is nobody to send it to, or no room. */
  static boolean send(ZMQ.Socket socket, List<byte[]> frames, int flags) {
    try {
      for (int i = 0; i < frames.size(); i++) {
        if (!socket.send(frames.get(i), flags | (i + 1 < frames.size() ? ZMQ.SNDMORE : 0))) {
          return false;
        }
      }
      return true;
    } catch (ZMQException e) {
      if (e.getErrorCode() == ZMQ.Error.EHOSTUNREACH.getCode()) {
        return false;
      }
      throw e;
    }
  }
}
