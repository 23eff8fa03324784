package pinchoff.kernel.run;

import java.util.Optional;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.notebook.Output;
import pinchoff.kernel.notebook.OutputRecorder;
import pinchoff.kernel.protocol.DisplayData;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.protocol.UpdateDisplayData;

/** Records what one cell puts out. */
final class CellRecorder implements OutputListener {
  private final OutputRecorder recorder;
  private final OutputRecorder.Page page;
  private Optional<Integer> executionCount = Optional.empty();

  CellRecorder(OutputRecorder recorder, String cellId) {
    this.recorder = recorder;
    this.page = recorder.page(cellId);
  }

  /** The number that the kernel gave the cell, once it runs. */
  Optional<Integer> executionCount() {
    return executionCount;
  }

  @Override
  public void started(int count) {
    executionCount = Optional.of(count);
  }

  @Override
  public void stream(String name, String text) {
    page.print(name, text);
  }

  @Override
  public void display(DisplayData shown) {
    page.add(new Output.Display(shown.data(), shown.metadata()), shown.displayId());
  }

  @Override
  public void update(UpdateDisplayData update) {
    recorder.update(update.displayId(), update.data(), update.metadata());
  }

  @Override
  public void result(ExecuteResult result) {
    page.add(
        new Output.Result(Optional.of(result.executionCount()), result.data(), result.metadata()),
        Optional.empty());
  }

  @Override
  public void error(ErrorInfo error) {
    page.add(new Output.Failure(error.name(), error.value(), error.traceback()), Optional.empty());
  }

  @Override
  public void clear(boolean later) {
    page.clear(later);
  }
}
