package pinchoff.source;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * Something wrong at a place in a text.
 *
 * @param severity how much it matters
 * @param span where
 * @param message what was found and what was expected, on one line
 * @param suggestion what the writer may have meant, for example {@code "did you mean V_OV?"}
 */
public record Issue(Severity severity, SourceSpan span, String message, Optional<String> suggestion)
    implements Comparable<Issue> {

  private static final int LONGEST_NAME = 200;
  private static final int LONGEST_SENTENCE = 1000;

  private static final Comparator<Issue> BY_PLACE =
      Comparator.comparing(Issue::span)
          .thenComparing(Issue::severity)
          .thenComparing(Issue::message);

  /** An error without a suggestion. */
  public static Issue error(SourceSpan span, String message) {
    return new Issue(Severity.ERROR, span, message, Optional.empty());
  }

  /** A warning without a suggestion. */
  public static Issue warning(SourceSpan span, String message) {
    return new Issue(Severity.WARNING, span, message, Optional.empty());
  }

  /** This issue with a suggestion. */
  public Issue withSuggestion(String text) {
    return new Issue(severity, span, message, Optional.of(text));
  }

  /** This issue with a suggestion if there is one. */
  public Issue withSuggestion(Optional<String> text) {
    return new Issue(severity, span, message, text);
  }

  /** Issues are in the order of their places, then of severity, then of their text. */
  @Override
  public int compareTo(Issue other) {
    return BY_PLACE.compare(this, other);
  }

  /** Message and suggestion on one line, without the place. */
  public String sentence() {
    return suggestion.map(s -> message + "; " + s).orElse(message);
  }

  /**
   * The issue in full: source name, line and column, severity and message, then the line of the
   * source with a caret under each character of the span. What could disturb a terminal is
   * replaced.
   *
   * @param source the text that the span belongs to
   */
  public String render(SourceText source) {
    String name = Excerpt.clip(source.name(), LONGEST_NAME);
    String text = Excerpt.clip(sentence(), LONGEST_SENTENCE);
    return name
        + ":"
        + span.start()
        + ": "
        + severity
        + ": "
        + text
        + "\n"
        + CaretLine.of(source, span);
  }

  /** All issues in full, sorted by place, with an empty line between them. */
  public static String renderAll(Collection<Issue> issues, SourceText source) {
    return issues.stream()
        .sorted()
        .map(issue -> issue.render(source))
        .collect(Collectors.joining("\n\n"));
  }
}
