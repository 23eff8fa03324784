package pinchoff.page;

import pinchoff.page.Relation.Amount;
import pinchoff.page.Relation.Comparison;
import pinchoff.page.Relation.Fraction;
import pinchoff.page.Relation.Minus;
import pinchoff.page.Relation.Name;
import pinchoff.page.Relation.Parallel;
import pinchoff.page.Relation.Power;
import pinchoff.page.Relation.Product;
import pinchoff.page.Relation.Sum;

/** How tightly the parts of a relation hold together, from a comparison to a single symbol. */
enum Precedence {
  COMPARISON,
  SUM,
  SIGN,
  PARALLEL,
  AMOUNT,
  PRODUCT,
  FRACTION,
  POWER,
  ATOM;

  static Precedence of(Relation relation) {
    if (relation instanceof Comparison) {
      return COMPARISON;
    } else if (relation instanceof Sum) {
      return SUM;
    } else if (relation instanceof Minus) {
      return SIGN;
    } else if (relation instanceof Parallel) {
      return PARALLEL;
    } else if (relation instanceof Amount) {
      return AMOUNT;
    } else if (relation instanceof Product) {
      return PRODUCT;
    } else if (relation instanceof Fraction) {
      return FRACTION;
    } else if (relation instanceof Power) {
      return POWER;
    } else if (relation instanceof Name name) {
      return of(name.symbol());
    }
    return ATOM;
  }

  /** A symbol such as g_m/I_D is a fraction, one such as 2φ_F a product. */
  private static Precedence of(Symbol symbol) {
    if (symbol.atoms().size() > 1) {
      return FRACTION;
    }
    return symbol.atoms().get(0).lead().isEmpty() ? ATOM : PRODUCT;
  }
}
