package pinchoff.quantity;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A unit: a product of named units with prefixes and rational exponents, such as {@code uA/V^2},
 * {@code fF/um^2}, {@code V/√Hz}.
 *
 * <p>Two units are equal if they are written with the same factors; {@code J} and {@code V*C} have
 * the same dimension and size but are not equal.
 */
public final class Unit {

  /** The unit of a pure number. */
  public static final Unit ONE = new Unit(List.of());

  private final List<UnitFactor> factors;
  private final Dimension dimension;
  private final BigDecimal size;
  private final boolean decimal;
  private final int power;

  private Unit(List<UnitFactor> factors) {
    this.factors = List.copyOf(factors);
    this.dimension =
        factors.stream().map(UnitFactor::dimension).reduce(Dimension.NONE, Dimension::times);
    this.size = UnitSize.of(factors);
    this.decimal = size.unscaledValue().equals(BigInteger.ONE);
    this.power = decimal ? -size.scale() : 0;
  }

  /**
   * Reads a unit.
   *
   * <p>Factors are joined by {@code *} or a middle dot and {@code /}, read from left to right, so
   * {@code cm^2/V/s} is the same as {@code cm^2/(V*s)}. A power is {@code V^2}, {@code V^-1},
   * {@code V^0.5}, {@code V^(1/3)} or a superscript; a root may be written {@code √V}, {@code
   * sqrt(V)}. {@code 1/V} is a unit too, and {@code dec}, {@code oct}, {@code sq} are labels of
   * size one. {@code u}, {@code µ} and {@code μ} are the same, as are {@code ohm}, {@code Ohm} and
   * {@code Ω}.
   *
   * @param text at most 256 characters
   * @throws QuantityException with the place of the fault and, where there is one, the unit that
   *     may have been meant
   */
  public static Unit parse(String text) {
    return UnitParser.unit(text);
  }

  static Unit of(List<UnitFactor> product) {
    List<UnitFactor> merged = new ArrayList<>();
    for (UnitFactor factor : product) {
      int at = 0;
      while (at < merged.size() && !merged.get(at).sameUnit(factor)) {
        at++;
      }
      if (at == merged.size()) {
        merged.add(factor);
      } else {
        int parts = merged.get(at).parts() + factor.parts();
        merged.set(at, factor.withParts(parts));
      }
    }
    merged.removeIf(factor -> factor.parts() == 0);
    merged.sort(
        Comparator.comparing(factor -> factor.parts() < 0)); // what is divided by comes last
    return merged.isEmpty() ? ONE : new Unit(merged);
  }

  /** What it measures. */
  public Dimension dimension() {
    return dimension;
  }

  /** The size of one such unit in SI: 1e-6 for {@code uA}. */
  public double factor() {
    return size.doubleValue();
  }

  /** How it is shown: {@code "µA/V²"}; empty for a pure number. */
  public String symbol() {
    return UnitText.PRETTY.of(factors);
  }

  /**
   * How it is written in ASCII, in a form that {@link #parse} reads: {@code "uA/V^2"}, {@code "1"}.
   */
  public String ascii() {
    return factors.isEmpty() ? "1" : UnitText.ASCII.of(factors);
  }

  /** How it is shown in HTML: {@code "µA/V<sup>2</sup>"}; empty for a pure number. */
  public String html() {
    return UnitText.HTML.of(factors);
  }

  /** How it is typeset by LaTeX in math mode; empty for a pure number. */
  public String latex() {
    String inner = UnitText.LATEX.of(factors);
    return inner.isEmpty() ? "" : "\\mathrm{" + inner + "}";
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Unit u && factors.equals(u.factors);
  }

  @Override
  public int hashCode() {
    return factors.hashCode();
  }

  /** The ASCII form. */
  @Override
  public String toString() {
    return ascii();
  }

  List<UnitFactor> factors() {
    return factors;
  }

  /** A number of this unit in SI; the number means its shortest decimal. */
  double toSi(double value) {
    return decimal
        ? Decimal.scale(value, power)
        : Decimal.of(value).multiply(size, MathContext.DECIMAL128).doubleValue();
  }

  /** A decimal number of this unit in SI. */
  double toSi(BigDecimal value) {
    return value.multiply(size).doubleValue();
  }

  /** An SI value as a number of this unit. */
  double fromSi(double si) {
    return decimal
        ? Decimal.scale(si, -power)
        : Decimal.of(si).divide(size, MathContext.DECIMAL128).doubleValue();
  }

  /** An SI value as a decimal number of this unit, to 34 digits. */
  BigDecimal decimalFromSi(double si) {
    return decimal
        ? Decimal.of(si).scaleByPowerOfTen(-power)
        : Decimal.of(si).divide(size, MathContext.DECIMAL128);
  }

  /** The power of ten of a size that is one. */
  int decimalPower() {
    return power;
  }

  /** True if its size is a power of ten, so that decimal numbers convert exactly. */
  boolean isDecimal() {
    return decimal;
  }
}
