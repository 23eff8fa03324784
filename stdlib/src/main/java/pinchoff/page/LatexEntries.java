package pinchoff.page;

import java.util.Map;

/** Entries as LaTeX for a line of text. */
final class LatexEntries {
  private static final Map<Standing, String> SIGNS =
      Map.of(
          Standing.HOLDS, "\\(\\checkmark\\)",
          Standing.EDGE, "\\(\\approx\\)",
          Standing.FAILS, "\\(\\times\\)",
          Standing.UNKNOWN, "?");

  private LatexEntries() {}

  static String latex(Phrase phrase) {
    StringBuilder out = new StringBuilder();
    phrase.entries().forEach(entry -> out.append(latex(entry)));
    return out.toString();
  }

  static String latex(Entry entry) {
    if (entry instanceof Entry.Words words) {
      return Escape.latex(words.text());
    } else if (entry instanceof Entry.Notation notation) {
      return math(RelationLatex.of(notation.symbol()));
    } else if (entry instanceof Entry.Judgement judgement) {
      Verdict verdict = judgement.verdict();
      return sign(verdict.standing()) + " " + Escape.latex(verdict.statement());
    } else if (entry instanceof Entry.Formula formula) {
      return math(formula.relation().latex());
    } else if (entry instanceof Entry.Run run) {
      return latex(run.phrase());
    }
    return Figure.of(entry).map(figure -> math(figure.latex())).orElse("");
  }

  static String sign(Standing standing) {
    return SIGNS.getOrDefault(standing, "?");
  }

  static String math(String formula) {
    return formula.isEmpty() ? "" : "\\(" + formula + "\\)";
  }
}
