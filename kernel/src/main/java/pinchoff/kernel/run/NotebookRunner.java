package pinchoff.kernel.run;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import pinchoff.kernel.client.CellReply;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookCell;
import pinchoff.kernel.notebook.NotebookException;
import pinchoff.kernel.notebook.OutputRecorder;
import pinchoff.kernel.protocol.ExecuteRequest;

/** Runs notebooks, each in a fresh kernel. */
public final class NotebookRunner {
  private static final String LANGUAGE = "java";
  private static final Duration INFO_LIMIT = Duration.ofSeconds(30);

  /** What a notebook without a kernel of its own says after a run. */
  private static final Map<String, Object> KERNELSPEC =
      Map.of("name", "pinchoff", "display_name", "Pinchoff (Java)", "language", LANGUAGE);

  private final KernelLauncher launcher;
  private final RunOptions options;

  /** A runner that starts its kernels in this way. */
  public NotebookRunner(KernelLauncher launcher, RunOptions options) {
    this.launcher = launcher;
    this.options = options;
  }

  /**
   * Refuses a notebook whose cells are in another language.
   *
   * @param name what to call it in the message
   * @throws NotebookException if it is not for Java
   */
  public static void requireJava(Notebook notebook, String name) {
    notebook
        .language()
        .filter(language -> !language.equals(LANGUAGE))
        .ifPresent(
            language -> {
              throw new NotebookException(
                  name
                      + " is a notebook for another kernel: its cells are in \""
                      + language
                      + "\", expected \""
                      + LANGUAGE
                      + "\"");
            });
  }

  /**
   * Runs a notebook's code cells in order.
   *
   * @param folder working directory of the kernel: the notebook's own folder
   * @throws IOException if no kernel can be started
   * @throws pinchoff.kernel.client.KernelGoneException if it ends before the first cell
   * @throws pinchoff.kernel.client.KernelTimeoutException if it does not answer
   */
  public NotebookRun run(Notebook notebook, Path folder, RunListener listener)
      throws IOException, InterruptedException {
    try (RunKernel kernel = launcher.launch(folder)) {
      Map<String, Object> language = kernel.info(INFO_LIMIT).languageInfo();
      OutputRecorder recorder = new OutputRecorder();
      List<CellRun> runs = runCells(notebook, new CellRunner(kernel, options, recorder), listener);
      Set<String> premises =
          runs.stream().anyMatch(r -> r.ending() == CellRun.Ending.KERNEL_GONE)
              ? Set.of()
              : premisesRead(kernel);
      return new NotebookRun(
          notebook
              .withCells(withOutputs(notebook, runs, recorder))
              .withMetadata("kernelspec", kernelspec(notebook))
              .withMetadata("language_info", language),
          runs,
          premises);
    }
  }

  /** Asks the kernel at the end of a run, without leaving a trace in the notebook. */
  private static Set<String> premisesRead(RunKernel kernel) throws InterruptedException {
    Map<String, Object> expressions =
        Map.of("premises", "pinchoff.display.Host.current().premisesRead()");
    try {
      CellReply reply =
          kernel.execute(
              new ExecuteRequest("", true, false, expressions, false, false), OutputListener.NONE);
      return PremiseReport.of(reply.userExpressions().get("premises"));
    } catch (KernelGoneException gone) {
      return Set.of();
    }
  }

  private List<CellRun> runCells(Notebook notebook, CellRunner runner, RunListener listener)
      throws InterruptedException {
    List<NotebookCell> cells = notebook.cells();
    int count = (int) cells.stream().filter(CodeCell.class::isInstance).count();
    List<CellRun> runs = new ArrayList<>();
    boolean going = true;
    for (int i = 0; i < cells.size(); i++) {
      if (!(cells.get(i) instanceof CodeCell cell)) {
        continue;
      }
      if (going) {
        listener.cellStarts(runs.size() + 1, count);
      }
      CellRun run =
          going
              ? runner.run(cell, i + 1)
              : CellRun.of(i + 1, cell.id(), CellRun.Ending.NOT_REACHED);
      runs.add(run);
      if (going) {
        listener.cellEnded(run, runner.outputs(cell));
      }
      going = going && goesOnAfter(run);
    }
    return runs;
  }

  private boolean goesOnAfter(CellRun run) {
    return !run.ending().isFinding()
        || (options.pastErrors() && run.ending() != CellRun.Ending.KERNEL_GONE);
  }

  private static List<NotebookCell> withOutputs(
      Notebook notebook, List<CellRun> runs, OutputRecorder recorder) {
    List<NotebookCell> cells = new ArrayList<>(notebook.cells());
    for (CellRun run : runs) {
      if (run.ending() == CellRun.Ending.SKIPPED) {
        continue;
      }
      CodeCell cell = (CodeCell) cells.get(run.place() - 1);
      cells.set(run.place() - 1, cell.with(recorder.outputs(run.id()), run.executionCount()));
    }
    return cells;
  }

  private static Map<String, Object> kernelspec(Notebook notebook) {
    Map<String, Object> kernelspec = new LinkedHashMap<>(KERNELSPEC);
    kernelspec.putAll(notebook.kernelspec());
    return kernelspec;
  }
}
