package pinchoff.derive;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import pinchoff.formula.Code;
import pinchoff.formula.Dimensions;
import pinchoff.formula.Expression;
import pinchoff.formula.Formulas;
import pinchoff.formula.Operator;
import pinchoff.formula.Statement;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Unit;
import pinchoff.source.Issue;

/** Makes a plan of formulas: names first, then dimensions, then code. */
final class Planner {
  /** What an unknown may measure, if nothing else among the known quantities fits. */
  private static final List<Dimension> COMMON =
      List.of(
          Dimension.VOLTAGE,
          Dimension.CURRENT,
          Dimension.RESISTANCE,
          Dimension.CONDUCTANCE,
          Dimension.LENGTH,
          Dimension.NONE,
          Dimension.CAPACITANCE,
          Dimension.FREQUENCY,
          Dimension.TIME,
          Dimension.POWER,
          Dimension.TEMPERATURE,
          Dimension.TRANSCONDUCTANCE_PARAMETER,
          Dimension.ROOT_VOLTAGE,
          Dimension.PER_VOLTAGE,
          Dimension.INDUCTANCE,
          Dimension.CHARGE);

  private static final int MOST_NAMED = 3;

  private final Map<String, Integer> slots = new LinkedHashMap<>();
  private final Map<String, Dimension> dimensions = new LinkedHashMap<>();
  private final Map<String, Integer> firstDefinition = new HashMap<>();
  private final Set<String> broken = new HashSet<>();
  private final List<Planned> steps = new ArrayList<>();
  private final int inputs;

  private Planner(Map<String, Dimension> given) {
    given.forEach(this::declare);
    this.inputs = given.size();
  }

  static Plan plan(Formulas formulas, Map<String, Dimension> inputs) {
    Planner planner = new Planner(inputs);
    List<Statement> statements = formulas.statements();
    for (int i = 0; i < statements.size(); i++) {
      if (statements.get(i) instanceof Statement.Defines d) {
        planner.firstDefinition.putIfAbsent(d.name(), d.target().span().start().line());
      }
    }
    statements.forEach(planner::add);
    return new Plan(planner.inputs, planner.slots, planner.dimensions, planner.steps);
  }

  private int declare(String name, Dimension dimension) {
    int slot = slots.size();
    slots.put(name, slot);
    dimensions.put(name, dimension);
    return slot;
  }

  private void add(Statement statement) {
    List<Issue> issues = new ArrayList<>(names(statement));
    Optional<String> missing = statement.names().stream().filter(broken::contains).findFirst();
    Planned planned;
    if (!issues.isEmpty()) {
      planned = new Planned.Faulty(statement, issues);
    } else if (missing.isPresent()) {
      planned = new Planned.Waiting(statement, missing.get());
    } else {
      planned = compile(statement, issues);
    }
    if (statement instanceof Statement.Defines d && !slots.containsKey(d.name())) {
      broken.add(d.name());
    }
    steps.add(planned);
  }

  /** Definitions twice, before they are known, or of themselves. */
  private List<Issue> names(Statement statement) {
    List<Issue> issues = new ArrayList<>();
    if (statement instanceof Statement.Defines d) {
      if (slots.containsKey(d.name()) || broken.contains(d.name())) {
        boolean given = slots.getOrDefault(d.name(), inputs) < inputs;
        issues.add(
            Issue.error(
                d.target().span(),
                d.target().written()
                    + (given
                        ? " is an input already: choose another name, or leave out the input"
                        : " is defined already in line " + firstDefinition.get(d.name()))));
      }
    }
    for (Expression expression : statement.expressions()) {
      expression.walk(
          e -> {
            if (e instanceof Expression.Named n) {
              early(statement, n).ifPresent(issues::add);
            }
          });
    }
    return issues;
  }

  private Optional<Issue> early(Statement statement, Expression.Named use) {
    String name = use.name();
    if (slots.containsKey(name) || broken.contains(name) || !firstDefinition.containsKey(name)) {
      return Optional.empty();
    }
    if (statement instanceof Statement.Defines d && d.name().equals(name)) {
      return d instanceof Statement.Implicit
          ? Optional.empty()
          : Optional.of(
              Issue.error(
                  use.span(),
                  "%s is defined by itself: write \"%s such that … = …\" to solve for it"
                      .formatted(use.written(), use.written())));
    }
    return Optional.of(
        Issue.error(
            use.span(),
            use.written()
                + " is used before it is defined in line "
                + firstDefinition.get(name)
                + ": move that line up; if each needs the other, solve with \"such that\""));
  }

  private Planned compile(Statement statement, List<Issue> issues) {
    if (statement instanceof Statement.Definition d) {
      return definition(d, issues);
    } else if (statement instanceof Statement.Implicit i) {
      return equation(i, issues);
    }
    Statement.Check check = (Statement.Check) statement;
    return comparison(check, dimensions, issues)
        .<Planned>map(c -> new Planned.Compared(check, c))
        .orElseGet(() -> new Planned.Faulty(check, issues));
  }

  private Planned definition(Statement.Definition d, List<Issue> issues) {
    Optional<Dimension> dimension = new Dimensions(dimensions, issues).of(d.value());
    if (dimension.isPresent() && fits(d, dimension.get(), issues)) {
      Code code = Code.of(d.value(), slots::get);
      return new Planned.Computed(d, code, declare(d.name(), dimension.get()));
    }
    return new Planned.Faulty(d, issues);
  }

  private static boolean fits(Statement.Defines d, Dimension found, List<Issue> issues) {
    Optional<Unit> unit = d.unit().filter(u -> !u.dimension().equals(found));
    unit.ifPresent(
        u ->
            issues.add(
                Issue.error(
                    d.target().span(),
                    "%s is to be shown in %s, which is %s, but the formula gives %s"
                        .formatted(
                            d.target().written(),
                            u.ascii(),
                            u.dimension().description(),
                            found.description()))));
    return unit.isEmpty();
  }

  private Optional<Comparison> comparison(
      Statement.Check check, Map<String, Dimension> known, List<Issue> issues) {
    Dimensions dims = new Dimensions(known, issues);
    boolean alike = true;
    for (int i = 0; i + 1 < check.sides().size(); i++) {
      alike &=
          dims.alike(
              check.sides().get(i), check.sides().get(i + 1), check.span(), "to compare them");
    }
    return alike
        ? Optional.of(
            new Comparison(
                check,
                dims.of(check.sides().get(0)).orElseThrow(),
                check.sides().stream().map(s -> Code.of(s, slots::get)).toList()))
        : Optional.empty();
  }

  private Planned equation(Statement.Implicit i, List<Issue> issues) {
    Set<Dimension> candidates = new LinkedHashSet<>();
    if (i.unit().isPresent()) {
      candidates.add(i.unit().get().dimension());
    } else {
      candidates.addAll(dimensions.values());
      candidates.addAll(COMMON);
    }
    List<Dimension> fitting = candidates.stream().filter(c -> check(i, c).isEmpty()).toList();
    if (fitting.size() != 1) {
      issues.addAll(unclear(i, candidates, fitting));
      return new Planned.Faulty(i, issues);
    }
    Dimension dimension = fitting.get(0);
    List<Integer> relatives =
        dimensions.entrySet().stream()
            .filter(e -> e.getValue().equals(dimension))
            .map(e -> slots.get(e.getKey()))
            .toList();
    int slot = declare(i.name(), dimension);
    List<Comparison> conditions =
        i.conditions().stream().map(c -> comparison(c, dimensions, issues).orElseThrow()).toList();
    Expression residual =
        new Expression.Binary(i.span(), i.span(), Operator.MINUS, i.left(), i.right());
    Code code = Code.of(residual, slots::get);
    return new Planned.Solved(
        i, new Equation(i, code, slot, dimension, conditions, relatives), slot);
  }

  /** What would be wrong with an equation if its unknown measured this. */
  private List<Issue> check(Statement.Implicit i, Dimension candidate) {
    List<Issue> issues = new ArrayList<>();
    Map<String, Dimension> known = new LinkedHashMap<>(dimensions);
    known.put(i.name(), candidate);
    Dimensions dims = new Dimensions(known, issues);
    dims.alike(i.left(), i.right(), i.span(), "on both sides of the equation");
    for (Statement.Check condition : i.conditions()) {
      for (int k = 0; k + 1 < condition.sides().size(); k++) {
        dims.alike(
            condition.sides().get(k),
            condition.sides().get(k + 1),
            condition.span(),
            "to compare them");
      }
    }
    return issues;
  }

  private List<Issue> unclear(
      Statement.Implicit i, Set<Dimension> candidates, List<Dimension> fitting) {
    if (fitting.isEmpty() && candidates.size() == 1) {
      return check(i, candidates.iterator().next());
    }
    List<Issue> unknown =
        check(i, Dimension.VOLTAGE).stream()
            .filter(issue -> issue.message().endsWith(" is unknown"))
            .toList();
    if (!unknown.isEmpty()) {
      return unknown;
    }
    String name = i.target().written();
    return List.of(
        Issue.error(
            i.target().span(),
            fitting.isEmpty()
                ? "no kind of quantity for %s makes both sides of the equation alike; give its unit in brackets to see why: %s [V] such that …"
                    .formatted(name, name)
                : "%s could be %s; give its unit in brackets: %s [V] such that …"
                    .formatted(
                        name,
                        fitting.stream()
                            .limit(MOST_NAMED)
                            .map(Dimension::description)
                            .collect(
                                Collectors.joining(
                                    " or ", "", fitting.size() > MOST_NAMED ? " or other" : "")),
                        name)));
  }
}
