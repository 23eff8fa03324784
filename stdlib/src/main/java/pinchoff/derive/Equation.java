package pinchoff.derive;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.formula.Code;
import pinchoff.formula.Dimensions;
import pinchoff.formula.Expression;
import pinchoff.formula.Statement;
import pinchoff.page.Relation.Sign;
import pinchoff.page.Standing;
import pinchoff.page.Verdict;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/**
 * An equation for one unknown, compiled.
 *
 * @param residual left minus right side
 * @param slot of the unknown
 * @param dimension of the unknown
 * @param conditions in the order of the text
 * @param relatives slots of known quantities that measure the same as the unknown
 */
record Equation(
    Statement.Implicit statement,
    Code residual,
    int slot,
    Dimension dimension,
    List<Comparison> conditions,
    List<Integer> relatives) {

  /** How far beyond the largest known quantity of its kind an unknown is sought. */
  private static final double REACH = 10;

  /** Where to seek an unknown that nothing is known of, in SI units. */
  private static final double ANY = 1e9;

  /**
   * A root and whether the conditions hold there.
   *
   * @param rejected the condition that it breaks, with its verdict
   */
  record Root(double value, Optional<String> rejected) {}

  /** What was found: the roots within a range, or why none could be sought. */
  record Found(List<Root> roots, double low, double high, Optional<Issue> fault) {

    List<Root> accepted() {
      return roots.stream().filter(r -> r.rejected().isEmpty()).toList();
    }
  }

  Found solve(double[] slots, Dimensions dimensions) {
    double reach = 0;
    for (int relative : relatives) {
      if (!Double.isNaN(slots[relative])) {
        reach = Math.max(reach, Math.abs(slots[relative]));
      }
    }
    double most = reach > 0 ? REACH * reach : ANY;
    double low = bound(slots, true).orElse(-most);
    double high = bound(slots, false).orElse(most);
    if (!(low < high)) {
      return new Found(List.of(), low, high, Optional.of(noRange(low, high)));
    }
    double[] work = slots.clone();
    double[] results = new double[residual.size()];
    List<Double> found =
        RootScan.of(
            x -> {
              work[slot] = x;
              return residual.evaluate(work, results);
            },
            Math.min(low, -most),
            Math.max(high, most),
            low,
            high);
    List<Root> roots = new ArrayList<>();
    for (double root : found) {
      work[slot] = root + 0.0;
      roots.add(new Root(work[slot], broken(work, dimensions)));
    }
    return new Found(roots, low, high, Optional.empty());
  }

  private Issue noRange(double low, double high) {
    return Issue.error(
        statement.target().span(),
        "the conditions leave no range for %s: %s to %s"
            .formatted(
                statement.target().written(),
                Quantity.ofSi(low, dimension),
                Quantity.ofSi(high, dimension)));
  }

  private Optional<String> broken(double[] slots, Dimensions dimensions) {
    for (Comparison condition : conditions) {
      Optional<Verdict> verdict = condition.of(slots, dimensions).verdict();
      if (verdict.isEmpty() || verdict.get().standing() == Standing.FAILS) {
        return Optional.of(
            condition.check().text()
                + verdict.map(v -> " " + v.text()).orElse(" cannot be decided"));
      }
    }
    return Optional.empty();
  }

  /** The tightest bound that a condition sets for the unknown by itself. */
  private Optional<Double> bound(double[] slots, boolean lower) {
    Optional<Double> tightest = Optional.empty();
    for (Comparison condition : conditions) {
      List<Expression> sides = condition.check().sides();
      for (int i = 0; i + 1 < sides.size(); i++) {
        Sign sign = condition.check().signs().get(i);
        boolean greater = sign == Sign.GREATER || sign == Sign.AT_LEAST;
        int other = isUnknown(sides.get(i)) ? i + 1 : isUnknown(sides.get(i + 1)) ? i : -1;
        boolean isLower = greater == (other == i + 1);
        if (other < 0 || isLower != lower || mentionsUnknown(sides.get(other))) {
          continue;
        }
        Code code = condition.sides().get(other);
        double value = code.evaluate(slots, new double[code.size()]);
        if (Double.isFinite(value)
            && (tightest.isEmpty() || (lower ? value > tightest.get() : value < tightest.get()))) {
          tightest = Optional.of(value);
        }
      }
    }
    return tightest;
  }

  private boolean isUnknown(Expression side) {
    return side instanceof Expression.Named named && named.name().equals(statement.name());
  }

  private boolean mentionsUnknown(Expression side) {
    boolean[] found = {false};
    side.walk(e -> found[0] |= isUnknown(e));
    return found[0];
  }
}
