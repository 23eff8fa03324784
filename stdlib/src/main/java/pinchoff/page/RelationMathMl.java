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

/**
 * Sets a relation as MathML.
 *
 * <p>A front end that does not trust an output removes the MathML elements and keeps their text:
 * one over two would become 12. So whatever layout alone says is written as well, as text that
 * takes no space and is not painted. What is left then is the relation in one line of text.
 */
final class RelationMathMl {
  private final StringBuilder out = new StringBuilder();
  private int depth;

  private RelationMathMl() {}

  /** A relation within a line. */
  static String inline(Relation relation) {
    return of(relation, "<math>");
  }

  /** A relation on a line of its own. */
  static String of(Relation relation) {
    return of(relation, "<math display=\"block\">");
  }

  private static String of(Relation relation, String opening) {
    RelationMathMl mathMl = new RelationMathMl();
    mathMl.out.append(opening).append("<mrow>");
    mathMl.set(relation, Place.FREE);
    return mathMl.out.append("</mrow></math>").toString();
  }

  private void set(Relation part, Place place) {
    depth = Depth.deeper(depth);
    if (place.encloses(part)) {
      out.append("<mrow><mo>(</mo>");
      setBare(part);
      out.append("<mo>)</mo></mrow>");
    } else if (place.enclosesInLine(part)) {
      ghost("(");
      setBare(part);
      ghost(")");
    } else {
      setBare(part);
    }
    depth--;
  }

  /** A part as one element, where MathML counts children. */
  private void setAsRow(Relation part, Place place) {
    out.append("<mrow>");
    set(part, place);
    out.append("</mrow>");
  }

  private void setBare(Relation part) {
    if (part instanceof Name name) {
      setSymbol(name.symbol());
    } else if (part instanceof Digits digits) {
      number(digits.text());
    } else if (part instanceof Amount amount) {
      setAmount(amount);
    } else if (part instanceof Sum sum) {
      setSum(sum);
    } else if (part instanceof Minus minus) {
      out.append("<mo form=\"prefix\">−</mo>");
      set(minus.operand(), Place.SUBTRAHEND);
    } else if (part instanceof Product product) {
      setProduct(product);
    } else if (part instanceof Parallel parallel) {
      setAll(parallel.branches(), "∥", Place.BRANCH);
    } else if (part instanceof Fraction fraction) {
      setFraction(fraction);
    } else if (part instanceof Power power) {
      setPower(power);
    } else if (part instanceof Root root) {
      setRoot(root);
    } else if (part instanceof Call call) {
      setCall(call);
    } else if (part instanceof Comparison comparison) {
      setComparison(comparison);
    } else {
      throw new IllegalStateException("a relation of an unknown kind: " + part.getClass());
    }
  }

  private void setSymbol(Symbol symbol) {
    for (Symbol.Atom atom : symbol.atoms()) {
      String lead = atom.lead();
      boolean rooted = lead.endsWith("√");
      lead(rooted ? lead.substring(0, lead.length() - 1) : lead);
      if (rooted) {
        ghost("√");
        out.append("<msqrt>");
        setAtom(atom);
        out.append("</msqrt>");
      } else {
        setAtom(atom);
      }
    }
  }

  private void lead(String lead) {
    String digits = lead.startsWith("/") || lead.startsWith("·") ? lead.substring(1) : lead;
    if (digits.length() < lead.length()) {
      operator(lead.substring(0, 1));
    }
    if (!digits.isEmpty()) {
      number(digits);
    }
  }

  private void setAtom(Symbol.Atom atom) {
    boolean lowered = !atom.subscript().isEmpty();
    String element = atom.primed() ? (lowered ? "msubsup" : "msup") : (lowered ? "msub" : "mrow");
    out.append('<').append(element).append('>');
    out.append(atom.italic() ? "<mi>" : "<mi mathvariant=\"normal\">");
    out.append(Escape.html(atom.base())).append("</mi>");
    if (lowered) {
      out.append("<mrow>");
      if (!atom.joined()) {
        ghost("_");
      }
      out.append("<mtext>").append(Escape.html(atom.subscript())).append("</mtext></mrow>");
    }
    out.append(atom.primed() ? "<mo>′</mo>" : "");
    out.append("</").append(element).append('>');
  }

  private void setAmount(Amount amount) {
    Figure figure = Figure.of(amount.quantity(), amount.digits());
    number(figure.number());
    if (!figure.unit().isEmpty()) {
      out.append("<mspace width=\"0.2em\"></mspace>");
      ghost(" ");
      out.append("<mtext>").append(Escape.html(figure.unit())).append("</mtext>");
    }
  }

  private void setSum(Sum sum) {
    boolean first = true;
    for (Relation term : sum.terms()) {
      if (!first && term instanceof Minus minus) {
        operator("−");
        set(minus.operand(), Place.SUBTRAHEND);
      } else {
        if (!first) {
          operator("+");
        }
        set(term, Place.TERM);
      }
      first = false;
    }
  }

  private void setProduct(Product product) {
    List<Relation> factors = product.factors();
    for (int i = 0; i < factors.size(); i++) {
      if (i > 0 && Products.needDot(factors.get(i - 1), factors.get(i))) {
        operator("·");
      } else if (i > 0) {
        ghost("·");
        out.append("<mspace width=\"0.15em\"></mspace>");
      }
      set(factors.get(i), Place.FACTOR);
    }
  }

  private void setFraction(Fraction fraction) {
    out.append("<mfrac>");
    setAsRow(fraction.numerator(), Place.NUMERATOR);
    out.append("<mrow>");
    ghost("/");
    set(fraction.denominator(), Place.DENOMINATOR);
    out.append("</mrow></mfrac>");
  }

  private void setPower(Power power) {
    out.append("<msup>");
    setAsRow(power.base(), Place.BASE);
    out.append("<mrow>");
    ghost("^");
    set(power.exponent(), Place.EXPONENT);
    out.append("</mrow></msup>");
  }

  private void setRoot(Root root) {
    ghost(RelationText.opening(root));
    if (root.degree() == 2) {
      out.append("<msqrt>");
      set(root.radicand(), Place.FREE);
      out.append("</msqrt>");
    } else {
      out.append("<mroot>");
      setAsRow(root.radicand(), Place.FREE);
      number(Integer.toString(root.degree()));
      out.append("</mroot>");
    }
    ghost(")");
  }

  private void setCall(Call call) {
    if (call.isAbsolute()) {
      out.append("<mrow><mo form=\"prefix\">|</mo>");
      setAll(call.arguments(), ",", Place.FREE);
      out.append("<mo form=\"postfix\">|</mo></mrow>");
    } else {
      out.append("<mi mathvariant=\"normal\">").append(Escape.html(call.function()));
      out.append("</mi><mrow><mo>(</mo>");
      setAll(call.arguments(), ",", Place.FREE);
      out.append("<mo>)</mo></mrow>");
    }
  }

  private void setComparison(Comparison comparison) {
    for (int i = 0; i < comparison.sides().size(); i++) {
      if (i > 0) {
        operator(comparison.signs().get(i - 1).text());
      }
      set(comparison.sides().get(i), Place.SIDE);
    }
  }

  private void setAll(List<Relation> parts, String separator, Place place) {
    for (int i = 0; i < parts.size(); i++) {
      if (i > 0) {
        operator(separator);
      }
      set(parts.get(i), place);
    }
  }

  private void number(String digits) {
    out.append("<mn>").append(digits.replace('-', '−')).append("</mn>");
  }

  private void operator(String sign) {
    out.append("<mo>").append(Escape.html(sign)).append("</mo>");
  }

  /** Text that takes no space and is not painted. */
  private void ghost(String text) {
    out.append("<mpadded width=\"0\" height=\"0\" depth=\"0\"><mphantom><mtext>")
        .append(text)
        .append("</mtext></mphantom></mpadded>");
  }
}
