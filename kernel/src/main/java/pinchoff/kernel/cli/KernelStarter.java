package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Map;
import pinchoff.kernel.run.KernelLauncher;
import pinchoff.kernel.run.ProcessKernel;
import pinchoff.kernel.run.RunKernel;

/**
 * Starts kernel processes from where this program itself was started.
 *
 * @param premises values for premises
 */
record KernelStarter(Map<String, String> premises) implements KernelLauncher {
  private static final Duration START_LIMIT = Duration.ofSeconds(60);

  KernelStarter {
    premises = Map.copyOf(premises);
  }

  /** A kernel has read its premises when it answers, so the file lives no longer than that. */
  @Override
  public RunKernel launch(Path folder) throws IOException, InterruptedException {
    if (premises.isEmpty()) {
      return ProcessKernel.start(KernelJava.command(), folder, Map.of(), START_LIMIT);
    }
    Path file = PremiseFile.write(premises);
    try {
      Map<String, String> environment = Map.of(PremiseFile.VARIABLE, file.toString());
      return ProcessKernel.start(KernelJava.command(), folder, environment, START_LIMIT);
    } finally {
      Files.deleteIfExists(file);
    }
  }
}
