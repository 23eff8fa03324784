package pinchoff.kernel.client;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.function.Consumer;

/** Reads what a process prints, hands each line on and keeps the last ones. */
final class LastLines {
  private static final int KEPT = 40;
  private static final int LONGEST = 2000;

  private final Deque<String> lines = new ArrayDeque<>();
  private final Thread thread;

  LastLines(InputStream in, Consumer<String> each) {
    thread = new Thread(() -> read(in, each), "pinchoff-kernel-log");
    thread.setDaemon(true);
    thread.start();
  }

  synchronized List<String> lines() {
    return List.copyOf(lines);
  }

  /** Waits for the end of what the process printed. */
  void awaitEnd(Duration limit) throws InterruptedException {
    thread.join(limit.toMillis());
  }

  private void read(InputStream in, Consumer<String> each) {
    try (var reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        String kept = line.length() > LONGEST ? line.substring(0, LONGEST) + "…" : line;
        add(kept);
        each.accept(kept);
      }
    } catch (IOException e) {
      add("(its output cannot be read: " + e.getMessage() + ")");
    }
  }

  private synchronized void add(String line) {
    lines.addLast(line);
    if (lines.size() > KEPT) {
      lines.removeFirst();
    }
  }
}
