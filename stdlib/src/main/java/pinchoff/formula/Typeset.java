package pinchoff.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import pinchoff.formula.Expression.Amount;
import pinchoff.formula.Expression.Binary;
import pinchoff.formula.Expression.Call;
import pinchoff.formula.Expression.Named;
import pinchoff.formula.Expression.Negative;
import pinchoff.page.Relation;
import pinchoff.page.Symbol;

/** Turns expressions into relations to be typeset, with symbols or with numbers for the names. */
public final class Typeset {
  private final Function<String, Relation> names;

  private Typeset(Function<String, Relation> names) {
    this.names = names;
  }

  /** The expression with its symbols. */
  public static Relation symbols(Expression expression) {
    return with(expression, name -> new Relation.Name(Symbol.of(name)));
  }

  /**
   * The expression with something else for each name.
   *
   * @param names what to set for a name
   */
  public static Relation with(Expression expression, Function<String, Relation> names) {
    return new Typeset(names).of(expression);
  }

  private Relation of(Expression e) {
    if (e instanceof Amount amount) {
      return amount(amount);
    } else if (e instanceof Named named) {
      return names.apply(named.name());
    } else if (e instanceof Negative n) {
      return new Relation.Minus(of(n.operand()));
    } else if (e instanceof Call call) {
      return call(call);
    }
    Binary b = (Binary) e;
    return switch (b.operator()) {
      case PLUS, MINUS -> new Relation.Sum(terms(b).toList());
      case TIMES -> new Relation.Product(factors(b).toList());
      case OVER -> new Relation.Fraction(of(b.left()), of(b.right()));
      case POWER -> new Relation.Power(of(b.left()), of(b.right()));
    };
  }

  private static Relation amount(Amount amount) {
    return amount.written().matches("\\d+(\\.\\d+)?")
        ? new Relation.Digits(amount.written())
        : Relation.amount(amount.value());
  }

  private Relation call(Call call) {
    List<Relation> arguments = new ArrayList<>(call.arguments().stream().map(this::of).toList());
    return switch (call.function()) {
      case SQRT -> new Relation.Root(2, arguments.get(0));
      case PAR -> new Relation.Parallel(arguments);
      default -> new Relation.Call(call.function().word(), arguments);
    };
  }

  private Stream<Relation> terms(Binary sum) {
    Stream<Relation> left =
        sum.left() instanceof Binary b && b.operator().rank() == Operator.PLUS.rank()
            ? terms(b)
            : Stream.of(of(sum.left()));
    Relation right = of(sum.right());
    return Stream.concat(
        left, Stream.of(sum.operator() == Operator.MINUS ? new Relation.Minus(right) : right));
  }

  private Stream<Relation> factors(Binary product) {
    Stream<Relation> left =
        product.left() instanceof Binary b && b.operator() == Operator.TIMES
            ? factors(b)
            : Stream.of(of(product.left()));
    return Stream.concat(left, Stream.of(of(product.right())));
  }
}
