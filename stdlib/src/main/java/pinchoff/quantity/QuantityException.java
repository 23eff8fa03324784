package pinchoff.quantity;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.source.Issue;
import pinchoff.source.SourceText;

/**
 * A number, unit or dimension that cannot be used. The message names the value, its unit, what was
 * expected and, for text, the place with a caret.
 */
public final class QuantityException extends IllegalArgumentException {
  private final String message;
  private final transient @Nullable Issue issue;

  /** An error without a place in a text. */
  public QuantityException(String message) {
    this(message, null);
  }

  /** An error at a place in a text; the message is the issue in full. */
  public QuantityException(Issue issue, SourceText source) {
    this(issue.render(source), issue);
  }

  private QuantityException(String message, @Nullable Issue issue) {
    super(message);
    this.message = message;
    this.issue = issue;
  }

  @Override
  public String getMessage() {
    return message;
  }

  /** What is wrong and where, if the error is in a text. */
  public Optional<Issue> issue() {
    return Optional.ofNullable(issue);
  }
}
