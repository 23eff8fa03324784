package pinchoff.technology;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.source.Issue;
import pinchoff.source.SourceText;

/** Collects what is wrong with a file, up to a number that nobody reads beyond. */
final class Faults {

  /** How many faults are reported in full. */
  static final int MOST = 50;

  private final SourceText source;
  private final List<Issue> issues = new ArrayList<>();
  private int unreported;

  Faults(SourceText source) {
    this.source = source;
  }

  SourceText source() {
    return source;
  }

  void add(Place place, String message) {
    add(place, message, Optional.empty());
  }

  void add(Place place, String message, Optional<String> suggestion) {
    if (issues.size() == MOST) {
      unreported++;
      return;
    }
    issues.add(
        Issue.error(source.span(place.start(), place.end()), message).withSuggestion(suggestion));
  }

  /** Line and column of an offset, unless nobody will read it. */
  String where(int offset) {
    return issues.size() == MOST ? "" : source.position(offset).toString();
  }

  boolean none() {
    return issues.isEmpty();
  }

  /** Throws if there is any fault. */
  void throwAny() {
    if (!none()) {
      throw exception();
    }
  }

  /** All faults in one report, in the order of their places. */
  TechnologyException exception() {
    int count = issues.size() + unreported;
    StringBuilder report = new StringBuilder(source.name());
    report.append(count == 1 ? ": 1 fault" : ": " + count + " faults").append("\n\n");
    report.append(Issue.renderAll(issues, source));
    if (unreported > 0) {
      report.append("\n\n").append(unreported).append(" more not shown");
    }
    return new TechnologyException(report.toString(), issues.stream().sorted().toList());
  }
}
