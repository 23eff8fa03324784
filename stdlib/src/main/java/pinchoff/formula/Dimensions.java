package pinchoff.formula;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.formula.Expression.Amount;
import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Call;
import pinchoff.formula.Expression.Named;
import pinchoff.formula.Expression.Negative;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.QuantityException;
import pinchoff.source.Issue;
import pinchoff.source.SourceSpan;
import pinchoff.source.Suggestions;

/**
 * Finds what expressions measure, and every place where unlike things are added, compared or put
 * where a plain number belongs.
 */
public final class Dimensions {
  private final Map<String, Dimension> known;
  private final List<Issue> issues;

  /**
   * Checks against these names.
   *
   * @param known what each name measures, in the spelling that equal names share
   * @param issues where faults are added
   */
  public Dimensions(Map<String, Dimension> known, List<Issue> issues) {
    this.known = known;
    this.issues = issues;
  }

  /** What the expression measures; empty if it has a fault, which is then among the issues. */
  public Optional<Dimension> of(Expression e) {
    if (e instanceof Amount amount) {
      return amount(amount);
    } else if (e instanceof Named named) {
      return named(named);
    } else if (e instanceof Negative n) {
      return of(n.operand());
    } else if (e instanceof Call call) {
      return call(call);
    }
    Binary b = (Binary) e;
    return b.operator() == Operator.POWER ? power(b) : binary(b);
  }

  /** Checks that two sides measure the same. */
  public boolean alike(Expression left, Expression right, SourceSpan at, String verb) {
    Optional<Dimension> l = of(left);
    Optional<Dimension> r = of(right);
    if (l.isEmpty() || r.isEmpty()) {
      return false;
    }
    if (l.equals(r)) {
      return true;
    }
    fault(at, verb, left, l.get(), right, r.get());
    return false;
  }

  private void fault(
      SourceSpan at, String verb, Expression left, Dimension l, Expression right, Dimension r) {
    issues.add(
        Issue.error(
            at,
            "%s is %s and %s is %s: expected the same %s"
                .formatted(shown(left), l.description(), shown(right), r.description(), verb)));
  }

  private static String shown(Expression e) {
    return pinchoff.source.Excerpt.clip(e.text(), 40);
  }

  private Optional<Dimension> amount(Amount amount) {
    for (String unit : amount.joined()) {
      if (known.containsKey(Name.canonical(unit))) {
        issues.add(
            Issue.error(
                amount.span(),
                unit
                    + " here is a unit, but there is also a quantity of that name: put spaces around the operator if the quantity is meant, or rename it"));
        return Optional.empty();
      }
    }
    return Optional.of(amount.value().dimension());
  }

  private Optional<Dimension> named(Named named) {
    Dimension found = known.get(named.name());
    if (found == null) {
      issues.add(
          Issue.error(named.span(), named.written() + " is unknown")
              .withSuggestion(Suggestions.didYouMean(named.written(), known.keySet())));
    }
    return Optional.ofNullable(found);
  }

  private Optional<Dimension> binary(Binary b) {
    Optional<Dimension> left = of(b.left());
    Optional<Dimension> right = of(b.right());
    if (left.isEmpty() || right.isEmpty()) {
      return Optional.empty();
    }
    Dimension l = left.get();
    Dimension r = right.get();
    if (b.operator() == Operator.TIMES) {
      return product(b, () -> l.times(r));
    } else if (b.operator() == Operator.OVER) {
      return product(b, () -> l.per(r));
    } else if (l.equals(r)) {
      return left;
    }
    String why = b.operator() == Operator.PLUS ? "to add them" : "to subtract them";
    fault(b.at(), why, b.left(), l, b.right(), r);
    return Optional.empty();
  }

  private Optional<Dimension> product(Expression e, java.util.function.Supplier<Dimension> made) {
    try {
      return Optional.of(made.get());
    } catch (QuantityException refused) {
      issues.add(Issue.error(e.span(), StatementReader.oneLine(refused)));
      return Optional.empty();
    }
  }

  private Optional<Dimension> power(Binary b) {
    Optional<Dimension> base = of(b.left());
    Optional<Dimension> exponent = of(b.right());
    if (base.isEmpty() || exponent.isEmpty()) {
      return Optional.empty();
    }
    if (!exponent.get().isNone()) {
      issues.add(
          Issue.error(
              b.right().span(),
              "the exponent is " + exponent.get().description() + ": expected a plain number"));
      return Optional.empty();
    }
    if (base.get().isNone()) {
      return base;
    }
    Optional<Ratio> ratio = Ratio.of(b.right());
    if (ratio.isEmpty()) {
      issues.add(
          Issue.error(
              b.right().span(),
              "the exponent of "
                  + base.get().description()
                  + ": expected a number such as 2, 0.5 or 3/2, since the result's unit depends on it"));
      return Optional.empty();
    }
    return product(b, () -> base.get().pow(ratio.get().numerator(), ratio.get().denominator()));
  }

  private Optional<Dimension> call(Call call) {
    Expression first = call.arguments().get(0);
    return switch (call.function()) {
      case SQRT -> of(first).flatMap(d -> product(call, d::sqrt));
      case ABS -> of(first);
      case MIN, MAX ->
          alike(first, call.arguments().get(1), call.span(), "to compare them")
              ? of(first)
              : Optional.empty();
      case PAR -> parallel(first, call.arguments().get(1));
      default -> required(first, Dimension.NONE) ? Optional.of(Dimension.NONE) : Optional.empty();
    };
  }

  private Optional<Dimension> parallel(Expression one, Expression other) {
    boolean first = required(one, Dimension.RESISTANCE);
    boolean second = required(other, Dimension.RESISTANCE);
    return first && second ? Optional.of(Dimension.RESISTANCE) : Optional.empty();
  }

  private boolean required(Expression argument, Dimension expected) {
    Optional<Dimension> found = of(argument);
    if (found.isPresent() && !found.get().equals(expected)) {
      issues.add(
          Issue.error(
              argument.span(),
              "%s is %s: expected %s"
                  .formatted(shown(argument), found.get().description(), expected.description())));
    }
    return found.filter(expected::equals).isPresent();
  }
}
