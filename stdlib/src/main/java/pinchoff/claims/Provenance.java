package pinchoff.claims;

import java.util.Collection;
import java.util.Map;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.page.ValuesSheet;

/** What the results of a session rest on: versions, technology files, premises. */
public final class Provenance implements Displayable {
  private final Collection<Premise> premises;
  private final Map<String, String> technologies;

  private Provenance(Collection<Premise> premises, Map<String, String> technologies) {
    this.premises = premises;
    this.technologies = technologies;
  }

  /** What has been read in this session until now. */
  public static Provenance current() {
    return new Provenance(Register.ofThisHost().premises(), Host.current().technologies());
  }

  /** The tables. */
  public Page page() {
    Page.Builder page = Page.titled("What this rests on");
    page.table(Table.sheet().line("Java", Runtime.version().toString()));
    if (!technologies.isEmpty()) {
      Table.Builder table = Table.sheet();
      technologies.forEach(
          (name, hash) -> {
            table.line(name, hash);
            page.technology(name, hash);
          });
      page.table(table.caption("Technology files, with the hash of what they state"));
    }
    if (!premises.isEmpty()) {
      Table.Builder table = Table.sheet();
      for (Premise p : premises) {
        table.line(
            Symbol.of(p.name()),
            p.value(),
            p.overridden() ? "set from outside; usually " + p.standard() : "");
        page.premise(new ValuesSheet.Premise(p.name(), p.value(), p.overridden()));
      }
      page.table(table.caption("Premises"));
    }
    return page.build();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }
}
