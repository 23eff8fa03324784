package pinchoff.kernel.session;

import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import pinchoff.kernel.eval.CellEvaluator;

/** The evaluator, which starts in the background: who needs it waits here until it is there. */
final class EvaluatorGate {
  private final CompletableFuture<CellEvaluator> evaluator;
  private volatile CompletableFuture<Object> interrupted = new CompletableFuture<>();

  /** The evaluator is not to be had; the message says why. */
  static final class NotReadyException extends RuntimeException {
    NotReadyException(String reason) {
      super(reason);
    }
  }

  EvaluatorGate(CompletableFuture<CellEvaluator> evaluator) {
    this.evaluator = evaluator;
  }

  /**
   * Waits for the evaluator.
   *
   * @throws NotReadyException if it could not be started, or if the wait was interrupted
   */
  CellEvaluator await() {
    CompletableFuture<Object> stop = new CompletableFuture<>();
    interrupted = stop;
    try {
      if (CompletableFuture.anyOf(evaluator, stop).join() instanceof CellEvaluator ready) {
        return ready;
      }
      throw new NotReadyException("interrupted before Java cells could be run");
    } catch (CompletionException e) {
      throw new NotReadyException(
          "Java cells cannot be run: " + Optional.ofNullable(e.getCause()).orElse(e));
    }
  }

  /** Interrupts the running cell, or the wait for the evaluator. */
  void interrupt() {
    if (!evaluator.isDone()) {
      interrupted.complete("interrupted");
    } else if (!evaluator.isCompletedExceptionally()) {
      evaluator.join().interrupt();
    }
  }
}
