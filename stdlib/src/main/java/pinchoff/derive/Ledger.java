package pinchoff.derive;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import pinchoff.formula.Expression;
import pinchoff.formula.Statement;
import pinchoff.formula.Typeset;
import pinchoff.page.Column;
import pinchoff.page.Entry;
import pinchoff.page.Page;
import pinchoff.page.Phrase;
import pinchoff.page.Relation;
import pinchoff.page.Relation.Sign;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.page.Verdict;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/** A derivation as it is shown. */
final class Ledger {
  private final Derivation derivation;
  private final Plan plan;
  private final double[] slots;
  private final double[][] gradients;

  Ledger(Derivation derivation) {
    this.derivation = derivation;
    this.plan = derivation.plan();
    this.slots = derivation.run().slots();
    this.gradients = Gradients.of(plan, slots);
  }

  Page page() {
    Page.Builder page = Page.titled("Derivation");
    if (!derivation.inputs().isEmpty()) {
      page.table(inputs());
    }
    page.table(steps(page));
    List<Issue> faults =
        derivation.issues().stream().filter(i -> !i.message().startsWith(Run.WAITS)).toList();
    if (!faults.isEmpty()) {
      page.listing(Issue.renderAll(faults, derivation.formulas().source()));
    }
    return page.build();
  }

  private Table inputs() {
    boolean errors = derivation.inputs().stream().anyMatch(i -> i.tolerance().isPresent());
    Table.Builder table = Table.sheet();
    for (Input input : derivation.inputs()) {
      Phrase origin =
          errors && input.tolerance().isPresent()
              ? Phrase.of("± {}; {}", input.tolerance().get(), input.origin())
              : Phrase.plain(input.origin());
      table.line(Symbol.of(input.name()), input.value(), origin);
    }
    return table.caption("Inputs").build();
  }

  private Table steps(Page.Builder page) {
    Table.Builder table =
        Table.of(
            Column.of("No.").atEnd(),
            Column.of("Because"),
            Column.of("Relation"),
            Column.of("Numbers"));
    int number = 0;
    for (Outcome outcome : derivation.steps()) {
      number++;
      Statement statement = outcome.statement();
      table.row(
          List.of(
              Entry.of(number),
              Entry.of(statement.reason()),
              Entry.of(relation(statement)),
              numbers(outcome)));
      value(outcome, number).ifPresent(page::value);
    }
    return table.build();
  }

  private static Phrase relation(Statement statement) {
    if (statement instanceof Statement.Definition d) {
      return Phrase.of("{}", Relation.equal(symbol(d.name()), d.value().relation()));
    } else if (statement instanceof Statement.Implicit i) {
      List<Object> parts = new ArrayList<>();
      parts.add(symbol(i.name()));
      parts.add(Relation.equal(i.left().relation(), i.right().relation()));
      i.conditions().forEach(c -> parts.add(comparison(c, Map.of())));
      return Phrase.of("{} such that {}" + ", {}".repeat(i.conditions().size()), parts.toArray());
    }
    return Phrase.of("{}", comparison((Statement.Check) statement, Map.of()));
  }

  private static Relation symbol(String name) {
    return new Relation.Name(Symbol.of(name));
  }

  private static Relation comparison(Statement.Check check, Map<String, Quantity> values) {
    return new Relation.Comparison(
        check.sides().stream().map(s -> set(s, values)).toList(), check.signs());
  }

  /** The expression with a number for each name that has one. */
  private static Relation set(Expression e, Map<String, Quantity> values) {
    return Typeset.with(
        e, name -> values.containsKey(name) ? Relation.amount(values.get(name)) : symbol(name));
  }

  private Map<String, Quantity> values(Statement statement) {
    Map<String, Quantity> values = new java.util.LinkedHashMap<>();
    for (String name : statement.names()) {
      if (plan.slots().containsKey(name) && !Double.isNaN(slots[plan.slot(name)])) {
        values.put(name, derivation.value(name));
      }
    }
    return values;
  }

  private Entry numbers(Outcome outcome) {
    if (!outcome.issues().isEmpty()) {
      boolean waits = outcome.issues().get(0).message().startsWith(Run.WAITS);
      String words = waits ? outcome.issues().get(0).message() : "see below";
      return Entry.of(Phrase.of("{}", Verdict.unknown().saying(words)));
    }
    Statement statement = outcome.statement();
    if (statement instanceof Statement.Definition d) {
      Quantity value = outcome.value().orElseThrow();
      boolean literal = d.value() instanceof Expression.Amount;
      boolean copied = d.value() instanceof Expression.Named;
      return Entry.of(
          literal || copied
              ? Relation.amount(value)
              : new Relation.Comparison(
                  List.of(set(d.value(), values(d)), Relation.amount(value)), List.of(Sign.EQUAL)));
    } else if (statement instanceof Statement.Implicit) {
      return solved(outcome);
    }
    Statement.Check check = (Statement.Check) statement;
    return Entry.of(
        Phrase.of("{} {}", comparison(check, values(check)), outcome.verdict().orElseThrow()));
  }

  private static Entry solved(Outcome outcome) {
    List<Object> parts = new ArrayList<>();
    StringBuilder template = new StringBuilder("{}");
    parts.add(outcome.value().orElseThrow());
    for (Outcome.RejectedRoot root : outcome.rejected()) {
      template.append("; not {}, since {}");
      parts.add(root.value());
      parts.add(root.reason());
    }
    return Entry.of(Phrase.of(template.toString(), parts.toArray()));
  }

  private java.util.Optional<Value> value(Outcome outcome, int number) {
    if (outcome.statement() instanceof Statement.Defines d) {
      return outcome
          .value()
          .map(
              v ->
                  sensitive(
                      Value.figure(d.name(), d.name(), v).from(outcome.statement().text()),
                      d.name()));
    }
    String text = outcome.statement().text();
    Verdict verdict = outcome.verdict().orElse(Verdict.unknown());
    return java.util.Optional.of(Value.verdict("check " + number, text, verdict).from(text));
  }

  private Value sensitive(Value value, String name) {
    Value result = value;
    double[] row = gradients[plan.slot(name)];
    int column = 0;
    for (Input input : derivation.inputs()) {
      double derivative = row[column++];
      if (derivative != 0 && Double.isFinite(derivative)) {
        result =
            result.sensitiveTo(
                input.name(),
                Quantity.ofSi(derivative, plan.dimension(name).per(input.value().dimension())));
      }
    }
    return result;
  }
}
