package pinchoff.kernel.eval;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import pinchoff.display.MimeBundle;

/** Remembers what a cell puts out, and lets a test wait for it. */
final class RecordedOutput implements CellOutput {
  private final StringBuilder out = new StringBuilder();
  private final StringBuilder err = new StringBuilder();
  private final List<String> events = new ArrayList<>();
  private final Queue<String> answers = new ArrayDeque<>();
  private final CountDownLatch asked = new CountDownLatch(1);

  @Override
  public synchronized void write(Stream stream, String text) {
    (stream == Stream.OUT ? out : err).append(text);
    notifyAll();
  }

  @Override
  public synchronized void publish(Optional<String> displayId, MimeBundle bundle) {
    events.add("publish " + displayId.orElse("-") + " " + bundle.plainText());
    notifyAll();
  }

  @Override
  public synchronized void update(String displayId, MimeBundle bundle) {
    events.add("update " + displayId + " " + bundle.plainText());
    notifyAll();
  }

  @Override
  public synchronized void clear(boolean wait) {
    events.add("clear " + wait);
    notifyAll();
  }

  @Override
  public String ask(String prompt, boolean password) throws InterruptedException {
    synchronized (this) {
      events.add("ask " + prompt + " " + password);
      String answer = answers.poll();
      if (answer != null) {
        return answer;
      }
      notifyAll();
    }
    asked.countDown();
    new CountDownLatch(1).await();
    throw new AssertionError("unreachable");
  }

  synchronized void willAnswer(String line) {
    answers.add(line);
  }

  void awaitAsked() throws InterruptedException {
    if (!asked.await(10, TimeUnit.SECONDS)) {
      throw new AssertionError("nothing was asked");
    }
  }

  synchronized String out() {
    return out.toString();
  }

  synchronized String err() {
    return err.toString();
  }

  synchronized List<String> events() {
    return List.copyOf(events);
  }

  /** Waits until this holds, at most ten seconds. */
  synchronized void await(Predicate<RecordedOutput> condition) throws InterruptedException {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(10);
    while (!condition.test(this)) {
      long left = TimeUnit.NANOSECONDS.toMillis(end - System.nanoTime());
      if (left <= 0) {
        throw new AssertionError("waited in vain; out: " + out + ", err: " + err);
      }
      wait(left);
    }
  }
}
