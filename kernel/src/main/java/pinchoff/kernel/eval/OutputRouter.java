package pinchoff.kernel.eval;

import java.io.InputStream;
import java.io.PrintStream;

/**
 * Replaces the process's three standard streams, so that what a cell's threads print reaches that
 * cell and what they read is asked of the user. Threads that belong to no cell keep the original
 * streams.
 */
final class OutputRouter implements AutoCloseable {
  private final PrintStream originalOut = System.out;
  private final PrintStream originalErr = System.err;
  private final InputStream originalIn = System.in;
  private final PrintStream out = new RoutedPrintStream(CellOutput.Stream.OUT, originalOut);
  private final PrintStream err = new RoutedPrintStream(CellOutput.Stream.ERR, originalErr);
  private final AskingInputStream in = new AskingInputStream(originalIn);

  /** Puts the routed streams in place, also after a cell has put others there. */
  void install() {
    if (System.out != out) {
      System.setOut(out);
    }
    if (System.err != err) {
      System.setErr(err);
    }
    if (System.in != in) {
      System.setIn(in);
    }
    in.forget();
  }

  @Override
  public void close() {
    System.setOut(originalOut);
    System.setErr(originalErr);
    System.setIn(originalIn);
  }
}
