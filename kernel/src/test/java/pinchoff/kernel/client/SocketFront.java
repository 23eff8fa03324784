package pinchoff.kernel.client;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.IopubWelcome;
import pinchoff.kernel.session.Front;
import pinchoff.kernel.transport.KernelServer;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.ConnectionInfo;
import pinchoff.kernel.wire.CurveKeys;
import pinchoff.kernel.wire.Message;

/** A front end that speaks over loopback ZeroMQ with a server in the same process. */
public final class SocketFront extends Front {
  private final List<String> log = Collections.synchronizedList(new ArrayList<>());
  private final ClientSockets sockets;

  /** Where the kernel listens. */
  public final ConnectionInfo connection;

  /** The kernel. */
  public final KernelServer server;

  /** Starts a kernel on free ports and waits until its broadcasts arrive. */
  public SocketFront(Supplier<CellEvaluator> evaluator, Limits limits, Optional<CurveKeys> curve)
      throws IOException, InterruptedException {
    ConnectionInfo free = NewConnection.onThisMachine();
    connection = new ConnectionInfo(free.ip(), free.ports(), free.scheme(), free.key(), curve);
    server = new KernelServer(connection, limits, evaluator, log::add);
    sockets = new ClientSockets(connection, messages.session(), Limits.standard(), this::add);
    sockets.start();
    await("a welcome", r -> r.content() instanceof IopubWelcome);
  }

  /** A second front end of the same kernel. */
  public <T> T withClient(Function<KernelClient, T> work) {
    try (KernelClient client = KernelClient.connect(connection)) {
      return work.apply(client);
    }
  }

  @Override
  public void send(Channel channel, Message message) {
    sockets.send(channel, message);
  }

  @Override
  public List<String> log() {
    return List.copyOf(log);
  }

  @Override
  public void close() {
    sockets.close();
    server.close();
  }
}
