package pinchoff.kernel.session;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ScheduledExecutorService;
import pinchoff.display.MimeBundle;
import pinchoff.kernel.eval.CellOutput;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.ClearOutput;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.DisplayData;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.protocol.StreamText;
import pinchoff.kernel.protocol.UpdateDisplayData;

/**
 * Broadcasts the outputs of one cell, in order, with its request as parent; also those that come
 * after its end. A silent cell has none.
 */
final class RequestOutput implements CellOutput {
  private final Request request;
  private final boolean silent;
  private final boolean mayAsk;
  private final Outbox outbox;
  private final Questions questions;
  private final Limits limits;
  private final Object lock = new Object();
  private final StreamBuffer printed;

  RequestOutput(
      Request request,
      ExecuteRequest asked,
      Outbox outbox,
      Questions questions,
      Limits limits,
      ScheduledExecutorService timer) {
    this.request = request;
    this.silent = asked.silent();
    this.mayAsk = asked.allowStdin();
    this.outbox = outbox;
    this.questions = questions;
    this.limits = limits;
    this.printed = new StreamBuffer(limits, lock, timer, this::sendText);
  }

  @Override
  public void write(Stream stream, String text) {
    if (!silent) {
      synchronized (lock) {
        printed.write(stream, text);
      }
    }
  }

  @Override
  public void publish(Optional<String> displayId, MimeBundle bundle) {
    MimeBundle shown = withinLimits(bundle);
    send(new DisplayData(shown.data(), metadata(shown), displayId));
  }

  @Override
  public void update(String displayId, MimeBundle bundle) {
    MimeBundle shown = withinLimits(bundle);
    send(new UpdateDisplayData(shown.data(), metadata(shown), displayId));
  }

  @Override
  public void clear(boolean wait) {
    send(new ClearOutput(wait));
  }

  @Override
  public String ask(String prompt, boolean password) throws InterruptedException {
    if (!mayAsk) {
      throw new IllegalStateException(
          "nobody can be asked for input here (\""
              + prompt
              + "\"): this notebook is run by a program that answers no questions");
    }
    flush();
    return questions.ask(request, prompt, password);
  }

  /** Broadcasts the cell's value. */
  void result(int executionCount, MimeBundle bundle) {
    MimeBundle shown = withinLimits(bundle);
    send(new ExecuteResult(executionCount, shown.data(), metadata(shown)));
  }

  /** Broadcasts anything else of this cell after what it has printed so far. */
  void send(Content content) {
    if (!silent) {
      synchronized (lock) {
        printed.flush();
        outbox.broadcast(request.header(), content);
      }
    }
  }

  /** Sends what was printed and not sent yet. */
  void flush() {
    synchronized (lock) {
      printed.flush();
    }
  }

  private void sendText(Stream stream, String text) {
    String name = "STD" + stream.name();
    outbox.broadcast(request.header(), new StreamText(name.toLowerCase(Locale.ROOT), text));
  }

  private MimeBundle withinLimits(MimeBundle bundle) {
    long chars = 0;
    for (Object form : bundle.data().values()) {
      chars += form instanceof String text ? text.length() : 0;
    }
    if (chars <= limits.displayChars()) {
      return bundle;
    }
    return MimeBundle.text(
        "[a result of "
            + chars
            + " characters: more than "
            + limits.displayChars()
            + " are not shown]");
  }

  static Map<String, Object> metadata(MimeBundle bundle) {
    return new HashMap<>(bundle.metadata());
  }
}
