package pinchoff.derive;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.formula.Expression;
import pinchoff.formula.Formulas;
import pinchoff.formula.Name;
import pinchoff.formula.NamedValue;
import pinchoff.formula.NamedValues;
import pinchoff.formula.Statement;
import pinchoff.page.Page;
import pinchoff.page.Standing;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;
import pinchoff.source.Issue;
import pinchoff.source.Suggestions;

/**
 * A derivation: formulas in trade notation, worked out step by step with units.
 *
 * <pre>
 * var d = derive("""
 *     V_OV       = sqrt(2*I_REF/(k_n*W/L))    // square law, saturation
 *     R_B [kohm] = (V_DD - V_TH - V_OV)/I_REF
 *     V_OV &gt;= 100 mV                          // strong inversion
 *     """).using(V_DD, I_REF);
 * d.value("R_B")
 * </pre>
 *
 * <p>Inputs are what {@link #using} supplies. A name that nobody supplies is looked up among the
 * variables of the session when the derivation is made, and listed with the value it had; {@code
 * q}, {@code k_B}, {@code eps_0} and {@code pi} are constants. {@link pinchoff.formula} says how
 * formulas are written. Immutable.
 */
public final class Derivation implements Displayable, NamedValues {
  private static final String SOURCE = "derivation";

  private final Formulas formulas;
  private final Map<String, Input> inputs;
  private final Plan plan;
  private final Run run;

  private Derivation(Formulas formulas, Map<String, Input> inputs) {
    this.formulas = formulas;
    this.inputs = new LinkedHashMap<>(inputs);
    Map<String, Dimension> dimensions = new LinkedHashMap<>();
    inputs.forEach((name, input) -> dimensions.put(name, input.value().dimension()));
    this.plan = Planner.plan(formulas, dimensions);
    this.run = Run.of(plan, values(this.inputs));
  }

  private static double[] values(Map<String, Input> inputs) {
    return inputs.values().stream().mapToDouble(i -> i.value().si()).toArray();
  }

  /**
   * Reads formulas and works them out with the variables of the session.
   *
   * @param text formulas, one to a line; faults are shown with the result, not thrown
   */
  public static Derivation of(String text) {
    Formulas formulas = Formulas.read(SOURCE, text);
    Map<String, Input> found = new LinkedHashMap<>();
    for (String written : freeNames(formulas)) {
      Surroundings.find(written).ifPresent(input -> found.put(input.name(), input));
    }
    return new Derivation(formulas, found);
  }

  /** Names that are used but not defined, as they are written, in order. */
  private static Set<String> freeNames(Formulas formulas) {
    Set<String> defined = new LinkedHashSet<>();
    Set<String> used = new LinkedHashSet<>();
    for (Statement statement : formulas.statements()) {
      if (statement instanceof Statement.Defines d) {
        defined.add(d.name());
      }
      for (Expression expression : statement.expressions()) {
        expression.walk(
            e -> {
              if (e instanceof Expression.Named named) {
                used.add(named.written());
              } else if (e instanceof Expression.Amount amount) {
                used.addAll(amount.joined()); // a unit that may have been meant as a name
              }
            });
      }
    }
    used.removeIf(written -> defined.contains(Name.canonical(written)));
    return used;
  }

  /**
   * The same derivation with more inputs; they take the place of variables of the session.
   *
   * @param suppliers premises, bias points ({@code op.as("1")}), other derivations
   * @throws DerivationException if a name is supplied twice
   */
  public Derivation using(NamedValues... suppliers) {
    Map<String, Input> all = new LinkedHashMap<>(inputs);
    for (NamedValues supplier : suppliers) {
      for (NamedValue v : supplier.namedValues()) {
        supply(all, v.name(), v.value(), v.origin());
      }
    }
    return new Derivation(formulas, needed(all));
  }

  /**
   * The same derivation with one more input.
   *
   * @throws DerivationException if the name is supplied already
   */
  public Derivation using(String name, Quantity value) {
    Map<String, Input> all = new LinkedHashMap<>(inputs);
    supply(all, name, value, "given");
    return new Derivation(formulas, needed(all));
  }

  /**
   * The same derivation with a temperature as an input, in kelvins.
   *
   * @throws DerivationException if the name is supplied already
   */
  public Derivation using(String name, Temperature value) {
    return using(name, Surroundings.kelvins(value));
  }

  private static void supply(Map<String, Input> all, String name, Quantity value, String origin) {
    if (!Name.isValid(name)) {
      throw new DerivationException(
          "\"" + name + "\" is no name that a formula can use: expected letters, digits and _");
    }
    String canonical = Name.canonical(name);
    Input before = all.get(canonical);
    boolean found =
        before != null
            && (before.origin().startsWith("variable") || before.origin().equals("constant"));
    if (before != null && !found) {
      throw new DerivationException(
          "%s is supplied twice: %s (%s) and %s (%s)"
              .formatted(name, before.value(), before.origin(), value, origin));
    }
    all.put(canonical, Input.of(canonical, value, origin));
  }

  /** Suppliers offer more than a derivation uses: what it does not use is left out. */
  private Map<String, Input> needed(Map<String, Input> all) {
    Set<String> used = new LinkedHashSet<>();
    freeNames(formulas).forEach(n -> used.add(Name.canonical(n)));
    formulas.statements().stream()
        .filter(Statement.Defines.class::isInstance)
        .map(s -> ((Statement.Defines) s).name())
        .forEach(used::add);
    Map<String, Input> kept = new LinkedHashMap<>(all);
    kept.keySet().retainAll(used);
    return kept;
  }

  /**
   * The same derivation with an input known only to within some error.
   *
   * @param name an input
   * @param plusMinus the error in either direction: in the input's own unit, or relative, for
   *     example {@code percent(10)}
   * @throws DerivationException if there is no such input, or the error is negative or of another
   *     dimension
   */
  public Derivation within(String name, Quantity plusMinus) {
    Input input = input(name);
    Quantity error =
        plusMinus.dimension().isNone() && !input.value().dimension().isNone()
            ? input.value().abs().times(plusMinus)
            : plusMinus;
    if (!error.dimension().equals(input.value().dimension()) || error.si() < 0) {
      throw new DerivationException(
          "%s = %s within %s: expected a positive number in percent or %s"
              .formatted(name, input.value(), plusMinus, input.value().dimension().description()));
    }
    Map<String, Input> all = new LinkedHashMap<>(inputs);
    all.put(input.name(), input.within(error));
    return new Derivation(formulas, all);
  }

  private Input input(String name) {
    Input input = inputs.get(Name.canonical(name));
    if (input == null) {
      throw new DerivationException(
          name
              + " is no input of this derivation"
              + Suggestions.didYouMean(name, inputs.keySet())
                  .map(hint -> "; " + hint)
                  .orElse(": expected one of " + String.join(", ", inputs.keySet())));
    }
    return input;
  }

  /** The inputs that are used, in order. */
  public List<Input> inputs() {
    return List.copyOf(inputs.values());
  }

  /** What became of each step, in order. */
  public List<Outcome> steps() {
    return List.copyOf(run.outcomes());
  }

  /** What is wrong, each with its place; a check that fails is not among them. */
  public List<Issue> issues() {
    List<Issue> all = new ArrayList<>(formulas.issues());
    run.outcomes().forEach(o -> all.addAll(o.issues()));
    all.sort(null);
    return all;
  }

  /** True if every step has its value and every check holds. */
  public boolean holds() {
    return issues().isEmpty()
        && run.outcomes().stream()
            .flatMap(o -> o.verdict().stream())
            .allMatch(v -> v.standing() != Standing.FAILS);
  }

  /**
   * The value of a step or an input.
   *
   * @param name as in the formulas
   * @throws DerivationException if there is none, or its step has a fault, with its place
   */
  public Quantity value(String name) {
    String canonical = Name.canonical(name);
    if (inputs.containsKey(canonical)) {
      return inputs.get(canonical).value();
    }
    Outcome outcome = step(canonical, name);
    return outcome
        .value()
        .orElseThrow(
            () ->
                new DerivationException(
                    name
                        + " has no value:\n"
                        + Issue.renderAll(outcome.issues(), formulas.source())));
  }

  private Outcome step(String canonical, String name) {
    for (Outcome outcome : run.outcomes()) {
      if (outcome.statement() instanceof Statement.Defines d && d.name().equals(canonical)) {
        return outcome;
      }
    }
    String faults =
        formulas.issues().isEmpty()
            ? ""
            : "\n" + Issue.renderAll(formulas.issues(), formulas.source());
    throw new DerivationException(
        name
            + " is not in this derivation"
            + Suggestions.didYouMean(name, plan.names())
                .map(hint -> "; " + hint)
                .orElse(": expected one of " + String.join(", ", plan.names()))
            + faults);
  }

  /** All results, for another derivation to use. */
  @Override
  public List<NamedValue> namedValues() {
    List<NamedValue> all = new ArrayList<>();
    for (Outcome outcome : run.outcomes()) {
      if (outcome.statement() instanceof Statement.Defines d) {
        outcome.value().ifPresent(v -> all.add(new NamedValue(d.name(), v, "derivation")));
      }
    }
    return all;
  }

  /**
   * How much a result depends on each input, the strongest first.
   *
   * @throws DerivationException if there is no such result
   */
  public Sensitivities sensitivities(String name) {
    return Sensitivities.of(this, Name.canonical(name), value(name));
  }

  /**
   * A result with the errors of the inputs, see {@link #within}.
   *
   * @throws DerivationException if there is no such result, or no input has an error
   */
  public Spread spread(String name) {
    return Spread.of(this, Name.canonical(name), value(name));
  }

  /**
   * The same derivation with another value of an input.
   *
   * @throws DerivationException if there is no such input, or the value measures something else
   */
  public Derivation with(String name, Quantity value) {
    Input input = input(name);
    value.requireDimension(name, input.value().dimension());
    Map<String, Input> all = new LinkedHashMap<>(inputs);
    all.put(input.name(), input.worth(value));
    return new Derivation(formulas, all);
  }

  /**
   * The derivation over a range of one input.
   *
   * @param name an input
   * @param from its first value
   * @param to its last value
   * @param points how many values, 2 to 10 000, in equal steps
   */
  public Sweep over(String name, Quantity from, Quantity to, int points) {
    return Sweep.of(this, input(name), from, to, points);
  }

  /**
   * The chain of steps that leads to a result, as a derivation of its own.
   *
   * @throws DerivationException if there is no such result
   */
  public Derivation explain(String name) {
    String canonical = Name.canonical(name);
    step(canonical, name);
    Set<String> wanted = new LinkedHashSet<>(Set.of(canonical));
    List<Statement> chain = new ArrayList<>();
    for (int i = formulas.statements().size() - 1; i >= 0; i--) {
      Statement statement = formulas.statements().get(i);
      if (statement instanceof Statement.Defines d && wanted.contains(d.name())) {
        chain.add(0, statement);
        wanted.addAll(statement.names());
      }
    }
    Map<String, Input> kept = new LinkedHashMap<>(inputs);
    kept.keySet().retainAll(wanted);
    return new Derivation(new Formulas(formulas.source(), chain, List.of()), kept);
  }

  /** The ledger: inputs with their origin, then each step with reason, relation and numbers. */
  public Page page() {
    return new Ledger(this).page();
  }

  /** The ledger as LaTeX. */
  public String latex() {
    return page().latex();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }

  /** The results in one line. */
  @Override
  public String toString() {
    List<String> parts = namedValues().stream().map(v -> v.name() + " = " + v.value()).toList();
    return "derivation: " + String.join(", ", parts);
  }

  /** Input values for a message. */
  String corner(double[] values) {
    List<String> parts = new ArrayList<>();
    for (Input input : inputs.values()) {
      parts.add(
          input.name() + " = " + Quantity.ofSi(values[parts.size()], input.value().dimension()));
    }
    return String.join(", ", parts);
  }

  Formulas formulas() {
    return formulas;
  }

  Plan plan() {
    return plan;
  }

  Run run() {
    return run;
  }

  Map<String, Input> inputMap() {
    return inputs;
  }
}
