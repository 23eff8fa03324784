package pinchoff.page;

/**
 * Where a part of a relation stands. It decides whether the part needs parentheses there: in a line
 * of text, and in two dimensions, where a fraction bar and a raised exponent do their work.
 */
enum Place {
  /** Alone, under a root, between bars or as an argument. */
  FREE,
  SIDE,
  TERM,
  SUBTRAHEND,
  BRANCH,
  FACTOR,
  NUMERATOR,
  DENOMINATOR,
  BASE,
  EXPONENT;

  /** True if the part needs parentheses in a line of text. */
  boolean enclosesInLine(Relation part) {
    Precedence precedence = Precedence.of(part);
    return switch (this) {
      case FREE -> false;
      case SIDE, TERM -> precedence == Precedence.COMPARISON;
      case SUBTRAHEND -> precedence.compareTo(Precedence.SIGN) <= 0;
      case BRANCH -> precedence.compareTo(Precedence.PARALLEL) <= 0;
      case FACTOR, NUMERATOR ->
          precedence != Precedence.PRODUCT && precedence.compareTo(Precedence.FRACTION) <= 0;
      case DENOMINATOR -> precedence.compareTo(Precedence.FRACTION) <= 0;
      case BASE, EXPONENT -> precedence != Precedence.ATOM;
    };
  }

  /** True if the part needs parentheses in two dimensions; then it needs them in a line too. */
  boolean encloses(Relation part) {
    return switch (this) {
      case FACTOR -> Precedence.of(part).compareTo(Precedence.PARALLEL) <= 0 || isSlashed(part);
      case NUMERATOR, DENOMINATOR, EXPONENT -> Precedence.of(part) == Precedence.COMPARISON;
      default -> enclosesInLine(part);
    };
  }

  private static boolean isSlashed(Relation part) {
    return part instanceof Relation.Name name && name.symbol().atoms().size() > 1;
  }
}
