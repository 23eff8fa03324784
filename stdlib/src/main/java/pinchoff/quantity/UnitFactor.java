package pinchoff.quantity;

/**
 * One factor of a unit: a named unit with a prefix to a power.
 *
 * @param parts the exponent in sixtieths, never 0 in a finished unit
 */
record UnitFactor(Prefix prefix, NamedUnit unit, int parts) {

  UnitFactor raisedTo(long numerator, long denominator) {
    long product = parts * numerator;
    long limit = 100L * Dimension.PARTS;
    if (product % denominator != 0) {
      throw new QuantityException(
          "a power of "
              + ascii()
              + ": expected an exponent that is a multiple of 1/"
              + Dimension.PARTS);
    }
    if (Math.abs(product / denominator) > limit) {
      throw new QuantityException("a power of " + ascii() + ": expected an exponent below 100");
    }
    return new UnitFactor(prefix, unit, (int) (product / denominator));
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
