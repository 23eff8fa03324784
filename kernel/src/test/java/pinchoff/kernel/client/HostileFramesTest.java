package pinchoff.kernel.client;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.zeromq.SocketType;
import org.zeromq.ZContext;
import org.zeromq.ZMQ;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.session.FakeEvaluator;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.Message;
import pinchoff.kernel.wire.Signer;
import pinchoff.kernel.wire.WireFormat;

/**
 * Frames that no honest client sends, on every socket: nothing is run, and the kernel goes on. More
 * of them with {@code -Dpinchoff.frames=200000}, others with {@code -Dpinchoff.seed=…}.
 */
class HostileFramesTest {
  private static final int FRAMES = Integer.getInteger("pinchoff.frames", 4000);
  private static final long SEED = Long.getLong("pinchoff.seed", 20_260_101L);
  private static final byte[] DELIMITER = "<IDS|MSG>".getBytes(StandardCharsets.US_ASCII);
  private static final long FLAT = 64L << 20;

  private final SplittableRandom random = new SplittableRandom(SEED);

  @Test
  void theKernelGoesOn() throws Exception {
    FakeEvaluator evaluator = new FakeEvaluator();
    try (SocketFront front = new SocketFront(() -> evaluator, Limits.standard(), Optional.empty());
        ZContext context = new ZContext()) {
      front.run("value before");
      Signer signer = front.connection.signer();
      byte[][] honest = honest(front, signer);
      List<ZMQ.Socket> sockets = new ArrayList<>();
      for (Channel channel : List.of(Channel.SHELL, Channel.CONTROL, Channel.STDIN)) {
        sockets.add(connect(context, SocketType.DEALER, front, channel));
      }
      sockets.add(connect(context, SocketType.DEALER, front, Channel.HEARTBEAT));
      sockets.add(connect(context, SocketType.XSUB, front, Channel.IOPUB));
      long before = used();
      for (int i = 0; i < FRAMES; i++) {
        List<byte[]> frames = hostile(signer, honest);
        ZMQ.Socket socket = sockets.get(random.nextInt(sockets.size()));
        for (int k = 0; k < frames.size(); k++) {
          socket.send(frames.get(k), k + 1 < frames.size() ? ZMQ.SNDMORE : 0);
        }
        if (i % 500 == 499) {
          for (ZMQ.Socket each : sockets) {
            drain(each);
          }
          front.ask(Channel.CONTROL, new pinchoff.kernel.protocol.KernelInfoRequest());
        }
      }
      assertEquals(List.of("value before"), evaluator.ran, "something was run");
      assertEquals("ok", front.run("value after").reply().toJson().get("status"));
      front.withClient(
          client -> {
            try {
              return client.kernelInfo(Duration.ofSeconds(20));
            } catch (InterruptedException e) {
              throw new IllegalStateException(e);
            }
          });
      long grown = used() - before;
      assertTrue(grown < FLAT, () -> "memory grew by " + grown / 1024 + " KiB");
    }
  }

  /** Answers to what was signed. */
  private static void drain(ZMQ.Socket socket) {
    byte[] answer = socket.recv(ZMQ.DONTWAIT);
    while (answer != null) {
      answer = socket.recv(ZMQ.DONTWAIT);
    }
  }

  private static ZMQ.Socket connect(
      ZContext context, SocketType type, SocketFront front, Channel channel) {
    ZMQ.Socket socket = context.createSocket(type);
    socket.setSendTimeOut(5000);
    socket.setLinger(0);
    socket.connect(front.connection.endpoint(channel));
    return socket;
  }

  /** A request that would run something, with its true signature: to be damaged or sent twice. */
  private static byte[][] honest(SocketFront front, Signer signer) {
    Message request = front.messages().request(ExecuteRequest.of("value stolen"));
    return new WireFormat(signer, Limits.standard()).encode(request).toArray(new byte[0][]);
  }

  private List<byte[]> hostile(Signer signer, byte[][] honest) {
    return switch (random.nextInt(9)) {
      case 0 -> frames(random.nextInt(1, 12)); // noise
      case 1 -> with(DELIMITER, frames(random.nextInt(0, 7)));
      case 2 -> unsigned(honest);
      case 3 -> damaged(honest);
      case 4 -> truncated(honest);
      case 5 -> signed(signer, noise(), noise(), noise(), noise());
      case 6 -> signed(signer, json("{".repeat(200)), json("{}"), json("{}"), json("{}"));
      case 7 ->
          signed(
              signer,
              header("execute_request"),
              json("{}"),
              json("{}"),
              json(
                  random.nextBoolean()
                      ? "{\"code\": 7, \"silent\": \"yes\"}"
                      : "{\"code\": " + "[".repeat(150) + "]".repeat(150) + "}"));
      default -> signed(signer, header(word()), json("{}"), json("[]"), json("{\"x\": 1}"));
    };
  }

  private byte[] header(String type) {
    return json(
        "{\"msg_id\": \"%d\", \"session\": \"s\", \"username\": \"u\", \"date\": \"d\", \"msg_type\": \"%s\", \"version\": \"5.5\"}"
            .formatted(random.nextLong(), type));
  }

  private String word() {
    return List.of("execute_reply", "nonsense", "status", "input_reply", "comm_msg", "")
        .get(random.nextInt(6));
  }

  private static byte[] json(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  private static List<byte[]> signed(Signer signer, byte[]... parts) {
    List<byte[]> all = new ArrayList<>(List.of(DELIMITER, signer.sign(List.of(parts))));
    all.addAll(List.of(parts));
    return all;
  }

  private static List<byte[]> unsigned(byte[][] honest) {
    List<byte[]> frames = new ArrayList<>(List.of(honest));
    frames.set(1, new byte[0]);
    return frames;
  }

  private List<byte[]> damaged(byte[][] honest) {
    List<byte[]> frames = new ArrayList<>(List.of(honest));
    int frame = random.nextInt(1, frames.size());
    byte[] copy = frames.get(frame).clone();
    copy[random.nextInt(copy.length)] ^= (byte) random.nextInt(1, 256);
    frames.set(frame, copy);
    return frames;
  }

  private List<byte[]> truncated(byte[][] honest) {
    return new ArrayList<>(List.of(honest).subList(0, random.nextInt(1, honest.length)));
  }

  private static List<byte[]> with(byte[] first, List<byte[]> rest) {
    List<byte[]> all = new ArrayList<>(List.of(first));
    all.addAll(rest);
    return all;
  }

  private List<byte[]> frames(int count) {
    List<byte[]> frames = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      frames.add(noise());
    }
    return frames;
  }

  private byte[] noise() {
    byte[] bytes = new byte[random.nextInt(random.nextInt(10) == 0 ? 5000 : 60)];
    for (int i = 0; i < bytes.length; i++) {
      bytes[i] = (byte) random.nextInt();
    }
    return bytes;
  }

  private static long used() {
    for (int i = 0; i < 3; i++) {
      System.gc();
    }
    Runtime runtime = Runtime.getRuntime();
    return runtime.totalMemory() - runtime.freeMemory();
  }

  /** Frames that reach the reader itself, without a socket between. */
  @Test
  void theReaderNeverThrowsAnythingElse() throws Exception {
    Signer signer = NewConnection.onThisMachine().signer();
    WireFormat format = new WireFormat(signer, Limits.standard());
    byte[][] honest =
        new WireFormat(signer, Limits.standard())
            .encode(
                new pinchoff.kernel.protocol.MessageFactory(
                        pinchoff.kernel.protocol.IdSource.random(),
                        java.time.Clock.systemUTC(),
                        "test")
                    .request(ExecuteRequest.of("1")))
            .toArray(new byte[0][]);
    int refused = 0;
    for (int i = 0; i < 50_000; i++) {
      try {
        format.decode(hostile(signer, honest));
      } catch (pinchoff.kernel.wire.WireException e) {
        refused++;
        assertTrue(e.getMessage().length() < 1000);
      }
    }
    assertTrue(refused > 30_000, "only " + refused + " were refused");
  }
}
