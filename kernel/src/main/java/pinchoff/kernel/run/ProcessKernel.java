package pinchoff.kernel.run;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import pinchoff.kernel.client.CellReply;
import pinchoff.kernel.client.KernelProcess;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.KernelInfoReply;

/** A kernel process of its own, which never outlives this process. */
public final class ProcessKernel implements RunKernel {
  private final KernelProcess process;
  private final Thread atExit;

  private ProcessKernel(KernelProcess process) {
    this.process = process;
    this.atExit = new Thread(process::close, "pinchoff-end-of-kernel");
    Runtime.getRuntime().addShutdownHook(atExit);
  }

  /**
   * Starts a kernel and waits until it answers.
   *
   * @param command program and arguments, see {@link KernelProcess#start}
   * @param folder where it runs
   * @param environment variables added to those of this process
   * @param limit how long it may take to answer
   * @throws IOException if it cannot be started
   */
  public static ProcessKernel start(
      List<String> command, Path folder, Map<String, String> environment, Duration limit)
      throws IOException, InterruptedException {
    return new ProcessKernel(KernelProcess.start(command, folder, environment, limit));
  }

  @Override
  public KernelInfoReply info(Duration limit) throws InterruptedException {
    return process.info(limit);
  }

  @Override
  public CellReply execute(ExecuteRequest request, OutputListener listener)
      throws InterruptedException {
    return process.client().execute(request, listener);
  }

  @Override
  public void interrupt() {
    process.client().interrupt();
  }

  @Override
  public void kill() {
    process.kill();
  }

  @Override
  public void close() {
    process.close();
    try {
      Runtime.getRuntime().removeShutdownHook(atExit);
    } catch (IllegalStateException e) {
      // This process ends already, and the hook with it.
      return;
    }
  }
}
