package pinchoff.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.formula.Expression.Named;
import pinchoff.source.Suggestions;
import pinchoff.source.TextLimits;

/** Reads an expression by descent: sums of products of signed powers. */
final class ExpressionReader {
  private static final int MOST_OPERATORS = 400;

  private final Cursor cursor;
  private final AmountReader amounts;
  private int depth;
  private int operators;

  ExpressionReader(Cursor cursor) {
    this.cursor = cursor;
    this.amounts = new AmountReader(cursor);
  }

  Expression read() {
    return sum();
  }

  private Expression sum() {
    cursor.skipSpace();
    int start = cursor.at();
    Expression left = product();
    while (true) {
      int at = next();
      if (cursor.take("+")) {
        left = binary(start, at, Operator.PLUS, left, product());
      } else if (cursor.take("-") || cursor.take("−")) {
        left = binary(start, at, Operator.MINUS, left, product());
      } else {
        return left;
      }
    }
  }

  private Expression product() {
    cursor.skipSpace();
    int start = cursor.at();
    Expression left = signed();
    while (true) {
      int at = next();
      if (cursor.take("*") || cursor.take("·") || cursor.take("×")) {
        left = binary(start, at, Operator.TIMES, left, signed());
      } else if (cursor.take("/")) {
        left = binary(start, at, Operator.OVER, left, signed());
      } else {
        return left;
      }
    }
  }

  /** A sign binds less than a power: −x^2 is −(x^2). */
  private Expression signed() {
    cursor.skipSpace();
    int start = cursor.at();
    if (cursor.take("-") || cursor.take("−")) {
      return nested(
          start,
          () -> {
            Expression operand = signed();
            return new Expression.Negative(cursor.span(start), operand);
          });
    }
    return power();
  }

  /** Powers associate to the right: a^b^c is a^(b^c). */
  private Expression power() {
    int start = cursor.at();
    Expression base = primary();
    int at = next();
    if (cursor.take("^")) {
      return nested(start, () -> binary(start, at, Operator.POWER, base, signed()));
    }
    return base;
  }

  private int next() {
    cursor.skipSpace();
    return cursor.at();
  }

  private Expression binary(
      int start, int at, Operator operator, Expression left, Expression right) {
    operators++;
    if (operators > MOST_OPERATORS) {
      throw cursor.refuse(at, at + 1, "more than " + MOST_OPERATORS + " operators in one formula");
    }
    return new Expression.Binary(
        cursor.span(start), cursor.span(at, at + 1), operator, left, right);
  }

  private Expression primary() {
    cursor.skipSpace();
    int start = cursor.at();
    if (cursor.take("(")) {
      return nested(
          start,
          () -> {
            Expression inner = sum();
            if (!cursor.take(")")) {
              throw cursor.expected("an operator or )");
            }
            return inner;
          });
    }
    Optional<Expression> amount = amounts.read();
    if (amount.isPresent()) {
      return followed(amount.get(), start);
    }
    Named name = cursor.takeName().orElseThrow(() -> cursor.expected("a name, a number or ("));
    if (cursor.peek() == '(') {
      return nested(start, () -> call(name, start));
    }
    return followed(name, start);
  }

  /** Two things side by side are no product here. */
  private Expression followed(Expression first, int start) {
    int end = cursor.at();
    cursor.skipSpace();
    int c = cursor.peek();
    if (c == '(' || Character.isDigit(c) || (Name.isStart(c) && !isSuch())) {
      throw cursor.refuse(
          start,
          cursor.at() + 1,
          "nothing stands between two factors: expected * between them"
              + (first instanceof Expression.Amount && Name.isStart(c)
                  ? ", or a known unit after the number"
                  : ""));
    }
    cursor.goTo(end);
    return first;
  }

  private boolean isSuch() {
    int start = cursor.at();
    boolean such = cursor.takeWord("such");
    cursor.goTo(start);
    return such;
  }

  private Expression call(Named name, int start) {
    Function function =
        Function.of(name.written())
            .orElseThrow(
                () ->
                    cursor.refuse(
                        start,
                        cursor.at(),
                        "there is no function "
                            + name.written()
                            + Suggestions.didYouMean(name.written(), Function.words())
                                .map(hint -> ": " + hint)
                                .orElse(": expected one of " + String.join(", ", Function.words()))
                            + "; a product needs a *"));
    cursor.take("(");
    List<Expression> arguments = new ArrayList<>(List.of(sum()));
    while (cursor.take(",")) {
      arguments.add(sum());
    }
    if (!cursor.take(")")) {
      throw cursor.expected("a comma, an operator or )");
    }
    if (arguments.size() != function.arguments()) {
      throw cursor.refuse(
          start,
          cursor.at(),
          "%s of %d arguments: expected %d"
              .formatted(function.word(), arguments.size(), function.arguments()));
    }
    return new Expression.Call(cursor.span(start), function, arguments);
  }

  private Expression nested(int start, java.util.function.Supplier<Expression> inner) {
    depth++;
    int place = start;
    TextLimits.FORMULA
        .checkDepth(depth, cursor.span(Math.min(place, cursor.at())))
        .ifPresent(
            issue -> {
              throw new Refused(issue);
            });
    Expression expression = inner.get();
    depth--;
    return expression;
  }
}
