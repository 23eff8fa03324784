package pinchoff.page;

/** Where factors that stand beside each other need a dot between them. */
final class Products {
  private Products() {}

  /** True if the right factor begins with a digit, or the left one ends in a unit. */
  static boolean needDot(Relation left, Relation right) {
    return left instanceof Relation.Amount || beginsWithDigit(right);
  }

  private static boolean beginsWithDigit(Relation relation) {
    if (relation instanceof Relation.Digits || relation instanceof Relation.Amount) {
      return true;
    } else if (relation instanceof Relation.Power power) {
      return beginsWithDigit(power.base());
    } else if (relation instanceof Relation.Product product) {
      return beginsWithDigit(product.factors().get(0));
    } else if (relation instanceof Relation.Name name) {
      return !name.symbol().atoms().get(0).lead().isEmpty();
    }
    return false;
  }
}
