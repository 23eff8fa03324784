package pinchoff.derive;

import java.util.List;
import java.util.Optional;
import pinchoff.formula.Code;
import pinchoff.formula.Dimensions;
import pinchoff.formula.Statement;
import pinchoff.page.Relation.Sign;
import pinchoff.page.Verdict;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.source.Issue;

/** The sides of a check, compiled. */
record Comparison(Statement.Check check, Dimension dimension, List<Code> sides) {
  private static final double BAND = 1e-12;

  /** A verdict, or why there is none. */
  record Result(Optional<Verdict> verdict, Optional<Issue> fault) {}

  Result of(double[] slots, Dimensions dimensions) {
    double[] values = new double[sides.size()];
    for (int i = 0; i < values.length; i++) {
      double[] results = new double[sides.get(i).size()];
      values[i] = sides.get(i).evaluate(slots, results);
      Optional<Issue> fault = sides.get(i).fault(results, dimensions);
      if (fault.isPresent()) {
        return new Result(Optional.empty(), fault);
      }
    }
    return new Result(Optional.of(verdict(values)), Optional.empty());
  }

  /** The pair with the least margin decides. */
  private Verdict verdict(double[] values) {
    double margin = Double.POSITIVE_INFINITY;
    double band = 0;
    boolean strict = false;
    for (int i = 0; i + 1 < values.length; i++) {
      Sign sign = check.signs().get(i);
      boolean greater = sign == Sign.GREATER || sign == Sign.AT_LEAST;
      double room = greater ? values[i] - values[i + 1] : values[i + 1] - values[i];
      if (room < margin) {
        margin = room;
        strict = sign == Sign.GREATER || sign == Sign.LESS;
        band = BAND * Math.max(Math.abs(values[i]), Math.abs(values[i + 1]));
      }
    }
    Quantity distance = Quantity.ofSi(margin, dimension);
    return strict && margin <= 0
        ? Verdict.fails(distance)
        : Verdict.of(distance, Quantity.ofSi(band, dimension));
  }
}
