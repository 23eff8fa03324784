package pinchoff.kernel.session;

import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import pinchoff.kernel.protocol.Content;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.IdSource;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.protocol.Status;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.Message;

/** A front end for tests: sends requests and keeps everything that comes, in order. */
public abstract class Front implements AutoCloseable {
  private static final long PATIENCE_SECONDS = 30;

  /** Makes this front end's messages. */
  protected final MessageFactory messages =
      new MessageFactory(IdSource.random(), Clock.systemUTC(), "test");

  private final List<Received> received = new ArrayList<>();

  /** Something that came. */
  public record Received(Channel channel, Message message, Content content) {
    /** Whether it was caused by this request. */
    public boolean of(Message request) {
      return message.parentId().equals(Optional.of(request.header().id()));
    }

    private boolean isIdle() {
      return channel == Channel.IOPUB && content.equals(Status.IDLE);
    }
  }

  /** All that came for one request. */
  public record Answer(
      Message request, Content reply, Message replyMessage, List<Content> outputs) {
    /** The broadcasts between busy and idle. */
    public List<Content> between() {
      return outputs.subList(1, outputs.size() - 1);
    }

    /** The types of the broadcasts between busy and idle. */
    public List<String> types() {
      return between().stream().map(Content::type).toList();
    }
  }

  /** Makes this front end's messages. */
  public MessageFactory messages() {
    return messages;
  }

  /** Sends a message. */
  public abstract void send(Channel channel, Message message);

  /** What the kernel's log says so far. */
  public abstract List<String> log();

  @Override
  public abstract void close();

  /** To be called for each message that comes. */
  protected final synchronized void add(Channel channel, Message message, Content content) {
    received.add(new Received(channel, message, content));
    notifyAll();
  }

  /** Sends a request. */
  public final Message send(Channel channel, Content content) {
    Message request = messages.request(content);
    send(channel, request);
    return request;
  }

  /** Waits for something that fits. */
  public final synchronized Received await(String what, Predicate<Received> fits)
      throws InterruptedException {
    long deadline = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
    while (true) {
      Optional<Received> found = received.stream().filter(fits).findFirst();
      if (found.isPresent()) {
        return found.get();
      }
      long millis = (deadline - System.nanoTime()) / 1_000_000;
      if (millis <= 0) {
        throw new AssertionError("did not come: " + what + "; came: " + received);
      }
      wait(millis);
    }
  }

  /** Waits for the reply and the idle status of a request. */
  public final Answer finish(Message request) throws InterruptedException {
    Received reply =
        await("a reply", r -> r.of(request) && r.channel() != Channel.IOPUB && !isQuestion(r));
    return new Answer(request, reply.content(), reply.message(), outputs(request));
  }

  /** Waits for the idle status of a request; its broadcasts. */
  public final List<Content> outputs(Message request) throws InterruptedException {
    await("idle", r -> r.of(request) && r.isIdle());
    return came().stream()
        .filter(r -> r.of(request) && r.channel() == Channel.IOPUB)
        .map(Received::content)
        .toList();
  }

  /** Sends a request and waits until it is finished. */
  public final Answer ask(Channel channel, Content content) throws InterruptedException {
    return finish(send(channel, content));
  }

  /** Runs a cell. */
  public final Answer run(String... lines) throws InterruptedException {
    return ask(Channel.SHELL, ExecuteRequest.of(String.join("\n", lines)));
  }

  /** Everything that came so far. */
  public final synchronized List<Received> came() {
    return List.copyOf(received);
  }

  private static boolean isQuestion(Received r) {
    return r.channel() == Channel.STDIN;
  }
}
