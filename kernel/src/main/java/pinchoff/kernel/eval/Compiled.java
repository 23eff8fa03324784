package pinchoff.kernel.eval;

import java.lang.reflect.Method;
import java.util.List;
import jdk.jshell.Snippet;

/**
 * A unit, or several in one block, after the compiler: nothing of it has run.
 *
 * @param steps what to run, in order
 * @param snippets what the compiler knows it by
 * @param problems errors, in which case there is nothing to run, and warnings
 * @param notes what the reader should know of side effects on earlier declarations
 */
record Compiled(
    List<Step> steps, List<Snippet> snippets, List<CompileProblem> problems, List<String> notes) {

  /** Copies the lists. */
  Compiled {
    steps = List.copyOf(steps);
    snippets = List.copyOf(snippets);
    problems = List.copyOf(problems);
    notes = List.copyOf(notes);
  }

  /** One method to run, and the snippet that it belongs to. */
  record Step(Snippet snippet, Method method) {

    /** Whether the method returns a value that a cell could show, as opposed to a declaration's. */
    boolean isExpression() {
      return snippet.kind() == Snippet.Kind.EXPRESSION
          || snippet.subKind() == Snippet.SubKind.TEMP_VAR_EXPRESSION_SUBKIND;
    }

    /** Whether the compiler made up a variable to hold the value. */
    boolean isTemporary() {
      return snippet.subKind() == Snippet.SubKind.TEMP_VAR_EXPRESSION_SUBKIND;
    }
  }

  List<CompileProblem> errors() {
    return problems.stream().filter(CompileProblem::error).toList();
  }

  boolean failed() {
    return !errors().isEmpty();
  }
}
