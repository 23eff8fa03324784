package pinchoff.derive;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import pinchoff.formula.Code;
import pinchoff.formula.Dimensions;
import pinchoff.formula.Statement;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/** One evaluation of a plan. */
final class Run {
  /** How the message of a step begins that has nothing wrong itself. */
  static final String WAITS = "not evaluated";

  private final Plan plan;
  private final Dimensions dimensions;
  private final double[] slots;
  private final List<Outcome> outcomes = new ArrayList<>();

  private Run(Plan plan, double[] inputs) {
    this.plan = plan;
    this.dimensions = plan.forMessages();
    this.slots = Arrays.copyOf(inputs, plan.slots().size());
    Arrays.fill(slots, inputs.length, slots.length, Double.NaN);
  }

  /** Runs all steps with these inputs, in SI units and the order of their slots. */
  static Run of(Plan plan, double[] inputs) {
    Run run = new Run(plan, inputs);
    plan.steps().forEach(step -> run.outcomes.add(run.outcome(step)));
    return run;
  }

  List<Outcome> outcomes() {
    return outcomes;
  }

  /** The values of all names; NaN where there is none. */
  double[] slots() {
    return slots;
  }

  private Outcome outcome(Planned step) {
    if (step instanceof Planned.Faulty faulty) {
      return Outcome.of(faulty.statement(), faulty.issues());
    } else if (step instanceof Planned.Waiting waiting) {
      return Outcome.of(
          waiting.statement(), List.of(waits(waiting.statement(), waiting.missing())));
    }
    Optional<String> missing =
        step.statement().names().stream()
            .filter(n -> Double.isNaN(slots[plan.slot(n)]))
            .findFirst();
    if (missing.isPresent()) {
      return Outcome.of(step.statement(), List.of(waits(step.statement(), missing.get())));
    } else if (step instanceof Planned.Computed computed) {
      return computed(computed);
    } else if (step instanceof Planned.Solved solved) {
      return solved(solved);
    }
    Planned.Compared compared = (Planned.Compared) step;
    Comparison.Result result = compared.comparison().of(slots, dimensions);
    return new Outcome(
        compared.statement(),
        Optional.empty(),
        result.verdict(),
        List.of(),
        result.fault().stream().toList());
  }

  private static Issue waits(Statement statement, String missing) {
    return Issue.error(statement.span(), WAITS + ": it needs " + missing + ", which has no value");
  }

  private Outcome computed(Planned.Computed step) {
    Code code = step.code();
    double[] results = new double[code.size()];
    double value = code.evaluate(slots, results);
    Optional<Issue> fault = code.fault(results, dimensions);
    if (fault.isPresent()) {
      return Outcome.of(step.statement(), List.of(fault.get()));
    }
    slots[step.slot()] = value + 0.0;
    return defined(step.statement(), value, List.of());
  }

  private Outcome defined(
      Statement.Defines statement, double si, List<Outcome.RejectedRoot> rejected) {
    Dimension dimension = plan.dimension(statement.name());
    Quantity plain = Quantity.ofSi(si, dimension);
    Quantity value = statement.unit().map(plain::to).orElse(plain);
    return new Outcome(statement, Optional.of(value), Optional.empty(), rejected, List.of());
  }

  private Outcome solved(Planned.Solved step) {
    Equation equation = step.equation();
    Equation.Found found = equation.solve(slots, dimensions);
    List<Outcome.RejectedRoot> rejected =
        found.roots().stream()
            .filter(r -> r.rejected().isPresent())
            .map(r -> new Outcome.RejectedRoot(shown(step, r.value()), r.rejected().orElseThrow()))
            .toList();
    if (found.accepted().size() == 1) {
      double root = found.accepted().get(0).value();
      slots[step.slot()] = root;
      return defined(step.statement(), root, rejected);
    }
    Issue issue = found.fault().orElseGet(() -> undecided(step, found));
    return new Outcome(
        step.statement(), Optional.empty(), Optional.empty(), rejected, List.of(issue));
  }

  private Quantity shown(Planned.Solved step, double root) {
    Quantity plain = Quantity.ofSi(root, step.equation().dimension());
    return step.statement().unit().map(plain::to).orElse(plain);
  }

  private Issue undecided(Planned.Solved step, Equation.Found found) {
    String name = step.statement().target().written();
    String range = shown(step, found.low()) + " to " + shown(step, found.high());
    List<String> fitting =
        found.accepted().stream().map(r -> shown(step, r.value()).toString()).toList();
    return Issue.error(
        step.statement().span(),
        fitting.isEmpty()
            ? "no value of %s from %s %s"
                .formatted(
                    name,
                    range,
                    found.roots().isEmpty()
                        ? "solves the equation"
                        : "solves the equation and satisfies the conditions")
            : "%d values of %s from %s solve the equation: %s; add a condition that tells them apart"
                .formatted(fitting.size(), name, range, String.join(", ", fitting)));
  }
}
