package pinchoff.kernel.eval;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.util.Locale;

/**
 * Stops a cell by ever stronger means: its code throws at the next check, its threads are
 * interrupted again and again, on JDK 17 its thread is stopped by force, and at last it is left
 * behind so that the session can go on.
 */
final class StopLadder {
  private static final int INTERRUPTS = 4;
  private static final int INTERRUPT_WAIT_MILLIS = 150;
  private static final int FORCED_STOPS = 8;
  private static final int FORCED_STOP_WAIT_MILLIS = 50;

  private StopLadder() {}

  /** Begins to stop the cell and returns at once. */
  static void begin(CellThread thread) {
    CellScope scope = thread.scope();
    scope.stop();
    Thread ladder = new Thread(() -> climb(scope, thread), "stop " + scope.text().label());
    ladder.setDaemon(true);
    ladder.start();
  }

  private static void climb(CellScope scope, CellThread thread) {
    for (int i = 0; i < INTERRUPTS; i++) {
      scope.group().interrupt();
      if (thread.awaitIdle(INTERRUPT_WAIT_MILLIS)) {
        return;
      }
    }
    if (Runtime.version().feature() < 20) {
      for (int i = 0; i < FORCED_STOPS; i++) {
        if (isInCellCode(thread.thread())) {
          force(thread.thread());
        }
        if (thread.awaitIdle(FORCED_STOP_WAIT_MILLIS)) {
          return;
        }
      }
    }
    thread.leaveBehind(whereItHangs(thread.thread()));
  }

  /**
   * Whether the innermost frames are those of the cell and of libraries that it calls. A thread in
   * the kernel's own code may hold the kernel's locks, and one in a class initialiser would leave a
   * broken class behind.
   */
  private static boolean isInCellCode(Thread thread) {
    for (StackTraceElement frame : thread.getStackTrace()) {
      String type = frame.getClassName();
      if (type.startsWith("pinchoff.kernel.")
          || type.startsWith("java.lang.ClassLoader")
          || frame.getMethodName().equals("<clinit>")) {
        return false;
      }
      if (FrameMap.isOfCell(type)) {
        return true;
      }
    }
    return false;
  }

  private static void force(Thread thread) {
    try {
      Method stop = Thread.class.getMethod("stop");
      stop.invoke(thread);
    } catch (NoSuchMethodException | IllegalAccessException | InvocationTargetException e) {
      // The method is gone or refuses: the next rung leaves the thread behind.
      return;
    }
  }

  private static String whereItHangs(Thread thread) {
    StackTraceElement[] trace = thread.getStackTrace();
    String where =
        trace.length == 0 ? "" : " in " + trace[0].getClassName() + "." + trace[0].getMethodName();
    return String.format(
        Locale.ROOT,
        "The cell was interrupted, but its thread hangs%s and cannot be stopped. It was left behind"
            + " and may go on in the background; the session's variables are intact.",
        where);
  }
}
