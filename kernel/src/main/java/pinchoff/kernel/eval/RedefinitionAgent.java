package pinchoff.kernel.eval;

import java.lang.instrument.Instrumentation;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Receives from the virtual machine, when the kernel starts from its jar, the means to exchange the
 * code of a loaded class. Without it the evaluator works too, but a changed declaration is then
 * loaded anew each time.
 */
public final class RedefinitionAgent {
  private static volatile @Nullable Instrumentation instrumentation;

  private RedefinitionAgent() {}

  /**
   * Called by the virtual machine before the program's main method.
   *
   * @param arguments not used
   * @param granted the means to exchange classes
   */
  public static void agentmain(@Nullable String arguments, Instrumentation granted) {
    instrumentation = granted;
  }

  static Optional<Instrumentation> instrumentation() {
    return Optional.ofNullable(instrumentation).filter(Instrumentation::isRedefineClassesSupported);
  }
}
