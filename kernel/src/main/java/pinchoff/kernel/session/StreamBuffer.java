package pinchoff.kernel.session;

import java.nio.charset.StandardCharsets;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.function.BiConsumer;
import pinchoff.kernel.eval.CellOutput.Stream;
import pinchoff.kernel.limits.Limits;

/**
 * Gathers what one cell prints into few messages. Text is sent when it has waited for a moment,
 * when there is much of it, when the other stream speaks, or when anything else is about to be
 * sent.
 *
 * <p>Guarded by its owner's lock.
 */
final class StreamBuffer {
  private final Limits limits;
  private final Object lock;
  private final ScheduledExecutorService timer;
  private final BiConsumer<Stream, String> send;
  private final StringBuilder text = new StringBuilder();

  private Stream stream = Stream.OUT;
  private boolean scheduled;
  private long bytes;

  StreamBuffer(
      Limits limits, Object lock, ScheduledExecutorService timer, BiConsumer<Stream, String> send) {
    this.limits = limits;
    this.lock = lock;
    this.timer = timer;
    this.send = send;
  }

  void write(Stream to, String printed) {
    if (printed.isEmpty() || bytes > limits.streamBytes()) {
      return;
    }
    if (to != stream) {
      flush();
      stream = to;
    }
    bytes += printed.length() < 1024 * 1024 ? utf8Length(printed) : printed.length();
    if (bytes > limits.streamBytes()) {
      flush();
      send.accept(
          Stream.ERR,
          "\n[the cell has printed more than "
              + limits.streamBytes() / (1024 * 1024)
              + " MiB: what it prints from here on is not shown]\n");
      return;
    }
    text.append(printed);
    while (text.length() >= limits.streamChunk()) {
      int end = limits.streamChunk();
      if (Character.isHighSurrogate(text.charAt(end - 1))) {
        end--;
      }
      send.accept(stream, text.substring(0, end));
      text.delete(0, end);
    }
    if (text.length() > 0 && !scheduled) {
      scheduled =
          !timer
              .schedule(this::onTime, limits.streamDelay().toMillis(), TimeUnit.MILLISECONDS)
              .isCancelled();
    }
  }

  void flush() {
    if (text.length() > 0) {
      send.accept(stream, text.toString());
      text.setLength(0);
    }
  }

  private void onTime() {
    synchronized (lock) {
      scheduled = false;
      flush();
    }
  }

  private static int utf8Length(String text) {
    return text.getBytes(StandardCharsets.UTF_8).length;
  }
}
