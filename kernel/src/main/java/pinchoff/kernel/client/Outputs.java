package pinchoff.kernel.client;

import pinchoff.kernel.protocol.ClearOutput;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.DisplayData;
import pinchoff.kernel.protocol.ErrorOutput;
import pinchoff.kernel.protocol.ExecuteInput;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.protocol.StreamText;
import pinchoff.kernel.protocol.UpdateDisplayData;

/** Hands one broadcast to the method of a listener that it belongs to. */
final class Outputs {

  private Outputs() {}

  static void deliver(Content content, OutputListener listener) {
    if (content instanceof ExecuteInput input) {
      listener.started(input.executionCount());
    } else if (content instanceof StreamText stream) {
      listener.stream(stream.name(), stream.text());
    } else if (content instanceof DisplayData display) {
      listener.display(display);
    } else if (content instanceof UpdateDisplayData update) {
      listener.update(update);
    } else if (content instanceof ExecuteResult result) {
      listener.result(result);
    } else if (content instanceof ErrorOutput error) {
      listener.error(error.error());
    } else if (content instanceof ClearOutput clear) {
      listener.clear(clear.later());
    }
  }
}
