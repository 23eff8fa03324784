package pinchoff.formula;

import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Call;
import pinchoff.formula.Expression.Negative;

/** How deeply an expression is nested as it is typeset: a sum of many terms is one level. */
final class Height {
  private Height() {}

  static int of(Expression e) {
    if (e instanceof Negative n) {
      return 1 + of(n.operand());
    } else if (e instanceof Call call) {
      return 1 + call.arguments().stream().mapToInt(Height::of).max().orElse(0);
    } else if (e instanceof Binary b) {
      boolean chain =
          b.operator() != Operator.POWER
              && b.operator() != Operator.OVER
              && b.left() instanceof Binary left
              && left.operator().rank() == b.operator().rank()
              && left.operator() != Operator.OVER;
      return Math.max(of(b.left()) + (chain ? 0 : 1), 1 + of(b.right()));
    }
    return 1;
  }
}
