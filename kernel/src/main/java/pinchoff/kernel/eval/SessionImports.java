package pinchoff.kernel.eval;

import java.io.IOException;
import java.io.InputStream;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
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
    for (URL resource : resources()) {
      List<String> lines = linesOf(resource);
      for (int i = 0; i < lines.size(); i++) {
        String line = lines.get(i).replaceFirst("#.*", "").strip();
        if (!line.isEmpty()) {
          preload(line, resource + ", line " + (i + 1));
        }
      }
    }
  }

  private void preload(String line, String where) {
    if (!line.startsWith("import ")) {
      log.accept(where + ": expected an import statement, found \"" + line + "\"");
      return;
    }
    CellText text = new CellText("session imports", line.endsWith(";") ? line : line + ";");
    Compiled compiled =
        compiler.compile(new CellUnit(text, 0, text.code(), "", CellUnit.Kind.ALONE));
    for (CompileProblem problem : compiled.errors()) {
      log.accept(where + ": " + problem.message());
    }
  }

  private List<URL> resources() {
    try {
      return Collections.list(compiler.loader().getResources(RESOURCE));
    } catch (IOException e) {
      log.accept(RESOURCE + " cannot be found: " + e.getMessage());
      return List.of();
    }
  }

  private List<String> linesOf(URL resource) {
    try (InputStream in = resource.openStream()) {
      return new ArrayList<>(
          new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList());
    } catch (IOException e) {
      log.accept(resource + " cannot be read: " + e.getMessage());
      return List.of();
    }
  }
}
