package pinchoff.kernel.session;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import pinchoff.display.MimeBundle;
import pinchoff.kernel.eval.Cell;
import pinchoff.kernel.eval.CellEvaluator;
import pinchoff.kernel.eval.CellOutcome;
import pinchoff.kernel.eval.CellOutput;
import pinchoff.kernel.eval.CellOutput.Stream;
import pinchoff.kernel.eval.Completeness;
import pinchoff.kernel.eval.Completions;

/**
 * Runs cells of a tiny language, one word and its argument a line: print, err, show, display,
 * update, clear, value, fail, block, ask, secret, repeat, later, broken, overflow.
 */
public final class FakeEvaluator implements CellEvaluator {
  /** All that was run, in order. */
  public final List<String> ran = Collections.synchronizedList(new ArrayList<>());

  /** What lets the threads of {@code later} go on. */
  public final CountDownLatch gate = new CountDownLatch(1);

  private volatile Thread running;

  @Override
  public CellOutcome run(Cell cell, CellOutput output) {
    ran.add(cell.code());
    running = Thread.currentThread();
    Optional<MimeBundle> value = Optional.empty();
    try {
      for (String line : cell.code().split("\n")) {
        int space = line.indexOf(' ');
        String word = space < 0 ? line : line.substring(0, space);
        String rest = space < 0 ? "" : line.substring(space + 1);
        switch (word) {
          case "value" -> value = Optional.of(MimeBundle.text(rest));
          case "fail" -> {
            return new CellOutcome.Failure("Planned", rest, List.of("Planned: " + rest));
          }
          default -> step(word, rest, output);
        }
      }
      return new CellOutcome.Success(value);
    } catch (InterruptedException e) {
      return new CellOutcome.Failure("Interrupted", "", List.of("Interrupted"));
    } catch (IllegalStateException e) {
      return new CellOutcome.Failure("NoInput", e.getMessage(), List.of(e.getMessage()));
    } finally {
      running = null;
      Thread.interrupted();
    }
  }

  private void step(String word, String rest, CellOutput output) throws InterruptedException {
    switch (word) {
      case "print" -> output.write(Stream.OUT, rest + "\n");
      case "err" -> output.write(Stream.ERR, rest + "\n");
      case "show" -> output.publish(Optional.empty(), MimeBundle.text(rest));
      case "display" -> output.publish(Optional.of("spot"), MimeBundle.text(rest));
      case "update" -> output.update("spot", MimeBundle.text(rest));
      case "clear" -> output.clear(true);
      case "block" -> new CountDownLatch(1).await();
      case "ask" -> output.write(Stream.OUT, "got " + output.ask(rest, false));
      case "secret" -> output.write(Stream.OUT, "got " + output.ask(rest, true));
      case "repeat" -> {
        for (int i = 0; i < Integer.parseInt(rest); i++) {
          output.write(Stream.OUT, "line " + i + "\n");
        }
      }
      case "large" -> output.write(Stream.OUT, "x".repeat(Integer.parseInt(rest)));
      case "later" -> later(rest, output);
      case "broken" -> throw new UnsupportedOperationException("broken evaluator");
      case "overflow" -> throw new StackOverflowError();
      default -> throw new AssertionError("no such word: " + word);
    }
  }

  private void later(String text, CellOutput output) {
    Thread thread =
        new Thread(
            () -> {
              try {
                gate.await();
                output.write(Stream.OUT, text);
              } catch (InterruptedException e) {
                Thread.currentThread().interrupt();
              }
            });
    thread.setDaemon(true);
    thread.start();
  }

  @Override
  public CellOutcome express(String expression, CellOutput output) {
    return expression.startsWith("bad")
        ? new CellOutcome.Failure("Planned", expression, List.of())
        : new CellOutcome.Success(Optional.of(MimeBundle.text("<" + expression + ">")));
  }

  @Override
  public void interrupt() {
    Thread thread = running;
    if (thread != null) {
      thread.interrupt();
    }
  }

  @Override
  public Completeness completeness(String code) {
    return code.endsWith("{")
        ? new Completeness(Completeness.Status.INCOMPLETE, "  ")
        : new Completeness(Completeness.Status.COMPLETE, "");
  }

  @Override
  public Completions complete(String code, int cursor) {
    if (code.startsWith("broken")) {
      throw new IllegalArgumentException("no completion of \"" + code + "\"");
    }
    return cursor == 0
        ? new Completions(0, 0, List.of())
        : new Completions(
            cursor - 1, cursor, List.of(new Completions.Item("width()", "function", "()")));
  }

  @Override
  public Optional<MimeBundle> inspect(String code, int cursor, int detail) {
    return cursor > 0
        ? Optional.of(MimeBundle.text(code.substring(0, cursor) + "|" + detail))
        : Optional.empty();
  }

  @Override
  public void close() {
    gate.countDown();
  }
}
