package pinchoff.kernel.run;

import java.time.Duration;
import pinchoff.kernel.client.CellReply;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.KernelInfoReply;

/** A kernel as a runner needs it. */
public interface RunKernel extends AutoCloseable {

  /** What the kernel says it is. */
  KernelInfoReply info(Duration limit) throws InterruptedException;

  /**
   * Runs a cell to its end.
   *
   * @param listener receives the outputs, on the calling thread
   * @throws pinchoff.kernel.client.KernelGoneException if the kernel ends meanwhile
   */
  CellReply execute(ExecuteRequest request, OutputListener listener) throws InterruptedException;

  /** Asks the running cell to stop; returns at once. */
  void interrupt();

  /** Ends the kernel at once, whatever it does. */
  void kill();

  /** Shuts the kernel down. */
  @Override
  void close();
}
