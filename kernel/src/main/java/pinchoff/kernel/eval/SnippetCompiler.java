package pinchoff.kernel.eval;

import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Function;
import java.util.stream.Collectors;
import jdk.jshell.DeclarationSnippet;
import jdk.jshell.JShell;
import jdk.jshell.Snippet;
import jdk.jshell.SnippetEvent;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.VarSnippet;
import jdk.jshell.spi.ExecutionControl;
import jdk.jshell.spi.ExecutionControlProvider;
import jdk.jshell.spi.ExecutionEnv;

/**
 * The compiler of a session, with all declarations that are alive. It compiles and loads; it never
 * runs user code. One lock guards it, held for one unit at a time, so that completion and help are
 * answered between two units and while a cell runs.
 */
final class SnippetCompiler implements AutoCloseable {
  private final ReentrantLock lock = new ReentrantLock();
  private final CellClassLoader loader;
  private final DeferredControl control;
  private final JShell shell;
  private final FrameMap frames = new FrameMap();
  private final SessionVariables variables = new SessionVariables();

  /** Snippet id to where it was written; declarations are compiled anew when others change. */
  private final Map<String, Origin> origins = new HashMap<>();

  private record Origin(CellUnit unit, int shift) {}

  SnippetCompiler(String classPath, ClassLoader parent) {
    loader = new CellClassLoader(parent);
    control = new DeferredControl(loader);
    List<String> options = new ArrayList<>(List.of("-classpath", classPath));
    options.addAll(languageLevel());
    shell =
        JShell.builder()
            .executionEngine(new Provider(control), Map.of())
            .compilerOptions(options.toArray(String[]::new))
            .build();
  }

  /**
   * Cells are written in Java 17 on every JDK. The option that also hides newer classes costs 150
   * ms for each unit, so only the language is held.
   */
  static List<String> languageLevel() {
    return Runtime.version().feature() == 17
        ? List.of()
        : List.of("-source", "17", "-Xlint:-options");
  }

  ClassLoader loader() {
    return loader;
  }

  FrameMap frames() {
    return frames;
  }

  SessionVariables variables() {
    return variables;
  }

  /** Asks the compiler's analyser something, with the lock held. */
  <T> T analyse(Function<SourceCodeAnalysis, T> question) {
    lock.lock();
    try {
      return question.apply(shell.sourceCodeAnalysis());
    } finally {
      lock.unlock();
    }
  }

  /** Asks something about the declarations, with the lock held. */
  <T> T inquire(Function<JShell, T> question) {
    lock.lock();
    try {
      return question.apply(shell);
    } finally {
      lock.unlock();
    }
  }

  /** Compiles a unit and loads it. */
  Compiled compile(CellUnit unit) {
    return compile(unit.compilable(), unit, 0);
  }

  /** Compiles neighbours as one block. */
  Compiled compileTogether(List<CellUnit> run) {
    CellUnit first = run.get(0);
    int end = run.get(run.size() - 1).end();
    String text = first.cell().code().substring(first.start(), end);
    CellUnit all = new CellUnit(first.cell(), first.start(), text, "", CellUnit.Kind.PLAIN);
    return compile("{" + text + "\n}", all, -1);
  }

  /** Whether the compiler too finds no Java in a unit. */
  boolean isErroneous(CellUnit unit) {
    return analyse(
        a ->
            a.sourceToSnippets(unit.compilable()).stream()
                .anyMatch(s -> s.kind() == Snippet.Kind.ERRONEOUS));
  }

  /** What the method that was compiled to a class still waits for, in a sentence. */
  Optional<String> unresolvedIn(String className) {
    return inquire(
        s ->
            s.snippets()
                .filter(snippet -> s.status(snippet) == Snippet.Status.RECOVERABLE_DEFINED)
                .filter(snippet -> className.startsWith(classNameOf(snippet)))
                .map(DeclarationSnippet.class::cast)
                .map(d -> d.name() + " cannot run until there is: " + missing(d))
                .findFirst());
  }

  /** Forgets a declaration. */
  void drop(Snippet snippet) {
    lock.lock();
    try {
      if (!shell.status(snippet).isActive()) {
        return;
      }
      shell.drop(snippet);
      origins.remove(snippet.id());
      if (snippet instanceof VarSnippet v) {
        variables.removed(v.name());
      }
    } finally {
      lock.unlock();
    }
  }

  private Compiled compile(String text, CellUnit unit, int shift) {
    lock.lock();
    try {
      control.takeDeferred();
      List<SnippetEvent> events = shell.eval(text);
      Map<String, Method> methods =
          control.takeDeferred().stream()
              .collect(Collectors.toMap(m -> m.getDeclaringClass().getName(), m -> m));
      List<Compiled.Step> steps = new ArrayList<>();
      List<CompileProblem> problems = new ArrayList<>();
      List<String> notes = new ArrayList<>();
      for (SnippetEvent event : events) {
        if (event.causeSnippet() == null) {
          problems.addAll(problemsOf(event.snippet(), unit, shift));
          declared(event, unit, shift, problems, notes);
          Method method = methods.get(classNameOf(event.snippet()));
          if (method != null) {
            steps.add(new Compiled.Step(event.snippet(), method));
          }
        } else {
          dependant(event, notes);
        }
      }
      boolean failed = problems.stream().anyMatch(CompileProblem::error);
      List<Snippet> snippets =
          events.stream().filter(e -> e.causeSnippet() == null).map(SnippetEvent::snippet).toList();
      return new Compiled(failed ? List.of() : steps, snippets, problems, notes);
    } finally {
      lock.unlock();
    }
  }

  private List<CompileProblem> problemsOf(Snippet snippet, CellUnit unit, int shift) {
    return shell
        .diagnostics(snippet)
        .map(diag -> CompileProblem.of(diag, unit, shift))
        .collect(Collectors.toCollection(ArrayList::new));
  }

  private String classNameOf(Snippet snippet) {
    return shell.sourceCodeAnalysis().wrapper(snippet).fullClassName();
  }

  /** The unit itself is alive, or cannot be yet. */
  private void declared(
      SnippetEvent event,
      CellUnit unit,
      int shift,
      List<CompileProblem> problems,
      List<String> notes) {
    Snippet snippet = event.snippet();
    switch (event.status()) {
      case VALID, RECOVERABLE_DEFINED -> {
        frames.record(shell.sourceCodeAnalysis().wrapper(snippet), unit, shift);
        if (snippet instanceof DeclarationSnippet d) {
          origins.put(snippet.id(), new Origin(unit, shift));
          if (event.status() == Snippet.Status.RECOVERABLE_DEFINED) {
            notes.add(d.name() + " cannot run until there is: " + missing(d));
          }
        }
        if (snippet instanceof VarSnippet v) {
          load(classNameOf(v)).ifPresent(holder -> variables.declared(v.name(), holder));
        }
      }
      case RECOVERABLE_NOT_DEFINED -> {
        if (!(snippet instanceof DeclarationSnippet declaration)) {
          problems.add(rejected(unit));
          return;
        }
        String missing = missing(declaration);
        if (snippet instanceof VarSnippet) {
          shell.drop(snippet);
          String message = "cannot find symbol: " + missing;
          problems.add(new CompileProblem(true, "cant.resolve", message, unit, 0));
        } else {
          origins.put(snippet.id(), new Origin(unit, shift));
          notes.add(nameOf(snippet) + " cannot be used until there is: " + missing);
        }
      }
      default -> {
        if (problems.isEmpty()) {
          problems.add(rejected(unit));
        }
      }
    }
  }

  /** The compiler gives no reason, as when a unit is too large for it. */
  private static CompileProblem rejected(CellUnit unit) {
    return new CompileProblem(true, "rejected", "this cannot be compiled", unit, 0);
  }

  /** An earlier declaration was compiled anew, or has lost what it needs. */
  private void dependant(SnippetEvent event, List<String> notes) {
    Snippet snippet = event.snippet();
    boolean alive = event.status().isActive() && event.status().isDefined();
    Origin origin = origins.get(snippet.id());
    if (alive && origin != null) {
      frames.record(shell.sourceCodeAnalysis().wrapper(snippet), origin.unit(), origin.shift());
    }
    if (!(snippet instanceof VarSnippet v)) {
      return;
    }
    if (alive) {
      Optional<Class<?>> holder = load(classNameOf(v));
      if (holder.isPresent() && !variables.moved(v.name(), holder.get())) {
        notes.add(
            v.name()
                + " has lost its value, because its type has changed: run the cell that declares"
                + " it again");
      }
    } else if (event.status() == Snippet.Status.RECOVERABLE_NOT_DEFINED) {
      variables.removed(v.name());
      notes.add(
          v.name()
              + " can no longer be used, because what it is declared with has changed: run the"
              + " cell that declares it again");
    }
  }

  private Optional<Class<?>> load(String className) {
    try {
      return Optional.of(loader.loadClass(className));
    } catch (ClassNotFoundException e) {
      return Optional.empty();
    }
  }

  private String missing(DeclarationSnippet snippet) {
    return shell.unresolvedDependencies(snippet).collect(Collectors.joining(", "));
  }

  private static String nameOf(Snippet snippet) {
    return snippet instanceof DeclarationSnippet d ? d.name() : snippet.source();
  }

  @Override
  public void close() {
    lock.lock();
    try {
      shell.close();
    } finally {
      lock.unlock();
    }
  }

  private record Provider(DeferredControl control) implements ExecutionControlProvider {

    @Override
    public String name() {
      return "pinchoff";
    }

    @Override
    public ExecutionControl generate(ExecutionEnv environment, Map<String, String> parameters) {
      return control;
    }
  }
}
