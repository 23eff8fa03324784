package pinchoff.kernel.eval;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import jdk.jshell.VarSnippet;
import jdk.jshell.spi.SPIResolutionException;
import org.jspecify.annotations.Nullable;
import pinchoff.display.MimeBundle;

/**
 * One run of one cell: compiles its units in order, runs what they compile to, stops at a failure.
 */
final class CellRun {
  private static final String STOPPED = "The cell was stopped on request.";

  private final SnippetCompiler compiler;
  private final JavaParser parser;
  private final CellScope scope;
  private final CellThread thread;
  private final ErrorReport report;
  private Optional<MimeBundle> result = Optional.empty();

  CellRun(SnippetCompiler compiler, JavaParser parser, CellScope scope, CellThread thread) {
    this.compiler = compiler;
    this.parser = parser;
    this.scope = scope;
    this.thread = thread;
    this.report = new ErrorReport(compiler.frames());
  }

  /** Ends the run with a report. */
  private static final class Failed extends Exception {
    private static final long serialVersionUID = 1L;
    private final transient CellOutcome.Failure failure;

    Failed(CellOutcome.Failure failure) {
      super(failure.message());
      this.failure = failure;
    }
  }

  CellOutcome outcome() {
    try {
      List<CellUnit> units = compiler.analyse(a -> new CellSplitter(a).split(scope.text()));
      units = CellPlan.classify(units, parser);
      refuseBroken(units);
      List<List<CellUnit>> runs = CellPlan.runs(units);
      for (int i = 0; i < runs.size(); i++) {
        run(runs.get(i), i == runs.size() - 1);
      }
      return new CellOutcome.Success(result);
    } catch (Failed e) {
      return e.failure;
    }
  }

  /** Syntax errors anywhere in the cell are reported before anything of it has run. */
  private void refuseBroken(List<CellUnit> units) throws Failed {
    for (CellUnit unit : units) {
      if (unit.kind() == CellUnit.Kind.BROKEN && compiler.isErroneous(unit)) {
        refuseErrors(compiler.compile(unit));
      }
    }
  }

  private void run(List<CellUnit> run, boolean last) throws Failed {
    if (run.size() == 1) {
      runUnit(run.get(0), last);
      return;
    }
    checkStopped();
    Compiled block = compiler.compileTogether(run);
    if (!block.failed()) {
      runSteps(block, false);
    } else if (block.errors().stream().allMatch(CellRun::onlyInBlocks)) {
      for (int i = 0; i < run.size(); i++) {
        runUnit(run.get(i), last && i == run.size() - 1);
      }
    } else {
      refuseErrors(block);
    }
  }

  /** Errors that neighbours make for each other, or that only their number makes. */
  private static boolean onlyInBlocks(CompileProblem problem) {
    String code = problem.code();
    return code.contains("unreachable")
        || code.contains("initializer.must.be.able")
        || code.contains("limit.code")
        || code.equals("rejected")
        || code.contains("already.defined");
  }

  private void runUnit(CellUnit unit, boolean last) throws Failed {
    checkStopped();
    Compiled compiled = compiler.compile(unit);
    refuseErrors(compiled);
    runSteps(compiled, last && unit.showsValue());
  }

  private void refuseErrors(Compiled compiled) throws Failed {
    if (compiled.failed()) {
      throw new Failed(ErrorReport.ofProblems(compiled.errors()));
    }
  }

  private void runSteps(Compiled compiled, boolean show) throws Failed {
    tell(compiled);
    for (Compiled.Step step : compiled.steps()) {
      try {
        runStep(step, show && step.isExpression());
      } catch (Failed e) {
        if (step.snippet() instanceof VarSnippet v) {
          compiler.drop(v);
        }
        throw e;
      } finally {
        if (step.isTemporary()) {
          compiler.drop(step.snippet());
        }
      }
    }
  }

  private void runStep(Compiled.Step step, boolean show) throws Failed {
    checkStopped();
    try {
      Done done = thread.call(() -> runOnThread(step.method(), show));
      if (done.failure != null) {
        throw new Failed(done.failure);
      }
      result = done.shown;
    } catch (Failed e) {
      throw e;
    } catch (CellThread.LeftBehind e) {
      throw new Failed(ErrorReport.interrupted(String.valueOf(e.getMessage())));
    } catch (Throwable t) {
      checkStopped();
      throw new Failed(report.ofThrown(t));
    }
    checkStopped();
  }

  /** What came of a step: exactly one of a failure and perhaps something to show. */
  private record Done(CellOutcome.@Nullable Failure failure, Optional<MimeBundle> shown) {}

  /** Runs on the cell's own thread, as does all user code that showing its value may call. */
  private Done runOnThread(Method method, boolean show) {
    try {
      Object value = method.invoke(null);
      return new Done(null, show ? ValueDisplay.of(value) : Optional.empty());
    } catch (InvocationTargetException e) {
      Throwable thrown = e.getCause() == null ? e : e.getCause();
      if (scope.isStopped()) {
        return new Done(ErrorReport.interrupted(STOPPED), Optional.empty());
      }
      return new Done(report.ofThrown(explained(thrown)), Optional.empty());
    } catch (IllegalAccessException e) {
      throw new IllegalStateException(e);
    }
  }

  private Throwable explained(Throwable thrown) {
    if (!(thrown instanceof SPIResolutionException unresolved)) {
      return thrown;
    }
    for (StackTraceElement frame : unresolved.getStackTrace()) {
      Optional<String> missing = compiler.unresolvedIn(frame.getClassName());
      if (missing.isPresent()) {
        return new UnresolvedReference(missing.get(), unresolved.getStackTrace());
      }
    }
    return thrown;
  }

  private void checkStopped() throws Failed {
    if (scope.isStopped()) {
      throw new Failed(ErrorReport.interrupted(STOPPED));
    }
  }

  private void tell(Compiled compiled) {
    List<String> lines = new ArrayList<>();
    for (CompileProblem problem : compiled.problems()) {
      if (!problem.error()) {
        lines.add("warning: " + problem.message() + " (" + problem.place().inWords() + ")");
      }
    }
    for (String note : compiled.notes()) {
      lines.add("note: " + note);
    }
    if (!lines.isEmpty()) {
      scope.output().write(CellOutput.Stream.ERR, String.join("\n", lines) + "\n");
    }
  }
}
