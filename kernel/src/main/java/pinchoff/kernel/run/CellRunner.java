package pinchoff.kernel.run;

import java.util.List;
import java.util.Optional;
import pinchoff.kernel.client.CellReply;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Output;
import pinchoff.kernel.notebook.OutputRecorder;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ExecuteRequest;

/** Runs single cells in a kernel and records what they show. */
final class CellRunner {
  private final RunKernel kernel;
  private final RunOptions options;
  private final OutputRecorder recorder;

  CellRunner(RunKernel kernel, RunOptions options, OutputRecorder recorder) {
    this.kernel = kernel;
    this.options = options;
    this.recorder = recorder;
  }

  /** What a cell has shown in this run. */
  List<Output> outputs(CodeCell cell) {
    return recorder.outputs(cell.id());
  }

  CellRun run(CodeCell cell, int place) throws InterruptedException {
    if (cell.isBlank()) {
      return CellRun.of(place, cell.id(), CellRun.Ending.BLANK);
    }
    if (cell.tags().contains("skip-execution")) {
      return CellRun.of(place, cell.id(), CellRun.Ending.SKIPPED);
    }
    CellRecorder outputs = new CellRecorder(recorder, cell.id());
    boolean mayFail = cell.tags().contains("raises-exception");
    ExecuteRequest request =
        ExecuteRequest.of(cell.source()).withStopOnError(!mayFail && !options.pastErrors());
    try (TimeLimit limit = TimeLimit.watch(kernel, options)) {
      Verdict verdict = execute(request, outputs, limit, mayFail);
      return new CellRun(
          place, cell.id(), verdict.ending(), outputs.executionCount(), verdict.error());
    }
  }

  private record Verdict(CellRun.Ending ending, Optional<ErrorInfo> error) {}

  private Verdict execute(
      ExecuteRequest request, CellRecorder outputs, TimeLimit limit, boolean mayFail)
      throws InterruptedException {
    try {
      CellReply reply = kernel.execute(request, outputs);
      reply.executionCount().ifPresent(outputs::started);
      if (limit.expired()) {
        return new Verdict(CellRun.Ending.OUT_OF_TIME, Optional.of(outOfTime("was interrupted")));
      }
      if (reply.ok()) {
        return new Verdict(CellRun.Ending.DONE, Optional.empty());
      }
      return new Verdict(
          mayFail ? CellRun.Ending.FAILED_AS_EXPECTED : CellRun.Ending.FAILED, reply.error());
    } catch (KernelGoneException e) {
      ErrorInfo error =
          limit.expired()
              ? outOfTime("could not be interrupted, so its kernel was killed")
              : new ErrorInfo("KernelGone", e.getMessage(), e.getMessage().lines().toList());
      outputs.error(error);
      return new Verdict(CellRun.Ending.KERNEL_GONE, Optional.of(error));
    }
  }

  private ErrorInfo outOfTime(String whatFollowed) {
    String text =
        "the cell took longer than its time limit of "
            + options.cellLimit().orElseThrow().toMillis() / 1000.0
            + " s and "
            + whatFollowed;
    return new ErrorInfo("TimeLimit", text, List.of("TimeLimit: " + text));
  }
}
