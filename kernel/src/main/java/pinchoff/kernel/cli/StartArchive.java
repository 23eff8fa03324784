package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.client.KernelProcess;
import pinchoff.kernel.client.KernelTimeoutException;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.protocol.CompleteRequest;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.InspectRequest;
import pinchoff.kernel.wire.Channel;

/**
 * Writes the archive of loaded classes that lets a registered kernel start in half the time. It is
 * recorded from a real kernel, which does what users do first and then ends.
 */
final class StartArchive {
  private static final Duration ANSWER = Duration.ofSeconds(60);
  private static final Duration WORD = Duration.ofSeconds(5);
  private static final Duration END = Duration.ofSeconds(90);

  private final Kernelspec spec;

  StartArchive(Kernelspec spec) {
    this.spec = spec;
  }

  /**
   * Writes the archive under another name first: a kernel that starts meanwhile sees none.
   *
   * @return why there is none, or empty if all went well
   */
  Optional<String> write() throws InterruptedException {
    Path archive = spec.archive();
    Path recorded = archive.resolveSibling(".recorded-" + UUID.randomUUID() + ".jsa");
    try {
      try {
        rehearse(recorded);
        if (!Files.isRegularFile(recorded)) {
          return Optional.of("this Java wrote none");
        }
        Files.move(recorded, archive, StandardCopyOption.ATOMIC_MOVE);
        return Optional.empty();
      } finally {
        Files.deleteIfExists(recorded);
      }
    } catch (IOException | KernelGoneException | KernelTimeoutException e) {
      return Optional.of(String.valueOf(e.getMessage()));
    }
  }

  private void rehearse(Path recorded) throws IOException, InterruptedException {
    try (KernelProcess kernel =
        KernelProcess.start(
            KernelJava.rehearsal(spec.jar(), recorded), spec.folder(), Map.of(), ANSWER)) {
      for (String cell : Rehearsal.cells()) {
        kernel.client().execute(ExecuteRequest.of(cell), OutputListener.NONE);
      }
      kernel.client().request(Channel.SHELL, new CompleteRequest("Math.ma", 7), ANSWER);
      kernel.client().request(Channel.SHELL, new InspectRequest("Math.max", 8, 0), ANSWER);
      kernel.client().shutdown(false, WORD);
      awaitEnd(kernel);
    }
  }

  /** The archive is written while the process ends. */
  private static void awaitEnd(KernelProcess kernel) throws InterruptedException {
    long deadline = System.nanoTime() + END.toNanos();
    while (kernel.isAlive() && System.nanoTime() < deadline) {
      Thread.sleep(50);
    }
  }
}
