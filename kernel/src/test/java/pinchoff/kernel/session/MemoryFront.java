package pinchoff.kernel.session;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.function.Consumer;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.protocol.ContentReader;
import pinchoff.kernel.protocol.IdSource;
import pinchoff.kernel.protocol.MessageFactory;
import pinchoff.kernel.wire.Channel;
import pinchoff.kernel.wire.Message;
import pinchoff.kernel.wire.SignatureScheme;
import pinchoff.kernel.wire.Signer;
import pinchoff.kernel.wire.WireException;
import pinchoff.kernel.wire.WireFormat;

/** A front end and a session in one process, without sockets: frames go through the wire format. */
public final class MemoryFront extends Front implements MessagePort {
  private final BlockingQueue<Request> shell = new LinkedBlockingQueue<>();
  private final BlockingQueue<Request> control = new LinkedBlockingQueue<>();
  private final List<String> log = Collections.synchronizedList(new ArrayList<>());
  private final List<Thread> threads = new ArrayList<>();
  private final Signer signer = new Signer(SignatureScheme.HMAC_SHA256, "memory");
  private final WireFormat here;
  private final WireFormat there;
  private final KernelSession session;

  /** Counted down when the kernel wants to end. */
  public final CountDownLatch ended = new CountDownLatch(1);

  /** Starts a session. */
  public MemoryFront(CompletableFuture<CellEvaluator> evaluator, Limits limits) {
    here = new WireFormat(signer, limits);
    there = new WireFormat(signer, limits);
    session =
        new KernelSession(
            evaluator,
            new MessageFactory(IdSource.random(), java.time.Clock.systemUTC(), "kernel"),
            this,
            limits,
            log::add,
            ended::countDown);
    start(shell, session::shell);
    start(control, session::control);
  }

  private void start(BlockingQueue<Request> queue, Consumer<Request> handler) {
    Thread thread =
        new Thread(
            () -> {
              try {
                while (true) {
                  handler.accept(queue.take());
                }
              } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
              }
            });
    thread.setDaemon(true);
    thread.start();
    threads.add(thread);
  }

  @Override
  public void send(Channel channel, Message message) {
    if (message.header().session().equals(messages.session())) {
      frames(channel, here.encode(message));
    } else {
      deliver(channel, message);
    }
  }

  /** Hands frames to the kernel, as they would come from a socket. */
  public void frames(Channel channel, List<byte[]> frames) {
    try {
      Request request = Request.of(there.decode(frames));
      switch (channel) {
        case SHELL -> shell.add(request);
        case CONTROL -> control.add(request);
        case STDIN -> session.input(request);
        default -> throw new AssertionError(channel);
      }
    } catch (WireException | RuntimeException e) {
      log.add(channel.label() + ": dropped: " + e.getMessage());
    }
  }

  private void deliver(Channel channel, Message message) {
    try {
      Message copy = here.decode(there.encode(message));
      add(channel, copy, ContentReader.read(copy));
    } catch (WireException e) {
      throw new AssertionError(e);
    }
  }

  @Override
  public boolean ask(Message question) {
    deliver(Channel.STDIN, question);
    return true;
  }

  @Override
  public List<Request> takeWaiting() {
    List<Request> waiting = new ArrayList<>();
    shell.drainTo(waiting);
    return waiting;
  }

  @Override
  public List<String> log() {
    return List.copyOf(log);
  }

  @Override
  public void close() {
    threads.forEach(Thread::interrupt);
    session.close();
  }
}
