package pinchoff.page;

import java.util.List;

/** About how wide a relation will be when it is set, in units of the text size; rather too wide. */
final class RelationWidth {
  private static final double LETTER = 0.68;
  private static final double SMALL = 0.55;
  private static final double SIGN = 1.25;
  private static final double MOST = 44;

  /** Some front ends set formulas in larger letters than text. */
  private static final double LARGER = 1.3;

  private RelationWidth() {}

  static double of(Relation relation) {
    return Math.min(MOST, 0.4 + LARGER * width(relation));
  }

  private static double width(Relation r) {
    if (r instanceof Relation.Name name) {
      return name.symbol().atoms().stream()
          .mapToDouble(
              a ->
                  LETTER * (a.lead().length() + a.base().length() + (a.primed() ? 0.5 : 0))
                      + SMALL * a.subscript().length())
          .sum();
    } else if (r instanceof Relation.Digits digits) {
      return SMALL * digits.text().length();
    } else if (r instanceof Relation.Amount amount) {
      return SMALL * (amount.quantity().format(amount.digits()).length() + 1);
    } else if (r instanceof Relation.Sum sum) {
      return joined(sum.terms(), SIGN);
    } else if (r instanceof Relation.Minus minus) {
      return SIGN + width(minus.operand());
    } else if (r instanceof Relation.Product product) {
      return joined(product.factors(), 0.6);
    } else if (r instanceof Relation.Fraction fraction) {
      return 0.4 + Math.max(width(fraction.numerator()), width(fraction.denominator()));
    } else if (r instanceof Relation.Power power) {
      return 0.7 + width(power.base()) + 0.7 * width(power.exponent());
    } else if (r instanceof Relation.Root root) {
      return 1 + width(root.radicand());
    } else if (r instanceof Relation.Call call) {
      return SMALL * call.function().length() + 1 + joined(call.arguments(), 0.6);
    } else if (r instanceof Relation.Parallel parallel) {
      return joined(parallel.branches(), SIGN);
    }
    return joined(((Relation.Comparison) r).sides(), SIGN + 0.3);
  }

  private static double joined(List<Relation> parts, double between) {
    return parts.stream().mapToDouble(RelationWidth::width).sum() + between * (parts.size() - 1);
  }
}
