package pinchoff.kernel.client;

import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.protocol.KernelInfoRequest;
import pinchoff.kernel.session.Front;
import pinchoff.kernel.session.KernelContract;
import pinchoff.kernel.wire.Channel;

/** The contract over loopback ZeroMQ. */
class SocketKernelTest extends KernelContract {

  @Override
  protected Front start(CompletableFuture<CellEvaluator> evaluator) throws Exception {
    return new SocketFront(evaluator::join, LIMITS, Optional.empty());
  }

  @Override
  protected void awaitEnd() throws InterruptedException {
    ((SocketFront) front).server.awaitEnd();
  }

  /** One thread of the kernel reads all channels in turn, one of the client writes them. */
  @Override
  protected void settle() throws InterruptedException {
    for (int i = 0; i < 3; i++) {
      front.ask(Channel.CONTROL, new KernelInfoRequest());
    }
  }
}
