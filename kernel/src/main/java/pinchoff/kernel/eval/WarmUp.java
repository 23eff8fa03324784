package pinchoff.kernel.eval;

import java.lang.reflect.InvocationTargetException;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import jdk.jshell.Snippet;

/**
 * Makes the virtual machine load and compile what the first cells will need. Everything that it
 * declares is dropped again, and it gives way to a cell that wants to run.
 *
 * <p>Libraries may add statements of their own in a resource, one a line, with comments after
 * {@code #}; these are run too.
 */
final class WarmUp {
  static final String RESOURCE = "META-INF/pinchoff/session-warm-up";

  private static final String OWN =
      """
      1 + 1;
      var $warm1 = java.util.List.of(1.5, 2.5);
      double $warm2(double x) { return StrictMath.sqrt(x); }
      record $Warm3(String name, double value) {}
      { int i = 0; i += 1; }
      $warm2($warm1.get(0));
      new $Warm3("name", $warm2(2)).name();
      $warm1.stream().mapToDouble(x -> x).sum();
      """;

  private final SnippetCompiler compiler;
  private final JavaParser parser;
  private final Consumer<String> log;
  private final BooleanSupplier disturbed;
  private final List<Snippet> made = new ArrayList<>();

  WarmUp(
      SnippetCompiler compiler,
      JavaParser parser,
      Consumer<String> log,
      BooleanSupplier disturbed) {
    this.compiler = compiler;
    this.parser = parser;
    this.log = log;
    this.disturbed = disturbed;
  }

  void run() {
    try {
      evaluate(OWN);
      compiler.analyse(a -> a.completionSuggestions("$warm1.", 7, new int[1]).size());
      for (ClassPathLines.Line line : ClassPathLines.of(compiler.loader(), RESOURCE, log)) {
        evaluate(line.text());
      }
    } finally {
      made.forEach(compiler::drop);
    }
  }

  private void evaluate(String code) {
    CellText text = new CellText("warm-up", code);
    List<CellUnit> units = compiler.analyse(a -> new CellSplitter(a).split(text));
    for (CellUnit unit : CellPlan.classify(units, parser)) {
      if (disturbed.getAsBoolean()) {
        return;
      }
      Compiled compiled = compiler.compile(unit);
      made.addAll(compiled.snippets());
      compiled.errors().forEach(e -> log.accept("warm-up: " + e.message() + ": " + unit.text()));
      compiled.steps().forEach(this::run);
    }
  }

  private void run(Compiled.Step step) {
    try {
      ValueDisplay.of(step.method().invoke(null));
    } catch (InvocationTargetException | IllegalAccessException e) {
      log.accept("warm-up: " + step.snippet().source() + ": " + e.getCause());
    }
  }
}
