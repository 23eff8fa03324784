package pinchoff.kernel.eval;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;

/**
 * Runs cells in this process, so that their values are real objects.
 *
 * <p>Creating one replaces the process's standard streams and its {@link Host}; closing it puts
 * back what was there. One at a time in a process.
 */
public final class JShellEvaluator implements CellEvaluator {
  /** All that is known, also of several methods of one name. */
  private static final int FULL = 1;

  private final OutputRouter router = new OutputRouter();
  private final SnippetCompiler compiler;
  private final JavaParser parser = new JavaParser(SnippetCompiler.languageLevel());
  private final Completer completer;
  private final Inspector inspector;
  private final Consumer<String> log;
  private final SessionHost host;
  private final Host previousHost;
  private final ErrorReport report;

  /** One cell at a time. */
  private final ReentrantLock running = new ReentrantLock();

  private volatile @Nullable CellThread thread;

  private JShellEvaluator(EvaluatorOptions options) {
    compiler = new SnippetCompiler(options.classPath(), JShellEvaluator.class.getClassLoader());
    JavadocIndex library = new JavadocIndex(options.classPath(), parser);
    completer = new Completer(compiler, library);
    inspector = new Inspector(compiler, library);
    log = options.log();
    report = new ErrorReport(compiler.frames());
    host =
        new SessionHost(
            compiler.variables(),
            options.premises(),
            name -> inspector.inspect(name, name.length(), FULL));
    previousHost = Host.install(host);
    router.install();
  }

  /** An evaluator with the imports that the class path asks for. */
  public static JShellEvaluator create(EvaluatorOptions options) {
    JShellEvaluator evaluator = new JShellEvaluator(options);
    new SessionImports(evaluator.compiler, options.log()).preload();
    return evaluator;
  }

  /** An evaluator with the standard options. */
  public static JShellEvaluator create() {
    return create(EvaluatorOptions.standard());
  }

  @Override
  public CellOutcome run(Cell cell, CellOutput output) {
    return run(CellText.of(cell), output);
  }

  @Override
  public CellOutcome express(String expression, CellOutput output) {
    if (!parser.isExpression(expression)) {
      String message = "expected an expression, found: " + expression;
      return new CellOutcome.Failure("CompileError", message, List.of(message));
    }
    return run(new CellText("expression", expression), output);
  }

  private CellOutcome run(CellText text, CellOutput output) {
    running.lock();
    try {
      CellGuard.forgetFinished();
      router.install();
      CellScope scope = new CellScope(text, output, this::reportUncaught);
      scope.begin();
      try (CellThread cellThread = new CellThread(scope, compiler.loader())) {
        thread = cellThread;
        return new CellRun(compiler, parser, scope, cellThread).outcome();
      } finally {
        thread = null;
        scope.settle();
      }
    } finally {
      running.unlock();
    }
  }

  private void reportUncaught(CellScope scope, Thread failed, Throwable thrown) {
    String lines = String.join("\n", report.ofThrown(thrown).traceback());
    scope
        .output()
        .write(CellOutput.Stream.ERR, "in thread \"" + failed.getName() + "\": " + lines + "\n");
  }

  @Override
  public void interrupt() {
    CellThread current = thread;
    if (current != null) {
      StopLadder.begin(current);
    }
  }

  /** The technology files that cells have read: name to hash of the content. */
  public Map<String, String> technologies() {
    return host.technologies();
  }

  /** How many declarations are alive, imports apart. */
  long declarations() {
    return compiler.inquire(
        shell -> shell.snippets().filter(s -> shell.status(s).isActive()).count());
  }

  @Override
  public Completeness completeness(String code) {
    return compiler.analyse(analysis -> CompletenessCheck.of(code, analysis));
  }

  @Override
  public Completions complete(String code, int cursor) {
    return completer.complete(code, clamp(cursor, code));
  }

  @Override
  public Optional<MimeBundle> inspect(String code, int cursor, int detail) {
    return inspector.inspect(code, clamp(cursor, code), detail);
  }

  private static int clamp(int cursor, String code) {
    return Math.max(0, Math.min(cursor, code.length()));
  }

  /**
   * Makes the first cells quick. To be called once, after the evaluator is created, on a thread of
   * its own; stops early when a cell runs, and leaves nothing behind in the session.
   */
  public void warmUp() {
    new WarmUp(compiler, parser, log, () -> running.isLocked() || running.hasQueuedThreads()).run();
  }

  @Override
  public void close() {
    interrupt();
    router.close();
    Host.install(previousHost);
    compiler.close();
  }
}
