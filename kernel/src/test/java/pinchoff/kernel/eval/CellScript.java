package pinchoff.kernel.eval;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import pinchoff.display.MimeBundle;

/** A session under test, and a small language of what its cells should do. */
final class CellScript implements AutoCloseable {
  final List<String> log = Collections.synchronizedList(new ArrayList<>());
  final JShellEvaluator evaluator;
  private int cells;

  CellScript() {
    this(Map.of());
  }

  CellScript(Map<String, String> premises) {
    evaluator =
        JShellEvaluator.create(
            EvaluatorOptions.standard().withPremises(premises).withLog(log::add));
  }

  /** Runs a cell to its end. */
  Ran cell(String code) {
    RecordedOutput output = new RecordedOutput();
    return new Ran(code, evaluator.run(new Cell(++cells, code), output), output);
  }

  /** Runs a cell that asks for lines. */
  Ran cellWithAnswers(String code, String... answers) {
    RecordedOutput output = new RecordedOutput();
    List.of(answers).forEach(output::willAnswer);
    return new Ran(code, evaluator.run(new Cell(++cells, code), output), output);
  }

  /** Starts a cell and comes back at once. */
  Running start(String code) {
    RecordedOutput output = new RecordedOutput();
    Cell cell = new Cell(++cells, code);
    return new Running(
        code,
        output,
        CompletableFuture.supplyAsync(() -> evaluator.run(cell, output), CellScript::onThread));
  }

  private static void onThread(Runnable task) {
    Thread thread = new Thread(task, "session under test");
    thread.setDaemon(true);
    thread.start();
  }

  @Override
  public void close() {
    evaluator.close();
  }

  /** A cell that runs. */
  record Running(String code, RecordedOutput output, CompletableFuture<CellOutcome> outcome) {

    Ran end() throws InterruptedException {
      try {
        return new Ran(code, outcome.get(10, TimeUnit.SECONDS), output);
      } catch (ExecutionException | TimeoutException e) {
        throw new AssertionError(code + " did not come back", e);
      }
    }
  }

  /** A cell that has ended. */
  record Ran(String code, CellOutcome outcome, RecordedOutput output) {

    Optional<MimeBundle> result() {
      if (outcome instanceof CellOutcome.Success s) {
        return s.result();
      }
      return fail(code + " failed: " + outcome);
    }

    CellOutcome.Failure failure() {
      return assertInstance(outcome);
    }

    private CellOutcome.Failure assertInstance(CellOutcome o) {
      assertTrue(o instanceof CellOutcome.Failure, () -> code + " did not fail: " + o);
      return (CellOutcome.Failure) o;
    }

    Ran shows(String text) {
      assertEquals(Optional.of(text), result().map(MimeBundle::plainText), code);
      return this;
    }

    Ran showsNothing() {
      assertEquals(Optional.empty(), result(), code);
      return this;
    }

    Ran prints(String text) {
      assertEquals(text, output.out(), () -> code + " -> " + outcome);
      return this;
    }

    Ran complains(String part) {
      assertTrue(output.err().contains(part), () -> code + " -> " + output.err() + outcome);
      return this;
    }

    Ran isQuiet() {
      assertEquals("", output.err(), code);
      return this;
    }

    Ran failsWith(String name, String messagePart) {
      CellOutcome.Failure failure = failure();
      assertEquals(name, failure.name(), () -> code + " -> " + failure);
      assertTrue(failure.message().contains(messagePart), () -> code + " -> " + failure);
      return this;
    }

    /** The first place that the report names. */
    Ran at(int line, int column) {
      String first =
          failure().traceback().stream().filter(l -> l.startsWith("at ")).findFirst().orElse("");
      String wanted = "line " + line + ", column " + column;
      assertTrue(first.matches(".*\\b" + wanted + "\\b.*"), () -> code + " -> " + failure());
      return this;
    }

    Ran reports(String part) {
      String all = String.join("\n", failure().traceback());
      assertTrue(all.contains(part), () -> code + " -> " + all);
      return this;
    }

    Ran doesNotReport(String part) {
      String all = String.join("\n", failure().traceback());
      assertFalse(all.contains(part), () -> code + " -> " + all);
      return this;
    }
  }
}
