package pinchoff.derive;

import pinchoff.formula.Code;

/** The derivative of every result to every input, step by step through the plan. */
final class Gradients {
  private final Plan plan;
  private final double[] values;
  private final double[][] rows;

  private Gradients(Plan plan, double[] values) {
    this.plan = plan;
    this.values = values;
    this.rows = new double[values.length][plan.inputs()];
  }

  /**
   * Computes them.
   *
   * @param values of all slots, as a run left them
   * @return a row for each slot, a column for each input, in SI units; rows of steps without a
   *     value mean nothing
   */
  static double[][] of(Plan plan, double[] values) {
    Gradients g = new Gradients(plan, values);
    for (int i = 0; i < plan.inputs(); i++) {
      g.rows[i][i] = 1;
    }
    plan.steps().forEach(g::step);
    return g.rows;
  }

  private void step(Planned step) {
    if (step instanceof Planned.Computed c && !Double.isNaN(values[c.slot()])) {
      add(partials(c.code()), c.slot(), 1);
    } else if (step instanceof Planned.Solved s && !Double.isNaN(values[s.slot()])) {
      // the implicit function theorem: dx/dp = −(∂F/∂p)/(∂F/∂x)
      double[] partials = partials(s.equation().residual());
      double own = partials[s.slot()];
      partials[s.slot()] = 0;
      add(partials, s.slot(), -1 / own);
    }
  }

  private double[] partials(Code code) {
    double[] results = new double[code.size()];
    code.evaluate(values, results);
    double[] partials = new double[values.length];
    code.gradient(results, new double[code.size()], partials);
    return partials;
  }

  private void add(double[] partials, int slot, double factor) {
    for (int s = 0; s < partials.length; s++) {
      if (partials[s] != 0) {
        for (int i = 0; i < plan.inputs(); i++) {
          rows[slot][i] += factor * partials[s] * rows[s][i];
        }
      }
    }
  }
}
