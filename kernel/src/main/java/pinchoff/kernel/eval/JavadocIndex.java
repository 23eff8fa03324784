package pinchoff.kernel.eval;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.TreePathScanner;
import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.jar.JarFile;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * The Javadoc of libraries that carry their own sources as resources below {@value #ROOT}, in
 * folders as their packages say. The list of files is read at the first question, each file when it
 * is asked for.
 */
final class JavadocIndex {
  static final String ROOT = "META-INF/pinchoff/sources/";

  private final String classPath;
  private final JavaParser parser;
  private final Map<String, Map<String, String>> docs = new ConcurrentHashMap<>();
  private volatile @Nullable Map<String, Source> sources;

  JavadocIndex(String classPath, JavaParser parser) {
    this.classPath = classPath;
    this.parser = parser;
  }

  /** A place that a source file can be read from. */
  private interface Source {
    String read() throws IOException;
  }

  /** Whether a library has a type of this simple name. */
  boolean knowsType(String simpleName) {
    return sources().containsKey(simpleName);
  }

  /** The text about a type. */
  Optional<String> ofType(String simpleName) {
    return Optional.ofNullable(docsOf(simpleName).get(""));
  }

  /**
   * The text about a method.
   *
   * @param parameters how many it has
   */
  Optional<String> ofMethod(String simpleTypeName, String method, int parameters) {
    return Optional.ofNullable(docsOf(simpleTypeName).get(method + "/" + parameters));
  }

  /** The text about a constant or a record's component. */
  Optional<String> ofField(String simpleTypeName, String field) {
    return Optional.ofNullable(docsOf(simpleTypeName).get(field));
  }

  private Map<String, String> docsOf(String simpleTypeName) {
    Source source = sources().get(simpleTypeName);
    if (source == null) {
      return Map.of();
    }
    return docs.computeIfAbsent(simpleTypeName, name -> read(source));
  }

  private Map<String, String> read(Source source) {
    try {
      Map<String, String> found = new HashMap<>();
      parser.withDocs(source.read(), (file, trees) -> new Collector(trees, found).scan(file, null));
      return found;
    } catch (IOException e) {
      return Map.of();
    }
  }

  private Map<String, Source> sources() {
    Map<String, Source> known = sources;
    if (known == null) {
      known = new HashMap<>();
      for (String entry : List.of(classPath.split(File.pathSeparator))) {
        try {
          list(Path.of(entry), known);
        } catch (IOException | RuntimeException e) {
          // A class path may name what is not there: then there is nothing to read in it.
        }
      }
      sources = known;
    }
    return known;
  }

  private static void list(Path entry, Map<String, Source> into) throws IOException {
    if (Files.isDirectory(entry.resolve(ROOT))) {
      try (Stream<Path> files = Files.walk(entry.resolve(ROOT))) {
        files
            .filter(file -> file.toString().endsWith(".java"))
            .sorted()
            .forEach(
                file ->
                    into.putIfAbsent(simpleName(file.toString()), () -> Files.readString(file)));
      }
    } else if (Files.isRegularFile(entry)) {
      try (JarFile jar = new JarFile(entry.toFile())) {
        jar.stream()
            .map(e -> e.getName())
            .filter(name -> name.startsWith(ROOT) && name.endsWith(".java"))
            .sorted()
            .forEach(name -> into.putIfAbsent(simpleName(name), () -> readFromJar(entry, name)));
      }
    }
  }

  private static String readFromJar(Path jarFile, String name) throws IOException {
    try (JarFile jar = new JarFile(jarFile.toFile());
        InputStream in = jar.getInputStream(jar.getJarEntry(name))) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  private static String simpleName(String path) {
    String file = path.substring(1 + Math.max(path.lastIndexOf('/'), path.lastIndexOf('\\')));
    return file.substring(0, file.length() - ".java".length());
  }

  /**
   * Gathers the comments of one file: "" for the type, name for a field, name/count for a method.
   */
  private static final class Collector extends TreePathScanner<@Nullable Void, @Nullable Void> {
    private final DocTrees trees;
    private final Map<String, String> into;

    Collector(DocTrees trees, Map<String, String> into) {
      this.trees = trees;
      this.into = into;
    }

    @Override
    public @Nullable Void visitClass(ClassTree node, @Nullable Void p) {
      note(into.isEmpty() ? "" : node.getSimpleName().toString());
      return super.visitClass(node, null);
    }

    @Override
    public @Nullable Void visitMethod(MethodTree node, @Nullable Void p) {
      note(node.getName() + "/" + node.getParameters().size());
      return null;
    }

    @Override
    public @Nullable Void visitVariable(VariableTree node, @Nullable Void p) {
      note(node.getName().toString());
      return null;
    }

    private void note(String key) {
      String comment = trees.getDocComment(getCurrentPath());
      if (comment != null) {
        into.putIfAbsent(key, JavadocText.plain(comment));
      }
    }
  }
}
