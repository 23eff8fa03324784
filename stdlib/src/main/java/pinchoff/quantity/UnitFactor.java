package pinchoff.quantity;

/**
 * One factor of a unit: a named unit with a prefix to a power.
 *
 * @param parts the exponent in sixtieths, never 0 in a finished unit
 */
record UnitFactor(Prefix prefix, NamedUnit unit, int parts) {
  private static final int MOST = 99;

  /** This to a further power, in sixtieths. */
  UnitFactor raisedTo(int exponent) {
    long product = (long) parts * exponent;
    if (product % Dimension.PARTS != 0) {
      throw new QuantityException(
          "a power of "
              + ascii()
              + ": expected an exponent that is a multiple of 1/"
              + Dimension.PARTS);
    }
    if (Math.abs(product) > (long) MOST * Dimension.PARTS * Dimension.PARTS) {
      throw new QuantityException(
          "a power of " + ascii() + ": expected an exponent of at most " + MOST);
    }
    return withParts((int) (product / Dimension.PARTS));
  }

  UnitFactor withParts(int exponent) {
    return new UnitFactor(prefix, unit, exponent);
  }

  UnitFactor withPrefix(Prefix other) {
    return new UnitFactor(other, unit, parts);
  }

  boolean sameUnit(UnitFactor other) {
    return prefix == other.prefix && unit == other.unit;
  }

  Dimension dimension() {
    return unit.dimension().isNone()
        ? Dimension.NONE
        : unit.dimension().pow(parts, Dimension.PARTS);
  }

  String ascii() {
    return prefix.ascii() + unit.ascii();
  }

  String symbol() {
    return prefix.symbol() + unit.symbol();
  }
}
