package pinchoff.kernel.eval;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.StatementTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.JavacTask;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.net.URI;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import javax.tools.Diagnostic;
import javax.tools.DiagnosticCollector;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** Parses pieces of Java without looking at what their names mean. */
final class JavaParser {
  private final JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
  private final StandardJavaFileManager files = compiler.getStandardFileManager(null, null, null);
  private final List<String> options;

  JavaParser(List<String> options) {
    this.options = List.copyOf(options);
  }

  /** A parsed file, if it has no syntax error. */
  Optional<CompilationUnitTree> file(String source) {
    DiagnosticCollector<JavaFileObject> problems = new DiagnosticCollector<>();
    CompilationUnitTree tree = parse(task(source, problems));
    boolean sound =
        problems.getDiagnostics().stream().noneMatch(d -> d.getKind() == Diagnostic.Kind.ERROR);
    return sound ? Optional.of(tree) : Optional.empty();
  }

  /** Parses a file and hands it on together with its documentation comments. */
  void withDocs(String source, BiConsumer<CompilationUnitTree, DocTrees> reader) {
    JavacTask task = task(source, new DiagnosticCollector<>());
    reader.accept(parse(task), DocTrees.instance(task));
  }

  private JavacTask task(String source, DiagnosticCollector<JavaFileObject> problems) {
    return (JavacTask)
        compiler.getTask(
            Writer.nullWriter(), files, problems, options, null, List.of(new Text(source)));
  }

  private static CompilationUnitTree parse(JavacTask task) {
    try {
      return task.parse().iterator().next();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Each text as the statements of a method body, where it can be one. */
  List<Optional<List<StatementTree>>> statements(List<String> texts) {
    if (texts.isEmpty()) {
      return List.of();
    }
    StringBuilder all = new StringBuilder("class $ {");
    for (String text : texts) {
      all.append("void $() {\n").append(text).append("\n}\n");
    }
    Optional<CompilationUnitTree> together = file(all.append("}").toString());
    if (together.isPresent()) {
      List<Optional<List<StatementTree>>> bodies = bodies(together.get());
      if (bodies.size() == texts.size()) {
        return bodies;
      }
    }
    if (texts.size() == 1) {
      return List.of(Optional.empty());
    }
    // One of them is no statement: halving finds it in few steps.
    int half = texts.size() / 2;
    List<Optional<List<StatementTree>>> each = new ArrayList<>(statements(texts.subList(0, half)));
    each.addAll(statements(texts.subList(half, texts.size())));
    return each;
  }

  /** Whether a text is an expression. */
  boolean isExpression(String text) {
    return JavaText.lastOf(text) != ';'
        && file("class $ {\nObject $ = (\n" + text + "\n);}").isPresent();
  }

  /** Whether a text that is no statement is a member of a class, an import or an expression. */
  boolean isJava(String text) {
    return file("class $ {\nObject $ =\n" + text + "\n;}").isPresent()
        || file("class $ {\n" + text + "\n}").isPresent()
        || file("class $ {\n" + text + "\n;}").isPresent()
        || file("class $ { void $() {\n" + text + "\n;}}").isPresent()
        || file(text + "\n").isPresent()
        || file(text + "\n;").isPresent();
  }

  private static List<Optional<List<StatementTree>>> bodies(CompilationUnitTree file) {
    List<Optional<List<StatementTree>>> bodies = new ArrayList<>();
    for (Tree type : file.getTypeDecls()) {
      if (!(type instanceof ClassTree c)) {
        continue;
      }
      for (Tree member : c.getMembers()) {
        if (member instanceof MethodTree m && m.getBody() != null) {
          bodies.add(Optional.of(List.copyOf(m.getBody().getStatements())));
        }
      }
    }
    return bodies;
  }

  /** Source held in memory. */
  private static final class Text extends SimpleJavaFileObject {
    private final String source;

    Text(String source) {
      super(URI.create("string:///Text.java"), Kind.SOURCE);
      this.source = source;
    }

    @Override
    public CharSequence getCharContent(boolean ignoreEncodingErrors) {
      return source;
    }
  }
}
