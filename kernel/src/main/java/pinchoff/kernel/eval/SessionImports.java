package pinchoff.kernel.eval;

import java.util.function.Consumer;

/**
 * The imports that each session starts with. Every jar and folder of the class path may ask for
 * some in a resource of Java import statements, one a line, with comments after {@code #}.
 */
final class SessionImports {
  static final String RESOURCE = "META-INF/pinchoff/session-imports";

  private final SnippetCompiler compiler;
  private final Consumer<String> log;

  SessionImports(SnippetCompiler compiler, Consumer<String> log) {
    this.compiler = compiler;
    this.log = log;
  }

  /** Evaluates all of them. A line that is no import, or names what is not there, is logged. */
  void preload() {
    ClassPathLines.of(compiler.loader(), RESOURCE, log).forEach(this::preload);
  }

  private void preload(ClassPathLines.Line line) {
    if (!line.text().startsWith("import ")) {
      log.accept(line.where() + ": expected an import statement, found \"" + line.text() + "\"");
      return;
    }
    String code = line.text().endsWith(";") ? line.text() : line.text() + ";";
    CellText text = new CellText("session imports", code);
    Compiled compiled = compiler.compile(new CellUnit(text, 0, code, "", CellUnit.Kind.ALONE));
    for (CompileProblem problem : compiled.errors()) {
      log.accept(line.where() + ": " + problem.message());
    }
  }
}
