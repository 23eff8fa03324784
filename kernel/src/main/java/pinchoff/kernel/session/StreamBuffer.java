package pinchoff.kernel.session;

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
  private boolean full;
  private long bytes;

  StreamBuffer(
      Limits limits, Object lock, ScheduledExecutorService timer, BiConsumer<Stream, String> send) {
    this.limits = limits;
    this.lock = lock;
    this.timer = timer;
    this.send = send;
  }

  void write(Stream to, String printed) {
    if (printed.isEmpty() || full) {
      return;
    }
    if (to != stream) {
      flush();
      stream = to;
    }
    int end = withinLimit(printed);
    append(printed, end);
    if (end < printed.length()) {
      full = true;
      flush();
      send.accept(
          Stream.ERR,
          "\n[the cell has printed "
              + limits.streamBytes()
              + " bytes: what it prints from here on is not shown]\n");
    } else if (text.length() > 0 && !scheduled) {
      scheduled = true;
      var unused =
          timer.schedule(this::onTime, limits.streamDelay().toMillis(), TimeUnit.MILLISECONDS);
    }
  }

  /** How much of a text may still be sent, as an end that splits no character. */
  private int withinLimit(String printed) {
    int end = 0;
    while (end < printed.length()) {
      int point = printed.codePointAt(end);
      bytes += point < 0x80 ? 1 : point < 0x800 ? 2 : point < 0x10000 ? 3 : 4;
      if (bytes > limits.streamBytes()) {
        return end;
      }
      end += Character.charCount(point);
    }
    return end;
  }

  private void append(String printed, int end) {
    int start = 0;
    while (start < end) {
      int next = Math.min(end, start + limits.streamChunk() - text.length());
      if (next < end && Character.isHighSurrogate(printed.charAt(next - 1))) {
        next--;
      }
      text.append(printed, start, next);
      start = next;
      if (start < end || text.length() >= limits.streamChunk()) {
        flush();
      }
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
}
