package pinchoff.kernel.eval;

import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;

/**
 * What the compiled code of cells calls by itself: a check at the start of each method and before
 * each backward jump, and a refusal in place of ending the process. Public because that code lies
 * in another package; cells have no reason to call it.
 */
@SuppressWarnings("DoNotCallSuggester") // cells are compiled into these calls
public final class CellGuard {
  private static final Set<CellScope> STOPPED = ConcurrentHashMap.newKeySet();

  /** Read by every loop of every cell, so as cheap as can be. */
  private static volatile boolean anyStopped;

  private CellGuard() {}

  /** Throws if the cell that this thread works for was asked to stop. */
  public static void check() {
    if (anyStopped && CellScope.current().filter(CellScope::isStopped).isPresent()) {
      throw new CellInterrupted();
    }
  }

  /**
   * Stands for {@link System#exit}.
   *
   * @param status what would have been the exit code
   */
  public static void exit(int status) {
    throw new ExitRefused("System.exit(" + status + ")");
  }

  /**
   * Stands for {@link Runtime#exit}.
   *
   * @param runtime whose method was called
   * @param status what would have been the exit code
   */
  public static void exit(Runtime runtime, int status) {
    throw new ExitRefused("Runtime.exit(" + status + ")");
  }

  /**
   * Stands for {@link Runtime#halt}.
   *
   * @param runtime whose method was called
   * @param status what would have been the exit code
   */
  public static void halt(Runtime runtime, int status) {
    throw new ExitRefused("Runtime.halt(" + status + ")");
  }

  /** From now on, threads of this cell throw at their next check. */
  static void stop(CellScope scope) {
    STOPPED.add(scope);
    anyStopped = true;
  }

  /** Forgets stopped cells that have no thread left. */
  static void forgetFinished() {
    STOPPED.removeIf(scope -> !scope.hasThreads());
    anyStopped = !STOPPED.isEmpty();
  }
}
