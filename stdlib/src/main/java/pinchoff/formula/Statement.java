package pinchoff.formula;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import pinchoff.page.Relation;
import pinchoff.quantity.Unit;
import pinchoff.source.SourceSpan;

/** One line of formulas. */
public sealed interface Statement {

  /** Where it stands, without the reason. */
  SourceSpan span();

  /** The reason after the slashes; may be empty. */
  String reason();

  /** The expressions in it, in order. */
  List<Expression> expressions();

  /** What defines a name. */
  sealed interface Defines extends Statement {

    /** The name, as it stands in the text. */
    Expression.Named target();

    /** The unit to show it in, if one was chosen. */
    Optional<Unit> unit();

    /** The name in the spelling that equal names share. */
    default String name() {
      return target().name();
    }
  }

  /** A name that is equal to an expression. */
  record Definition(
      SourceSpan span,
      Expression.Named target,
      Optional<Unit> unit,
      Expression value,
      String reason)
      implements Defines {

    @Override
    public List<Expression> expressions() {
      return List.of(value);
    }
  }

  /**
   * A name for which an equation is solved.
   *
   * @param conditions comparisons that a root has to satisfy
   */
  record Implicit(
      SourceSpan span,
      Expression.Named target,
      Optional<Unit> unit,
      Expression left,
      Expression right,
      List<Check> conditions,
      String reason)
      implements Defines {

    /** Copies the conditions. */
    public Implicit {
      conditions = List.copyOf(conditions);
    }

    @Override
    public List<Expression> expressions() {
      List<Expression> all = new ArrayList<>(List.of(left, right));
      conditions.forEach(c -> all.addAll(c.expressions()));
      return all;
    }
  }

  /**
   * Sides that are compared, from left to right.
   *
   * @param signs one less than sides, none of them an equality
   */
  record Check(SourceSpan span, List<Expression> sides, List<Relation.Sign> signs, String reason)
      implements Statement {

    /** Copies the lists. */
    public Check {
      sides = List.copyOf(sides);
      signs = List.copyOf(signs);
    }

    @Override
    public List<Expression> expressions() {
      return sides;
    }
  }

  /** The names that it uses, in order of appearance, in the spelling that equal names share. */
  default Set<String> names() {
    Set<String> names = new LinkedHashSet<>();
    for (Expression expression : expressions()) {
      expression.walk(
          e -> {
            if (e instanceof Expression.Named named) {
              names.add(named.name());
            }
          });
    }
    if (this instanceof Implicit implicit) {
      names.remove(implicit.name());
    }
    return names;
  }

  /** The statement in a form that reads back to the same, without its reason. */
  default String text() {
    return Writer.text(this);
  }
}
