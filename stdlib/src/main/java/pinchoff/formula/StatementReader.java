package pinchoff.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.page.Relation.Sign;
import pinchoff.quantity.QuantityException;
import pinchoff.quantity.Unit;
import pinchoff.source.Issue;

/** Reads one line: a definition, an equation to be solved, or a check. */
final class StatementReader {
  private static final int MOST_LEVELS = 80;

  private final Cursor cursor;
  private final ExpressionReader expressions;
  private final String reason;

  StatementReader(Cursor cursor, String reason) {
    this.cursor = cursor;
    this.expressions = new ExpressionReader(cursor);
    this.reason = reason;
  }

  Statement read() {
    Statement statement = statement();
    for (Expression expression : statement.expressions()) {
      if (Height.of(expression) > MOST_LEVELS) {
        throw new Refused(
            Issue.error(expression.span(), "nested more than " + MOST_LEVELS + " levels deep"));
      }
    }
    return statement;
  }

  private Statement statement() {
    cursor.skipSpace();
    int start = cursor.at();
    Optional<Expression.Named> target = cursor.takeName();
    if (target.isPresent()) {
      Optional<Unit> unit = unit();
      if (cursor.takeWord("such")) {
        return implicit(start, target.get(), unit);
      }
      if (takeEquals()) {
        return definition(start, target.get(), unit);
      }
      if (unit.isPresent()) {
        throw cursor.expected("= after the unit");
      }
    }
    cursor.goTo(start);
    Statement.Check check = check(reason);
    end("the end of the line");
    return check;
  }

  private boolean takeEquals() {
    int start = cursor.at();
    if (!cursor.take("=")) {
      return false;
    }
    if (cursor.peek() == '=') {
      throw cursor.refuse(start, cursor.at() + 1, "a single = defines a name");
    }
    return true;
  }

  private Optional<Unit> unit() {
    if (!cursor.take("[")) {
      return Optional.empty();
    }
    int start = cursor.at();
    while (!cursor.atEnd() && cursor.peek() != ']') {
      cursor.advance();
    }
    String written = cursor.from(start);
    int stop = cursor.at();
    if (!cursor.take("]")) {
      throw cursor.expected("] after the unit");
    }
    try {
      return Optional.of(Unit.parse(written.strip()));
    } catch (QuantityException refused) {
      throw cursor.refuse(start, stop, oneLine(refused));
    }
  }

  static String oneLine(QuantityException refused) {
    return String.valueOf(refused.getMessage()).lines().findFirst().orElse("");
  }

  private Statement definition(int start, Expression.Named target, Optional<Unit> unit) {
    Expression value = expressions.read();
    if (cursor.take("=")) {
      throw cursor.refuse(
          cursor.at() - 1,
          cursor.at(),
          "a second = in one line: write one definition to a line, or \""
              + target.written()
              + " such that … = …\" to solve for it");
    }
    end("an operator or the end of the line");
    return new Statement.Definition(cursor.span(start), target, unit, value, reason);
  }

  private Statement implicit(int start, Expression.Named target, Optional<Unit> unit) {
    if (!cursor.takeWord("that")) {
      throw cursor.expected("\"that\" after \"such\"");
    }
    Expression left = expressions.read();
    if (!takeEquals()) {
      throw cursor.expected("= between the two sides of the equation");
    }
    Expression right = expressions.read();
    List<Statement.Check> conditions = new ArrayList<>();
    while (cursor.take(",")) {
      conditions.add(check(""));
    }
    end("a comma with a condition, or the end of the line");
    return new Statement.Implicit(
        cursor.span(start), target, unit, left, right, conditions, reason);
  }

  private Statement.Check check(String why) {
    cursor.skipSpace();
    int start = cursor.at();
    List<Expression> sides = new ArrayList<>(List.of(expressions.read()));
    List<Sign> signs = new ArrayList<>();
    for (Optional<Sign> sign = sign(); sign.isPresent(); sign = sign()) {
      signs.add(sign.get());
      sides.add(expressions.read());
    }
    if (signs.isEmpty()) {
      if (cursor.peek() == '=') {
        throw cursor.refuse(
            cursor.at(),
            cursor.at() + 1,
            "left of = stands a single name: write \"X such that … = …\" to solve an equation for X");
      }
      throw cursor.expected("= after a name, or a comparison: >= <= > <");
    }
    return new Statement.Check(cursor.span(start), sides, signs, why);
  }

  private Optional<Sign> sign() {
    if (cursor.take(">=") || cursor.take("≥")) {
      return Optional.of(Sign.AT_LEAST);
    } else if (cursor.take("<=") || cursor.take("≤")) {
      return Optional.of(Sign.AT_MOST);
    } else if (cursor.take(">")) {
      return Optional.of(Sign.GREATER);
    } else if (cursor.take("<")) {
      return Optional.of(Sign.LESS);
    }
    cursor.skipSpace();
    return Optional.empty();
  }

  private void end(String expected) {
    cursor.skipSpace();
    if (!cursor.atEnd()) {
      throw cursor.expected(expected);
    }
  }
}
