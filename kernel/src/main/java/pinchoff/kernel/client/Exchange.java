package pinchoff.kernel.client;

import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.InputRequest;
import pinchoff.kernel.protocol.Status;
import pinchoff.kernel.wire.Channel;

/**
 * One request on its way: collects what comes for it until its reply and its idle status are in.
 */
final class Exchange implements AutoCloseable {
  private final BlockingQueue<Event> events = new LinkedBlockingQueue<>();
  private final String requestType;
  private final Runnable onClose;

  /** Something that happened, or the end of all hope. */
  private record Event(Channel channel, Optional<Content> content, String gone) {}

  Exchange(String requestType, Runnable onClose) {
    this.requestType = requestType;
    this.onClose = onClose;
  }

  void received(Channel channel, Content content) {
    events.add(new Event(channel, Optional.of(content), ""));
  }

  void abandon(String reason) {
    events.add(new Event(Channel.HEARTBEAT, Optional.empty(), reason));
  }

  /** Waits for reply and idle, and hands on what comes before. */
  Content await(
      Optional<Duration> limit, Consumer<Content> outputs, Consumer<InputRequest> questions)
      throws InterruptedException {
    return await(limit, outputs, questions, true);
  }

  /** Waits for the reply alone. */
  Content awaitReply(Duration limit) throws InterruptedException {
    return await(Optional.of(limit), output -> {}, question -> {}, false);
  }

  private Content await(
      Optional<Duration> limit,
      Consumer<Content> outputs,
      Consumer<InputRequest> questions,
      boolean untilIdle)
      throws InterruptedException {
    long deadline = System.nanoTime() + limit.map(Duration::toNanos).orElse(0L);
    Content reply = null;
    boolean idle = !untilIdle;
    while (reply == null || !idle) {
      Event event = next(limit, deadline);
      Content content = event.content().orElseThrow(() -> new KernelGoneException(event.gone()));
      if (event.channel() == Channel.STDIN) {
        if (content instanceof InputRequest question) {
          questions.accept(question);
        }
      } else if (event.channel() != Channel.IOPUB) {
        reply = content;
      } else if (content instanceof Status status) {
        idle |= status.equals(Status.IDLE);
      } else {
        outputs.accept(content);
      }
    }
    return reply;
  }

  private Event next(Optional<Duration> limit, long deadline) throws InterruptedException {
    if (limit.isEmpty()) {
      return events.take();
    }
    @Nullable Event event = events.poll(deadline - System.nanoTime(), TimeUnit.NANOSECONDS);
    if (event == null) {
      throw new KernelTimeoutException(
          "the kernel did not finish a " + requestType + " within " + limit.get());
    }
    return event;
  }

  @Override
  public void close() {
    onClose.run();
  }
}
