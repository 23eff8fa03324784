package pinchoff.page;

import java.util.List;
import java.util.Set;
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

/** Sets a relation as LaTeX, with commands that the renderers of notebooks know. */
final class RelationLatex {
  private static final Set<String> OPERATORS =
      Set.of("ln", "log", "exp", "sin", "cos", "tan", "sinh", "cosh", "tanh", "min", "max", "arg");

  private final StringBuilder out = new StringBuilder();
  private int depth;

  private RelationLatex() {}

  static String of(Relation relation) {
    RelationLatex latex = new RelationLatex();
    latex.set(relation, Place.FREE);
    return latex.out.toString();
  }

  /** A symbol within a formula. */
  static String of(Symbol symbol) {
    StringBuilder out = new StringBuilder();
    for (Symbol.Atom atom : symbol.atoms()) {
      boolean rooted = atom.lead().endsWith("√");
      out.append(atom.lead().replace("√", rooted ? "\\sqrt{" : "").replace("·", "\\cdot "));
      out.append(atom.italic() ? Escape.latexMath(atom.base()) : upright(atom.base()));
      out.append(atom.primed() ? "'" : "");
      out.append(atom.subscript().isEmpty() ? "" : "_{" + upright(atom.subscript()) + "}");
      out.append(rooted ? "}" : "");
    }
    return out.toString();
  }

  private static String upright(String text) {
    return "\\mathrm{" + Escape.latexMath(text) + "}";
  }

  private void set(Relation part, Place place) {
    depth = Depth.deeper(depth);
    boolean enclosed = place.encloses(part);
    out.append(enclosed ? "\\left(" : "");
    setBare(part);
    out.append(enclosed ? "\\right)" : "");
    depth--;
  }

  private void setBare(Relation part) {
    if (part instanceof Name name) {
      out.append(of(name.symbol()));
    } else if (part instanceof Digits digits) {
      out.append(digits.text());
    } else if (part instanceof Amount amount) {
      out.append(Figure.of(amount.quantity(), amount.digits()).latex());
    } else if (part instanceof Sum sum) {
      setSum(sum);
    } else if (part instanceof Minus minus) {
      out.append('-');
      set(minus.operand(), Place.SUBTRAHEND);
    } else if (part instanceof Product product) {
      setProduct(product);
    } else if (part instanceof Parallel parallel) {
      setAll(parallel.branches(), " \\parallel ", Place.BRANCH);
    } else if (part instanceof Fraction fraction) {
      out.append("\\frac");
      setInBraces(fraction.numerator(), Place.NUMERATOR);
      setInBraces(fraction.denominator(), Place.DENOMINATOR);
    } else if (part instanceof Power power) {
      setInBraces(power.base(), Place.BASE);
      out.append('^');
      setInBraces(power.exponent(), Place.EXPONENT);
    } else if (part instanceof Root root) {
      out.append("\\sqrt").append(root.degree() == 2 ? "" : "[" + root.degree() + "]");
      setInBraces(root.radicand(), Place.FREE);
    } else if (part instanceof Call call) {
      setCall(call);
    } else if (part instanceof Comparison comparison) {
      setComparison(comparison);
    } else {
      throw new IllegalStateException("a relation of an unknown kind: " + part.getClass());
    }
  }

  private void setInBraces(Relation part, Place place) {
    out.append('{');
    set(part, place);
    out.append('}');
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

  private void setProduct(Product product) {
    List<Relation> factors = product.factors();
    for (int i = 0; i < factors.size(); i++) {
      if (i > 0) {
        boolean dot = Products.needDot(factors.get(i - 1), factors.get(i));
        out.append(dot ? " \\cdot " : "\\,");
      }
      set(factors.get(i), Place.FACTOR);
    }
  }

  private void setCall(Call call) {
    String function = call.function();
    if (call.isAbsolute()) {
      out.append("\\left|");
    } else if (OPERATORS.contains(function)) {
      out.append('\\').append(function).append("\\left(");
    } else {
      out.append("\\operatorname{").append(Escape.latexMath(function)).append("}\\left(");
    }
    setAll(call.arguments(), ", ", Place.FREE);
    out.append(call.isAbsolute() ? "\\right|" : "\\right)");
  }

  private void setComparison(Comparison comparison) {
    for (int i = 0; i < comparison.sides().size(); i++) {
      if (i > 0) {
        out.append(' ').append(comparison.signs().get(i - 1).latex()).append(' ');
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
