package pinchoff.kernel.eval;

import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.CompletionInfo;

/** Decides whether a text can be run or its author is still typing. */
final class CompletenessCheck {
  private static final int INDENT = 4;

  private CompletenessCheck() {}

  static Completeness of(String code, SourceCodeAnalysis analysis) {
    String rest = code;
    while (true) {
      CompletionInfo info = analysis.analyzeCompletion(rest);
      switch (info.completeness()) {
        case COMPLETE, COMPLETE_WITH_SEMI, EMPTY -> {
          String remaining = info.remaining();
          if (remaining.isBlank() || remaining.length() >= rest.length()) {
            return new Completeness(Completeness.Status.COMPLETE, "");
          }
          rest = remaining;
        }
        case DEFINITELY_INCOMPLETE, CONSIDERED_INCOMPLETE -> {
          return new Completeness(Completeness.Status.INCOMPLETE, indentAfter(code));
        }
        default -> {
          return new Completeness(Completeness.Status.INVALID, "");
        }
      }
    }
  }

  /** Four spaces for each bracket that is open. */
  private static String indentAfter(String code) {
    int open = 0;
    for (char c : JavaText.masked(code).toCharArray()) {
      if ("({[".indexOf(c) >= 0) {
        open++;
      } else if (")}]".indexOf(c) >= 0) {
        open--;
      }
    }
    return " ".repeat(Math.max(0, open) * INDENT);
  }
}
