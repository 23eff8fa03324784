package pinchoff.derive;

import java.util.List;
import java.util.Optional;
import pinchoff.formula.Statement;
import pinchoff.page.Verdict;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/**
 * What became of one step.
 *
 * @param statement the step
 * @param value what it defines, if it could be found
 * @param verdict how its check came out, if it is one
 * @param rejected roots that the conditions of the step rule out
 * @param issues what is wrong with it, each with its place
 */
public record Outcome(
    Statement statement,
    Optional<Quantity> value,
    Optional<Verdict> verdict,
    List<RejectedRoot> rejected,
    List<Issue> issues) {

  /**
   * A root that was found and ruled out.
   *
   * @param value the root
   * @param reason the condition that it breaks
   */
  public record RejectedRoot(Quantity value, String reason) {}

  /** Copies the lists. */
  public Outcome {
    rejected = List.copyOf(rejected);
    issues = List.copyOf(issues);
  }

  static Outcome of(Statement statement, List<Issue> issues) {
    return new Outcome(statement, Optional.empty(), Optional.empty(), List.of(), issues);
  }

  /** True if nothing is wrong with it; a check that fails is nothing wrong. */
  public boolean isComplete() {
    return issues.isEmpty();
  }
}
