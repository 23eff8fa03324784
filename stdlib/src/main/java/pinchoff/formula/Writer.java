package pinchoff.formula;

import java.util.stream.Collectors;
import java.util.stream.IntStream;
import pinchoff.formula.Expression.Amount;
import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Call;
import pinchoff.formula.Expression.Named;
import pinchoff.formula.Expression.Negative;
import pinchoff.page.Relation.Sign;

/** Writes what was read, with no more parentheses than needed. */
final class Writer {
  private static final int SIGN_RANK = 3;

  /** A power after a unit would be one of the unit. */
  private static final int UNIT_RANK = 4;

  private static final int HIGHEST = 5;

  private Writer() {}

  static String text(Statement statement) {
    if (statement instanceof Statement.Definition d) {
      return head(d) + " = " + text(d.value());
    }
    if (statement instanceof Statement.Implicit i) {
      String conditions =
          i.conditions().stream().map(c -> ", " + text(c)).collect(Collectors.joining());
      return head(i) + " such that " + text(i.left()) + " = " + text(i.right()) + conditions;
    }
    Statement.Check check = (Statement.Check) statement;
    return IntStream.range(0, check.sides().size())
        .mapToObj(
            i ->
                (i == 0 ? "" : " " + sign(check.signs().get(i - 1)) + " ")
                    + text(check.sides().get(i)))
        .collect(Collectors.joining());
  }

  private static String head(Statement.Defines defines) {
    return defines.target().written() + defines.unit().map(u -> " [" + u.ascii() + "]").orElse("");
  }

  private static String sign(Sign sign) {
    return switch (sign) {
      case AT_LEAST -> ">=";
      case AT_MOST -> "<=";
      case GREATER -> ">";
      case LESS -> "<";
      case EQUAL, ABOUT -> throw new IllegalArgumentException("a check is no equality");
    };
  }

  static String text(Expression e) {
    if (e instanceof Amount amount) {
      return amount.written();
    } else if (e instanceof Named named) {
      return named.written();
    } else if (e instanceof Negative n) {
      return "-" + inner(n.operand(), SIGN_RANK);
    } else if (e instanceof Call call) {
      return call.function().word()
          + call.arguments().stream().map(Writer::text).collect(Collectors.joining(", ", "(", ")"));
    }
    Binary b = (Binary) e;
    int rank = b.operator().rank();
    return b.operator() == Operator.POWER
        ? inner(b.left(), rank + 1) + "^" + inner(b.right(), SIGN_RANK)
        : inner(b.left(), rank) + " " + b.operator().sign() + " " + inner(b.right(), rank + 1);
  }

  private static String inner(Expression e, int least) {
    return rank(e) < least ? "(" + text(e) + ")" : text(e);
  }

  private static int rank(Expression e) {
    if (e instanceof Binary b) {
      return b.operator().rank();
    }
    if (e instanceof Amount amount && amount.written().indexOf(' ') > 0) {
      return UNIT_RANK;
    }
    return e instanceof Negative ? SIGN_RANK : HIGHEST;
  }
}
