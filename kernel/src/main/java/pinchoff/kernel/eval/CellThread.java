package pinchoff.kernel.eval;

import java.util.concurrent.BlockingQueue;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.jspecify.annotations.Nullable;

/**
 * The thread on which the code of one cell runs, so that its caller can give it up when it cannot
 * be stopped.
 */
final class CellThread implements AutoCloseable {
  /** Room for deep recursion; memory is taken only as it is used. */
  private static final long STACK_BYTES = 64L << 20;

  private final BlockingQueue<Runnable> tasks = new LinkedBlockingQueue<>();
  private final CellScope scope;
  private final Thread thread;
  private volatile CompletableFuture<?> running = CompletableFuture.completedFuture(null);
  private volatile boolean closed;

  CellThread(CellScope scope, ClassLoader context) {
    this.scope = scope;
    this.thread = new Thread(scope.group(), this::work, scope.text().label(), STACK_BYTES);
    thread.setDaemon(true);
    thread.setContextClassLoader(context);
    thread.start();
  }

  /** Thrown to the caller when the thread could not be stopped and was given up. */
  static final class LeftBehind extends RuntimeException {
    private static final long serialVersionUID = 1L;

    LeftBehind(String message) {
      super(message);
    }
  }

  /**
   * Runs a task on the thread and waits for it.
   *
   * @throws Throwable what the task threw
   */
  <T extends @Nullable Object> T call(Callable<T> task) throws Throwable {
    CompletableFuture<T> result = new CompletableFuture<>();
    running = result;
    tasks.add(
        () -> {
          try {
            result.complete(task.call());
          } catch (Throwable t) {
            result.completeExceptionally(t);
          }
        });
    while (true) {
      try {
        return result.get();
      } catch (ExecutionException e) {
        throw e.getCause() == null ? e : e.getCause();
      } catch (InterruptedException e) {
        // The session's own thread: only the cell's end frees it.
      }
    }
  }

  /** Waits until nothing runs on the thread, at most so long. */
  boolean awaitIdle(long millis) {
    try {
      running.get(millis, TimeUnit.MILLISECONDS);
      return true;
    } catch (ExecutionException e) {
      return true;
    } catch (TimeoutException e) {
      return false;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return running.isDone();
    }
  }

  /** Gives the thread up: its caller goes on, it itself goes on for as long as it likes. */
  void leaveBehind(String reason) {
    closed = true;
    running.completeExceptionally(new LeftBehind(reason));
  }

  CellScope scope() {
    return scope;
  }

  Thread thread() {
    return thread;
  }

  @Override
  public void close() {
    closed = true;
    tasks.add(() -> {});
  }

  private void work() {
    scope.enter();
    while (!closed || !tasks.isEmpty()) {
      try {
        tasks.take().run();
      } catch (InterruptedException e) {
        // A late interrupt between two tasks: the flag of the scope says what to do.
      }
    }
  }
}
