package pinchoff.derive;

import java.util.List;
import pinchoff.formula.Code;
import pinchoff.formula.Statement;
import pinchoff.source.Issue;

/** A step as it will be run. */
sealed interface Planned {

  Statement statement();

  /** A step that cannot be run. */
  record Faulty(Statement statement, List<Issue> issues) implements Planned {}

  /** A step that has nothing wrong but needs one that cannot be run. */
  record Waiting(Statement statement, String missing) implements Planned {}

  /** A formula for a slot. */
  record Computed(Statement.Definition statement, Code code, int slot) implements Planned {}

  /** An equation for a slot. */
  record Solved(Statement.Implicit statement, Equation equation, int slot) implements Planned {}

  /** A comparison of sides. */
  record Compared(Statement.Check statement, Comparison comparison) implements Planned {}
}
