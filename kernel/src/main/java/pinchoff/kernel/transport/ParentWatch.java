package pinchoff.kernel.transport;

import java.util.Optional;

/** Ends the kernel when the process that launched it is gone. */
final class ParentWatch implements Runnable {
  private static final int PERIOD_MILLIS = 500;

  private final ProcessHandle parent;
  private final Runnable onGone;

  private ParentWatch(ProcessHandle parent, Runnable onGone) {
    this.parent = parent;
    this.onGone = onGone;
  }

  /**
   * A watch on a launcher.
   *
   * @param processId what the launcher's variable says; anything but the number of a running
   *     process means that there is nothing to watch
   */
  static Optional<ParentWatch> on(String processId, Runnable onGone) {
    try {
      return ProcessHandle.of(Long.parseLong(processId.strip()))
          .filter(ProcessHandle::isAlive)
          .map(parent -> new ParentWatch(parent, onGone));
    } catch (NumberFormatException e) {
      return Optional.empty();
    }
  }

  @Override
  public void run() {
    try {
      while (parent.isAlive()) {
        Thread.sleep(PERIOD_MILLIS);
      }
      onGone.run();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
