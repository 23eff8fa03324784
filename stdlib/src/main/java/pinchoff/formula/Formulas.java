package pinchoff.formula;

import java.util.List;
import pinchoff.source.Issue;
import pinchoff.source.SourceText;
import pinchoff.source.TextLimits;

/**
 * Lines of formulas as they were read.
 *
 * @param source the text
 * @param statements what could be read, in order
 * @param issues what could not, each with its place
 */
public record Formulas(SourceText source, List<Statement> statements, List<Issue> issues) {

  /** Copies the lists. */
  public Formulas {
    statements = List.copyOf(statements);
    issues = List.copyOf(issues);
  }

  /** Reads lines of formulas; never throws for what the text contains. */
  public static Formulas read(String name, String text) {
    SourceText source = SourceText.of(name, text);
    return TextLimits.FORMULA
        .checkLength(source)
        .map(issue -> new Formulas(source, List.of(), List.of(issue)))
        .orElseGet(() -> new Reader(source).read());
  }
}
