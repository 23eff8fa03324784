package pinchoff.kernel.client;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import pinchoff.kernel.protocol.KernelInfoReply;
import pinchoff.kernel.wire.ConnectionInfo;

/** A kernel process that was started here, and a client connected to it. */
public final class KernelProcess implements AutoCloseable {
  /** Stands for the path of the connection file in a command. */
  public static final String CONNECTION_FILE = "{connection_file}";

  private static final Duration GRACE = Duration.ofMillis(2500);

  private final Process process;
  private final Path connectionFile;
  private final LastLines log;
  private final KernelClient client;

  private KernelProcess(Process process, Path connectionFile, LastLines log, KernelClient client) {
    this.process = process;
    this.connectionFile = connectionFile;
    this.log = log;
    this.client = client;
  }

  /**
   * Starts a kernel and waits until it answers.
   *
   * @param command program and arguments; {@link #CONNECTION_FILE} in any of them is replaced by
   *     the path of a connection file that only this user can read
   * @param workingDirectory where it runs
   * @param environment variables added to those of this process
   * @param limit how long it may take to answer
   * @param onLine receives each line that the kernel's process itself prints, on a thread of its
   *     own
   * @throws IOException if the process cannot be started
   * @throws KernelGoneException if it ends before it answers, with its last lines
   * @throws KernelTimeoutException if it does not answer in time; it is killed then
   */
  public static KernelProcess start(
      List<String> command,
      Path workingDirectory,
      Map<String, String> environment,
      Duration limit,
      Consumer<String> onLine)
      throws IOException, InterruptedException {
    ConnectionInfo connection = NewConnection.onThisMachine();
    Path file = NewConnection.write(connection);
    Process process;
    try {
      process = launch(command, file, workingDirectory, environment);
    } catch (IOException e) {
      delete(file);
      throw e;
    }
    LastLines log = new LastLines(process.getInputStream(), onLine);
    KernelProcess kernel = new KernelProcess(process, file, log, KernelClient.connect(connection));
    kernel.watch();
    boolean answered = false;
    try {
      kernel.client.kernelInfo(limit);
      answered = true;
      return kernel;
    } finally {
      if (!answered) {
        kernel.kill();
        kernel.close();
      }
    }
  }

  /** Starts a kernel whose own printed lines go nowhere. */
  public static KernelProcess start(
      List<String> command, Path workingDirectory, Map<String, String> environment, Duration limit)
      throws IOException, InterruptedException {
    return start(command, workingDirectory, environment, limit, line -> {});
  }

  /** The client connected to it. */
  public KernelClient client() {
    return client;
  }

  /** What the kernel says it is. */
  public KernelInfoReply info(Duration limit) throws InterruptedException {
    return client.kernelInfo(limit);
  }

  /** Whether the process still runs. */
  public boolean isAlive() {
    return process.isAlive();
  }

  /** The exit code, once the process has ended. */
  public OptionalInt exitCode() {
    return process.isAlive() ? OptionalInt.empty() : OptionalInt.of(process.exitValue());
  }

  /** The last lines that the process itself printed. */
  public List<String> lastLines() {
    return log.lines();
  }

  /** Ends the process at once. */
  public void kill() {
    process.destroyForcibly();
  }

  /** Shuts the kernel down, kills it if it stays, and removes its connection file. */
  @Override
  public void close() {
    boolean interrupted = false;
    try {
      if (process.isAlive()) {
        client.shutdown(false, GRACE);
        process.waitFor(GRACE.toMillis(), TimeUnit.MILLISECONDS);
      }
    } catch (InterruptedException e) {
      interrupted = true;
    }
    process.destroyForcibly();
    client.close();
    delete(connectionFile);
    if (interrupted) {
      Thread.currentThread().interrupt();
    }
  }

  private void watch() {
    Thread watcher = new Thread(this::awaitEnd, "pinchoff-kernel-watch");
    watcher.setDaemon(true);
    watcher.start();
  }

  private void awaitEnd() {
    try {
      process.waitFor();
      log.awaitEnd(Duration.ofMillis(500));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return;
    }
    List<String> lines = log.lines();
    client.abandon(
        "the kernel's process has ended with exit code "
            + process.exitValue()
            + (lines.isEmpty() ? "" : "; its last words:\n" + String.join("\n", lines)));
  }

  private static Process launch(
      List<String> command, Path file, Path workingDirectory, Map<String, String> environment)
      throws IOException {
    List<String> argv =
        command.stream().map(word -> word.replace(CONNECTION_FILE, file.toString())).toList();
    ProcessBuilder builder =
        new ProcessBuilder(argv).directory(workingDirectory.toFile()).redirectErrorStream(true);
    builder.environment().put("JPY_PARENT_PID", Long.toString(ProcessHandle.current().pid()));
    builder.environment().putAll(environment);
    Process process = builder.start();
    process.getOutputStream().close();
    return process;
  }

  private static void delete(Path connectionFile) {
    try {
      Files.deleteIfExists(connectionFile);
      Files.deleteIfExists(connectionFile.toAbsolutePath().getParent());
    } catch (IOException e) {
      connectionFile.toFile().deleteOnExit();
    }
  }
}
