package pinchoff.page;

import java.util.List;
import java.util.stream.Collectors;

/** Entries as plain text. */
final class PlainEntries {
  private PlainEntries() {}

  static String text(Phrase phrase) {
    return phrase.entries().stream().map(PlainEntries::text).collect(Collectors.joining());
  }

  static String text(List<Entry> entries) {
    return entries.stream().map(PlainEntries::text).collect(Collectors.joining(" "));
  }

  /** What a verdict block says, without its sign. */
  static String line(VerdictBlock block) {
    String statement = Escape.visible(block.verdict().statement());
    return block.subject().isEmpty() ? statement : block.subject().text() + ": " + statement;
  }

  static String text(Entry entry) {
    if (entry instanceof Entry.Words words) {
      return Escape.visible(words.text());
    } else if (entry instanceof Entry.Notation notation) {
      return Escape.visible(notation.symbol().text());
    } else if (entry instanceof Entry.Judgement judgement) {
      return judgement.verdict().text();
    } else if (entry instanceof Entry.Formula formula) {
      return formula.relation().text();
    } else if (entry instanceof Entry.Run run) {
      return text(run.phrase());
    }
    return Figure.of(entry).map(Figure::text).orElse("");
  }
}
