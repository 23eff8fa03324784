package pinchoff.formula;

import java.util.List;
import java.util.function.Consumer;
import pinchoff.page.Relation;
import pinchoff.quantity.Quantity;
import pinchoff.source.SourceSpan;

/** The right side of a formula as it was read. */
public sealed interface Expression {

  /** Where it stands. */
  SourceSpan span();

  /**
   * A number with or without a unit.
   *
   * @param value what it is worth
   * @param written number and unit as they were written, with one space between them
   * @param joined the units after the first one: each could also have been meant as a name
   */
  record Amount(SourceSpan span, Quantity value, String written, List<String> joined)
      implements Expression {

    /** Copies the list. */
    public Amount {
      joined = List.copyOf(joined);
    }
  }

  /**
   * A named quantity.
   *
   * @param written as it stands in the text
   */
  record Named(SourceSpan span, String written) implements Expression {

    /** The name in the spelling that equal names share. */
    public String name() {
      return Name.canonical(written);
    }
  }

  /** The negative of something. */
  record Negative(SourceSpan span, Expression operand) implements Expression {}

  /**
   * Two operands and an operator.
   *
   * @param span of the whole
   * @param at of the operator
   */
  record Binary(
      SourceSpan span, SourceSpan at, Operator operator, Expression left, Expression right)
      implements Expression {}

  /** A function of arguments. */
  record Call(SourceSpan span, Function function, List<Expression> arguments)
      implements Expression {

    /** Copies the list. */
    public Call {
      arguments = List.copyOf(arguments);
    }
  }

  /** Visits this and everything in it, operands first. */
  default void walk(Consumer<Expression> visitor) {
    if (this instanceof Negative n) {
      n.operand().walk(visitor);
    } else if (this instanceof Binary b) {
      b.left().walk(visitor);
      b.right().walk(visitor);
    } else if (this instanceof Call c) {
      c.arguments().forEach(a -> a.walk(visitor));
    }
    visitor.accept(this);
  }

  /** The expression in a form that reads back to the same. */
  default String text() {
    return Writer.text(this);
  }

  /** The expression to be typeset. */
  default Relation relation() {
    return Typeset.symbols(this);
  }
}
