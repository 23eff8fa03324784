package pinchoff.kernel.eval;

import java.util.Optional;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.ForkJoinWorkerThread;
import java.util.concurrent.TimeUnit;
import org.jspecify.annotations.Nullable;

/**
 * One run of a cell and the threads that work for it. Threads that its code starts belong to it,
 * also after the cell has ended.
 */
final class CellScope {
  private static final InheritableThreadLocal<@Nullable CellScope> OF_THREAD =
      new InheritableThreadLocal<>();
  private static final long SETTLE_MILLIS = 500;
  private static volatile @Nullable CellScope latest;

  private final CellText text;
  private final CellOutput output;
  private final Group group;
  private volatile boolean stopped;

  CellScope(CellText text, CellOutput output, UncaughtReport uncaught) {
    this.text = text;
    this.output = output;
    this.group = new Group(this, uncaught);
  }

  /** What becomes of an exception that ends a thread which a cell started. */
  interface UncaughtReport {
    void report(CellScope scope, Thread thread, Throwable thrown);
  }

  /**
   * The cell that the current thread works for. Workers of the common pool belong to nobody in
   * particular; they count as working for the latest cell.
   */
  static Optional<CellScope> current() {
    Thread thread = Thread.currentThread();
    if (thread instanceof ForkJoinWorkerThread w && w.getPool() == ForkJoinPool.commonPool()) {
      return Optional.ofNullable(latest);
    }
    CellScope inherited = OF_THREAD.get();
    if (inherited != null) {
      return Optional.of(inherited);
    }
    for (ThreadGroup g = thread.getThreadGroup(); g != null; g = g.getParent()) {
      if (g instanceof Group cell) {
        return Optional.of(cell.scope);
      }
    }
    return Optional.empty();
  }

  /** The cell that ran last, or runs. */
  static Optional<CellScope> latest() {
    return Optional.ofNullable(latest);
  }

  /** Makes this the latest cell. */
  void begin() {
    latest = this;
  }

  /** Makes the current thread and all that it will start part of this cell. */
  void enter() {
    OF_THREAD.set(this);
  }

  CellText text() {
    return text;
  }

  CellOutput output() {
    return output;
  }

  ThreadGroup group() {
    return group;
  }

  boolean isStopped() {
    return stopped;
  }

  void stop() {
    stopped = true;
    CellGuard.stop(this);
  }

  /**
   * After a stop, takes what the cell left in the common pool out of it: workers count as working
   * for the latest cell, so a piece of a parallel stream that began later would never end.
   */
  void settle() {
    ForkJoinPool pool = ForkJoinPool.commonPool();
    if (!stopped || pool.isQuiescent()) {
      return;
    }
    Thread sweeper =
        new Thread(
            group,
            () -> {
              enter();
              pool.awaitQuiescence(SETTLE_MILLIS, TimeUnit.MILLISECONDS);
            },
            "end of " + text.label());
    sweeper.setDaemon(true);
    sweeper.start();
    try {
      sweeper.join(2 * SETTLE_MILLIS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  boolean hasThreads() {
    return group.activeCount() > 0;
  }

  /** Threads in the order in which the cell started them. */
  private static final class Group extends ThreadGroup {
    private final CellScope scope;
    private final UncaughtReport uncaught;

    Group(CellScope scope, UncaughtReport uncaught) {
      super(root(), scope.text.label());
      this.scope = scope;
      this.uncaught = uncaught;
    }

    /** A cell's group must not lie inside the group of whatever thread runs the session. */
    private static ThreadGroup root() {
      ThreadGroup group = Thread.currentThread().getThreadGroup();
      while (group.getParent() != null) {
        group = group.getParent();
      }
      return group;
    }

    @Override
    public void uncaughtException(Thread thread, Throwable thrown) {
      if (Thread.getDefaultUncaughtExceptionHandler() != null) {
        super.uncaughtException(thread, thrown);
      } else if (!(thrown instanceof CellInterrupted) && !(thrown instanceof ThreadDeath)) {
        uncaught.report(scope, thread, thrown);
      }
    }
  }
}
