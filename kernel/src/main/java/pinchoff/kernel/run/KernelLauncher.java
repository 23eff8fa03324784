package pinchoff.kernel.run;

import java.io.IOException;
import java.nio.file.Path;

/** Starts fresh kernels. */
@FunctionalInterface
public interface KernelLauncher {

  /**
   * Starts a kernel and waits until it answers.
   *
   * @param folder its working directory
   * @throws IOException if it cannot be started
   */
  RunKernel launch(Path folder) throws IOException, InterruptedException;
}
