package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import pinchoff.page.Grid.Cell;
import pinchoff.page.Grid.Lane;

/** Sets a page as LaTeX for a document. */
final class LatexPage {
  private final List<String> lines = new ArrayList<>();

  private LatexPage() {}

  static String of(Page page) {
    Optional<Relation> relation = page.soleRelation();
    if (relation.isPresent()) {
      return "$\\displaystyle " + relation.get().latex() + "$";
    }
    LatexPage latex = new LatexPage();
    if (!page.title().isEmpty()) {
      latex.paragraph("\\textbf{\\large " + LatexEntries.latex(page.title()) + "}");
    }
    latex.add(page.blocks());
    return String.join("\n", latex.lines);
  }

  private void add(List<Block> blocks) {
    blocks.forEach(this::add);
  }

  private void add(Block block) {
    if (block instanceof Heading heading) {
      paragraph("\\textbf{" + LatexEntries.latex(heading.text()) + "}");
    } else if (block instanceof Prose prose) {
      paragraph(LatexEntries.latex(prose.text()));
    } else if (block instanceof RelationBlock relation) {
      lines.add("\\[ " + relation.relation().latex() + " \\]");
    } else if (block instanceof Table table) {
      addTable(table);
    } else if (block instanceof PictureBlock picture) {
      paragraph("[" + Escape.latex(picture.picture().alternative()) + "]");
      addUnlessEmpty(picture.caption());
    } else if (block instanceof VerdictBlock verdict) {
      String subject = LatexEntries.latex(verdict.subject());
      paragraph(
          LatexEntries.sign(verdict.verdict().standing())
              + " "
              + (subject.isEmpty() ? "" : subject + ": ")
              + Escape.latex(verdict.verdict().statement()));
    } else if (block instanceof CautionBlock caution) {
      paragraph("\\textbf{Caution:} " + LatexEntries.latex(caution.text()));
    } else if (block instanceof Listing listing) {
      listing
          .text()
          .lines()
          .forEach(l -> paragraph("\\texttt{" + Escape.latex(l).replace(" ", "~") + "}"));
    } else if (block instanceof TrustLine trust) {
      String sign = LatexEntries.sign(trust.standing());
      paragraph(sign + " Trust: " + LatexEntries.latex(trust.text()));
    } else if (block instanceof Fold fold) {
      paragraph("\\textit{" + LatexEntries.latex(fold.summary()) + "}");
      add(fold.blocks());
    } else {
      throw new IllegalStateException("a block of an unknown kind: " + block.getClass());
    }
  }

  private void paragraph(String text) {
    lines.add("\\noindent " + text + "\\par");
  }

  private void addUnlessEmpty(Phrase phrase) {
    if (!phrase.isEmpty()) {
      paragraph(LatexEntries.latex(phrase));
    }
  }

  private void addTable(Table table) {
    Grid grid = Grid.of(table);
    addUnlessEmpty(table.caption());
    lines.add(
        grid.columns().stream()
            .map(LatexPage::specification)
            .collect(Collectors.joining("", "\\begin{longtable}{", "}")));
    if (table.hasHeadings()) {
      lines.add(row(grid.columns().stream().map(LatexPage::heading).toList()) + " \\hline");
    }
    for (int r = 0; r < grid.rows().size(); r++) {
      addRow(grid, r);
    }
    lines.add("\\end{longtable}");
    if (grid.hidden() > 0) {
      paragraph("\\ldots{} and " + grid.hidden() + " more rows");
    }
    addUnlessEmpty(table.note());
  }

  private void addRow(Grid grid, int row) {
    if (grid.rows().get(row) instanceof Table.Row.Group group) {
      int span = grid.columns().stream().mapToInt(LatexPage::span).sum();
      String title = LatexEntries.latex(group.title());
      lines.add("\\multicolumn{" + span + "}{l}{\\textit{" + title + "}} \\\\");
    } else {
      lines.add(row(grid.columns().stream().map(lane -> cell(lane, row)).toList()));
    }
  }

  private static String row(List<String> cells) {
    return String.join(" & ", cells) + " \\\\";
  }

  /** A number takes two columns that meet at its decimal mark, and a third for its unit. */
  private static int span(Lane lane) {
    return lane.numeric() ? (lane.hasUnits() ? 3 : 2) : 1;
  }

  private static String specification(Lane lane) {
    if (lane.numeric()) {
      return lane.hasUnits() ? "r@{}l@{\\,}l" : "r@{}l";
    }
    return switch (lane.column().alignment()) {
      case START -> "l";
      case CENTER -> "c";
      case END -> "r";
    };
  }

  private static String heading(Lane lane) {
    String text = LatexEntries.latex(lane.column().heading());
    String unit = lane.shared().map(u -> u.latex()).orElse("");
    String full = unit.isEmpty() ? text : text + " (" + LatexEntries.math(unit) + ")";
    return lane.numeric() ? "\\multicolumn{" + span(lane) + "}{c}{" + full + "}" : full;
  }

  private static String cell(Lane lane, int row) {
    Cell cell = lane.cells().get(row);
    if (cell.figure().isPresent()) {
      return figure(lane, cell.figure().get());
    }
    String text = LatexEntries.latex(cell.entry());
    return lane.numeric() ? "\\multicolumn{" + span(lane) + "}{l}{" + text + "}" : text;
  }

  private static String figure(Lane lane, Figure figure) {
    String power = figure.power() == 0 ? "" : "\\times 10^{" + figure.power() + "}";
    String fraction = figure.fraction() + (lane.hasUnits() ? "" : power);
    String behind = lane.hasUnits() ? " & " + LatexEntries.math(figure.behindLatex()) : "";
    return LatexEntries.math(figure.whole()) + " & " + LatexEntries.math(fraction) + behind;
  }
}
