package pinchoff.formula;

import pinchoff.source.Issue;

/** Ends the reading of a line at its first fault. */
@SuppressWarnings("serial")
final class Refused extends RuntimeException {
  private final transient Issue issue;

  Refused(Issue issue) {
    super(issue.message(), null, false, false);
    this.issue = issue;
  }

  Issue issue() {
    return issue;
  }
}
