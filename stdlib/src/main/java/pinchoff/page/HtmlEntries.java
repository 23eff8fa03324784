package pinchoff.page;

import java.util.Locale;

/** Entries as HTML, with elements that survive the cleaning of outputs that are not trusted. */
final class HtmlEntries {
  private HtmlEntries() {}

  static String html(Phrase phrase) {
    StringBuilder out = new StringBuilder();
    phrase.entries().forEach(entry -> out.append(html(entry)));
    return out.toString();
  }

  static String html(Entry entry) {
    if (entry instanceof Entry.Words words) {
      return Escape.html(words.text());
    } else if (entry instanceof Entry.Notation notation) {
      return html(notation.symbol());
    } else if (entry instanceof Entry.Judgement judgement) {
      return html(judgement.verdict());
    } else if (entry instanceof Entry.Formula formula) {
      return formula(formula.relation());
    } else if (entry instanceof Entry.Run run) {
      return html(run.phrase());
    }
    return Figure.of(entry).map(Figure::html).orElse("");
  }

  /**
   * A formula in a box as wide as it will be: front ends that set formulas by themselves break
   * lines at the width that they find.
   */
  private static String formula(Relation relation) {
    return String.format(
        Locale.ROOT,
        "<span class=\"pinchoff-formula\" style=\"min-width:%.1fem\">%s</span>",
        RelationWidth.of(relation),
        RelationMathMl.inline(relation));
  }

  static String html(Symbol symbol) {
    StringBuilder out = new StringBuilder();
    for (Symbol.Atom atom : symbol.atoms()) {
      out.append(Escape.html(atom.lead()));
      String base = Escape.html(atom.base());
      out.append(atom.italic() ? "<i>" + base + "</i>" : base);
      out.append(atom.primed() ? "′" : "");
      if (!atom.subscript().isEmpty()) {
        out.append("<sub>").append(Escape.html(atom.subscript())).append("</sub>");
      }
    }
    return out.toString();
  }

  static String html(Verdict verdict) {
    return "<span class=\"pinchoff-verdict\">"
        + sign(verdict.standing())
        + " "
        + Escape.html(verdict.statement())
        + "</span>";
  }

  /** The sign of a standing; its colour says nothing that the sign does not. */
  static String sign(Standing standing) {
    String name = standing.name().toLowerCase(Locale.ROOT);
    return "<b class=\"pinchoff-sign pinchoff-"
        + name
        + "\">"
        + Escape.html(standing.sign())
        + "</b>";
  }
}
