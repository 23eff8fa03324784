package pinchoff.technology;

import java.util.List;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.page.Column;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;

/**
 * In what two technologies differ. Layout, the order of keys and the spelling of units make no
 * difference; where a value comes from does.
 *
 * @param before name and short hash of the first
 * @param after name and short hash of the second
 * @param differences each value that differs, in the order of the first
 */
public record Comparison(String before, String after, List<Difference> differences)
    implements Displayable {

  /** Copies the list. */
  public Comparison {
    differences = List.copyOf(differences);
  }

  /** True if there is no difference. */
  public boolean isEmpty() {
    return differences.isEmpty();
  }

  /** The differences as a table: parameter, before, after, change. */
  public Table table() {
    Table.Builder table =
        Table.of(
            Column.of("parameter"), Column.of(before), Column.of(after), Column.of(Symbol.of("Δ")));
    for (Difference d : differences) {
      table.row(d.path(), d.before(), d.after(), d.change());
    }
    return table.build();
  }

  /** The differences as a page. */
  public Page page() {
    Page.Builder page = Page.titled("{} and {}", before, after);
    return isEmpty()
        ? page.prose("No difference.").build()
        : page.prose(
                "{} differ.", differences.size() == 1 ? "1 value" : differences.size() + " values")
            .table(table())
            .build();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }
}
