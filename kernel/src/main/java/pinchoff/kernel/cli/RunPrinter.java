package pinchoff.kernel.cli;

import java.io.PrintStream;
import java.util.List;
import pinchoff.kernel.notebook.Output;
import pinchoff.kernel.run.CellRun;
import pinchoff.kernel.run.RunListener;

/** Shows how a run goes on, and what its cells show. */
final class RunPrinter implements RunListener, AutoCloseable {
  private final String notebook;
  private final Streams streams;
  private final boolean showsResults;
  private int lineLength;

  RunPrinter(String notebook, Streams streams, boolean showsResults) {
    this.notebook = Printable.line(notebook);
    this.streams = streams;
    this.showsResults = showsResults;
    progress(notebook + ": starting a kernel");
  }

  @Override
  public void cellStarts(int index, int count) {
    progress(notebook + ": cell " + index + " of " + count);
  }

  @Override
  public void cellEnded(CellRun cell, List<Output> outputs) {
    if (showsResults && !outputs.isEmpty()) {
      clearLine();
      streams.out().println(cell.label() + ":");
      outputs.forEach(this::show);
    } else if (!showsResults && cell.ending().isFinding()) {
      clearLine();
      outputs.stream().filter(Output.Failure.class::isInstance).forEach(this::show);
    }
  }

  /** Leaves no half line behind. */
  @Override
  public void close() {
    clearLine();
  }

  private void show(Output output) {
    if (output instanceof Output.StreamText stream) {
      print(streams.out(), stream.text());
    } else if (output instanceof Output.Rich rich) {
      print(streams.out(), rich.plainText().orElse("(no plain text)"));
    } else if (output instanceof Output.Failure failure) {
      PrintStream where = showsResults ? streams.out() : streams.err();
      print(where, String.join("\n", failure.traceback()));
    }
  }

  private static void print(PrintStream out, String text) {
    String clean = Printable.text(text);
    out.print(clean.endsWith("\n") ? clean : clean + "\n");
    out.flush();
  }

  private void progress(String line) {
    if (!streams.terminal()) {
      streams.err().println(line);
      return;
    }
    clearLine();
    streams.err().print(line);
    streams.err().flush();
    lineLength = line.length();
  }

  private void clearLine() {
    if (lineLength > 0) {
      streams.err().print("\r" + " ".repeat(lineLength) + "\r");
      streams.err().flush();
      lineLength = 0;
    }
  }
}
