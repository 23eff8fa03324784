package pinchoff.formula;

import java.util.ArrayList;
import java.util.List;
import pinchoff.source.Issue;
import pinchoff.source.SourceText;

/** Reads a text line by line: a fault in one line does not hide those in others. */
final class Reader {
  private static final int MOST_STATEMENTS = 2000;

  private final SourceText source;
  private final List<Statement> statements = new ArrayList<>();
  private final List<Issue> issues = new ArrayList<>();

  Reader(SourceText source) {
    this.source = source;
  }

  Formulas read() {
    String text = source.text();
    int start = 0;
    for (int i = 0; i <= text.length(); i++) {
      if (i == text.length() || text.charAt(i) == '\n' || text.charAt(i) == '\r') {
        line(start, i);
        start = i + 1;
        if (statements.size() >= MOST_STATEMENTS) {
          issues.add(
              Issue.error(
                  source.span(i, i), "more than " + MOST_STATEMENTS + " formulas in one text"));
          break;
        }
      }
    }
    return new Formulas(source, statements, issues);
  }

  private void line(int start, int end) {
    int slashes = source.text().indexOf("//", start);
    int stop = slashes < 0 || slashes > end ? end : slashes;
    String reason = stop < end ? source.text().substring(stop + 2, end).strip() : "";
    if (source.text().substring(start, stop).isBlank()) {
      return;
    }
    try {
      statements.add(new StatementReader(new Cursor(source, start, stop), reason).read());
    } catch (Refused refused) {
      issues.add(refused.issue());
    }
  }
}
