package pinchoff.kernel.wire;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.channels.Pipe;
import java.nio.channels.SelectableChannel;
import java.util.Optional;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * A queue whose reader can wait for it together with its sockets: sockets belong to one thread, so
 * every other thread leaves its messages here, and the order here is the order on the wire.
 *
 * @param <T> what is queued
 */
public final class Mailbox<T> implements AutoCloseable {
  private final Queue<T> queue = new ConcurrentLinkedQueue<>();
  private final AtomicBoolean signalled = new AtomicBoolean();
  private final Pipe pipe;

  /** An empty mailbox. */
  public Mailbox() {
    try {
      pipe = Pipe.open();
      pipe.source().configureBlocking(false);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Leaves an item; any thread may. An item left after the close is dropped. */
  public void put(T item) {
    queue.add(item);
    if (signalled.compareAndSet(false, true)) {
      try {
        pipe.sink().write(ByteBuffer.wrap(new byte[1]));
      } catch (IOException e) {
        queue.clear();
      }
    }
  }

  /** What becomes readable when an item has come. */
  public SelectableChannel arrival() {
    return pipe.source();
  }

  /** Takes note of the arrival; to be called before the items are taken. */
  public void acknowledge() {
    try {
      pipe.source().read(ByteBuffer.allocate(16));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    signalled.set(false);
  }

  /** The next item, if there is one. */
  public Optional<T> poll() {
    return Optional.ofNullable(queue.poll());
  }

  @Override
  public void close() {
    try {
      pipe.sink().close();
      pipe.source().close();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
