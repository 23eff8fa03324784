package pinchoff.page;

import java.util.List;
import pinchoff.page.Relation.Amount;
import pinchoff.page.Relation.Call;
import pinchoff.page.Relation.Comparison;
import pinchoff.page.Relation.Digits;
import pinchoff.page.Relation.Fraction;
import pinchoff.page.Relation.Minus;
import pinchoff.page.Relation.Name;
import pinchoff.page.Relation.Parallel;
import pinchoff.page.Relation.Power;
import pinchoff.page.Relation.Product;
import pinchoff.page.Relation.Root;
import pinchoff.page.Relation.Sum;

/** Sets a relation in one line of text. */
final class RelationText {
  private final StringBuilder out = new StringBuilder();
  private int depth;

  private RelationText() {}

  static String of(Relation relation) {
    RelationText text = new RelationText();
    text.set(relation, Place.FREE);
    return text.out.toString();
  }

  private void set(Relation part, Place place) {
    depth = Depth.deeper(depth);
    boolean enclosed = place.enclosesInLine(part);
    out.append(enclosed ? "(" : "");
    setBare(part);
    out.append(enclosed ? ")" : "");
    depth--;
  }

  private void setBare(Relation part) {
    if (part instanceof Name name) {
      out.append(Escape.visible(name.symbol().text()));
    } else if (part instanceof Digits digits) {
      out.append(digits.text());
    } else if (part instanceof Amount amount) {
      out.append(Figure.of(amount.quantity(), amount.digits()).text());
    } else if (part instanceof Sum sum) {
      setSum(sum);
    } else if (part instanceof Minus minus) {
      out.append('-');
      set(minus.operand(), Place.SUBTRAHEND);
    } else if (part instanceof Product product) {
      setAll(product.factors(), "·", Place.FACTOR);
    } else if (part instanceof Parallel parallel) {
      setAll(parallel.branches(), " ∥ ", Place.BRANCH);
    } else if (part instanceof Fraction fraction) {
      set(fraction.numerator(), Place.NUMERATOR);
      out.append('/');
      set(fraction.denominator(), Place.DENOMINATOR);
    } else if (part instanceof Power power) {
      set(power.base(), Place.BASE);
      out.append('^');
      set(power.exponent(), Place.EXPONENT);
    } else if (part instanceof Root root) {
      out.append(opening(root));
      set(root.radicand(), Place.FREE);
      out.append(')');
    } else if (part instanceof Call call) {
      setCall(call);
    } else if (part instanceof Comparison comparison) {
      setComparison(comparison);
    } else {
      throw new IllegalStateException("a relation of an unknown kind: " + part.getClass());
    }
  }

  /** How a root begins: {@code sqrt(}, or {@code root(3, } for a higher one. */
  static String opening(Root root) {
    return root.degree() == 2 ? "sqrt(" : "root(" + root.degree() + ", ";
  }

  private void setSum(Sum sum) {
    boolean first = true;
    for (Relation term : sum.terms()) {
      if (!first && term instanceof Minus minus) {
        out.append(" - ");
        set(minus.operand(), Place.SUBTRAHEND);
      } else {
        out.append(first ? "" : " + ");
        set(term, Place.TERM);
      }
      first = false;
    }
  }

  private void setCall(Call call) {
    boolean bars = call.isAbsolute();
    out.append(bars ? "|" : Escape.visible(call.function()) + "(");
    setAll(call.arguments(), ", ", Place.FREE);
    out.append(bars ? "|" : ")");
  }

  private void setComparison(Comparison comparison) {
    for (int i = 0; i < comparison.sides().size(); i++) {
      if (i > 0) {
        out.append(' ').append(comparison.signs().get(i - 1).text()).append(' ');
      }
      set(comparison.sides().get(i), Place.SIDE);
    }
  }

  private void setAll(List<Relation> parts, String separator, Place place) {
    for (int i = 0; i < parts.size(); i++) {
      out.append(i > 0 ? separator : "");
      set(parts.get(i), place);
    }
  }
}
