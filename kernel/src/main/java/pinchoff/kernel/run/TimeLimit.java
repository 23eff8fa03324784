package pinchoff.kernel.run;

import java.time.Duration;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;

/**
 * Watches one cell: interrupts it when its time is over, and kills the kernel if that is no use.
 */
final class TimeLimit implements AutoCloseable {
  private final ScheduledExecutorService clock =
      Executors.newSingleThreadScheduledExecutor(
          work -> {
            Thread thread = new Thread(work, "pinchoff-time-limit");
            thread.setDaemon(true);
            return thread;
          });
  private volatile boolean expired;

  private TimeLimit() {}

  /** Starts to watch, if there is a limit. */
  static TimeLimit watch(RunKernel kernel, RunOptions options) {
    TimeLimit watch = new TimeLimit();
    options.cellLimit().ifPresent(limit -> watch.start(kernel, limit, options.grace()));
    return watch;
  }

  /** Whether the cell was interrupted because its time was over. */
  boolean expired() {
    return expired;
  }

  private void start(RunKernel kernel, Duration limit, Duration grace) {
    after(
        limit,
        () -> {
          expired = true;
          kernel.interrupt();
        });
    after(limit.plus(grace), kernel::kill);
  }

  @SuppressWarnings("FutureReturnValueIgnored") // neither step can fail
  private void after(Duration delay, Runnable step) {
    clock.schedule(step, delay.toNanos(), TimeUnit.NANOSECONDS);
  }

  @Override
  public void close() {
    clock.shutdownNow();
  }
}
