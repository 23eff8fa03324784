package pinchoff.technology;

import java.util.List;
import pinchoff.source.Issue;

/**
 * A technology file that cannot be used, or something that was asked of a technology and is not in
 * it. The message names the file, every fault with its line and column, and what was expected.
 */
public final class TechnologyException extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final transient List<Issue> issues;

  TechnologyException(String message) {
    this(message, List.of());
  }

  TechnologyException(String message, List<Issue> issues) {
    super(message);
    this.issues = List.copyOf(issues);
  }

  /**
   * The faults in the order of their places; empty if the file could not be read at all.
   *
   * @return at most 50; the message says how many more there are
   */
  public List<Issue> issues() {
    return issues;
  }
}
