package pinchoff.kernel.session;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import pinchoff.kernel.eval.CellEvaluator;

/** The contract without sockets. */
class MemoryKernelTest extends KernelContract {

  @Override
  protected Front start(CompletableFuture<CellEvaluator> evaluator) {
    return new MemoryFront(evaluator, LIMITS);
  }

  @Override
  protected void awaitEnd() throws InterruptedException {
    assertTrue(((MemoryFront) front).ended.await(30, TimeUnit.SECONDS));
  }
}
