package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Sets a page as plain text for a terminal. */
final class PlainPage {
  /** Columns that a table may take. */
  static final int WIDEST = 96;

  /** Columns of a paragraph. */
  static final int PROSE = 80;

  private static final String INDENT = "  ";

  private PlainPage() {}

  static String of(Page page) {
    List<String> lines = new ArrayList<>();
    if (!page.title().isEmpty()) {
      String title = page.title().text();
      lines.add(title);
      lines.add("═".repeat(Math.min(WIDEST, TextWidth.of(title))));
    }
    addBlocks(lines, page.blocks());
    return String.join("\n", lines);
  }

  private static void addBlocks(List<String> lines, List<Block> blocks) {
    Optional<Block> above = Optional.empty();
    for (Block block : blocks) {
      if (!lines.isEmpty() && !staysClose(above, block)) {
        lines.add("");
      }
      lines.addAll(lines(block));
      above = Optional.of(block);
    }
  }

  /** A title, a heading and what follows it stay together, and so do lines with a sign. */
  private static boolean staysClose(Optional<Block> above, Block block) {
    return above.map(a -> a instanceof Heading || (isSigned(a) && isSigned(block))).orElse(true)
        || block instanceof TrustLine;
  }

  private static boolean isSigned(Block block) {
    return block instanceof VerdictBlock || block instanceof TrustLine;
  }

  private static List<String> lines(Block block) {
    if (block instanceof Heading heading) {
      String text = heading.text().text();
      return List.of(text, "─".repeat(Math.min(WIDEST, TextWidth.of(text))));
    } else if (block instanceof Prose prose) {
      return TextWidth.wrapped(prose.text().text(), PROSE);
    } else if (block instanceof RelationBlock relation) {
      return List.of(INDENT + relation.relation().text());
    } else if (block instanceof Table table) {
      return PlainTable.lines(table);
    } else if (block instanceof PictureBlock picture) {
      return picture(picture);
    } else if (block instanceof VerdictBlock verdict) {
      return hanging(PlainEntries.line(verdict), verdict.verdict().standing().sign());
    } else if (block instanceof CautionBlock caution) {
      return hanging("Caution: " + caution.text().text(), "!");
    } else if (block instanceof Listing listing) {
      return listing.text().lines().map(Escape::visible).toList();
    } else if (block instanceof TrustLine trust) {
      return hanging("Trust: " + trust.text().text(), trust.standing().sign());
    } else if (block instanceof Fold fold) {
      return fold(fold);
    }
    throw new IllegalStateException("a block of an unknown kind: " + block.getClass());
  }

  private static List<String> picture(PictureBlock block) {
    String alternative = Escape.visible(block.picture().alternative());
    List<String> lines = new ArrayList<>(TextWidth.wrapped("[" + alternative + "]", PROSE));
    if (!block.caption().isEmpty()) {
      lines.addAll(TextWidth.wrapped(block.caption().text(), PROSE));
    }
    return lines;
  }

  /** A sign, then text beside it. */
  private static List<String> hanging(String text, String sign) {
    List<String> lines = new ArrayList<>();
    for (String line : TextWidth.wrapped(text, PROSE - 2)) {
      lines.add((lines.isEmpty() ? sign + " " : INDENT) + line);
    }
    return lines;
  }

  private static List<String> fold(Fold fold) {
    List<String> inner = new ArrayList<>();
    addBlocks(inner, fold.blocks());
    List<String> lines = new ArrayList<>();
    lines.add("▾ " + fold.summary().text());
    inner.forEach(line -> lines.add((INDENT + line).stripTrailing()));
    return lines;
  }
}
