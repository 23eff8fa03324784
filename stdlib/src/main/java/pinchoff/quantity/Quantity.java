package pinchoff.quantity;

import java.math.BigDecimal;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/**
 * A number with a dimension: a voltage, a current, a body factor in √V.
 *
 * <p>Held as a double in SI; equality and order look at value and dimension alone. A quantity may
 * remember a unit to be shown in: the one of {@link #to(Unit)}, or the one it was made with if that
 * is not what it would be shown in anyway (eV, cm, %, mV/dec). Sums and multiples by a number keep
 * it, products of quantities do not.
 *
 * <p>Results that are NaN or infinite are refused. Minus zero becomes zero.
 */
public final class Quantity implements Comparable<Quantity>, Displayable {
  private static final String BY_ZERO = "divided by zero";

  private final double si;
  private final Dimension dimension;
  private final @Nullable Unit shown;

  private Quantity(double si, Dimension dimension, @Nullable Unit shown) {
    this.si = si + 0.0; // minus zero becomes zero
    this.dimension = dimension;
    this.shown = shown;
  }

  /**
   * A number of some unit.
   *
   * @throws QuantityException if the number is NaN or infinite, or too large in SI
   */
  public static Quantity of(double value, Unit unit) {
    if (!Double.isFinite(value)) {
      throw new QuantityException(
          Decimal.text(value) + " " + unit.ascii() + ": expected a finite number");
    }
    double si = unit.toSi(value);
    if (!Double.isFinite(si) || (si == 0 && value != 0)) {
      throw new QuantityException(
          Decimal.text(value) + " " + unit.ascii() + ": out of range in SI");
    }
    return shownIn(si, unit);
  }

  /**
   * A number of the coherent SI unit of a dimension.
   *
   * @throws QuantityException if the number is NaN or infinite
   */
  public static Quantity ofSi(double si, Dimension dimension) {
    if (!Double.isFinite(si)) {
      throw new QuantityException(
          Decimal.text(si) + " " + dimension + ": expected a finite number");
    }
    return new Quantity(si, dimension, null);
  }

  /**
   * Reads a number and a unit, such as {@code "650 mV"} or {@code "387 uA/V^2"}; without a unit it
   * is a pure number. {@link Unit#parse} says how units are written.
   *
   * @param text at most 256 characters
   * @throws QuantityException with the place of the fault
   */
  public static Quantity parse(String text) {
    return QuantityParser.quantity(text);
  }

  /** An SI value that remembers its unit where that says something. */
  static Quantity shownIn(double si, Unit unit) {
    boolean usual = DisplayUnits.of(unit.dimension()).covers(unit);
    return new Quantity(si, unit.dimension(), usual ? null : unit);
  }

  /** The value in SI. */
  public double si() {
    return si;
  }

  /** What it measures. */
  public Dimension dimension() {
    return dimension;
  }

  /** The unit that it asks to be shown in, if it does. */
  public Optional<Unit> displayUnit() {
    return Optional.ofNullable(shown);
  }

  /**
   * The number in a unit.
   *
   * @throws QuantityException if the unit is of another dimension
   */
  public double in(Unit unit) {
    if (!unit.dimension().equals(dimension)) {
      throw new QuantityException(
          this
              + " in "
              + unit.ascii()
              + ": "
              + dimension.description()
              + " is not "
              + unit.dimension().description()
              + "; expected a unit such as "
              + DisplayUnits.of(dimension).base().ascii());
    }
    double value = unit.fromSi(si);
    if (!Double.isFinite(value)) {
      throw new QuantityException(this + " in " + unit.ascii() + ": the number is too large");
    }
    return value;
  }

  /**
   * The number in a unit given as text.
   *
   * @throws QuantityException if the text is no unit or one of another dimension
   */
  public double in(String unit) {
    return in(Unit.parse(unit));
  }

  /**
   * The same quantity, shown in a unit.
   *
   * @throws QuantityException if the unit is of another dimension
   */
  public Quantity to(Unit unit) {
    double unused = in(unit);
    return new Quantity(si, dimension, unit);
  }

  /** The same quantity, shown in a unit given as text. */
  public Quantity to(String unit) {
    return to(Unit.parse(unit));
  }

  /** The value of a pure number. */
  public double ratio() {
    if (!dimension.isNone()) {
      throw new QuantityException(
          this + " is " + dimension.description() + ": expected a pure number");
    }
    return si;
  }

  /** The sum. */
  public Quantity plus(Quantity other) {
    requireSame("plus", other);
    double sum = si + other.si;
    return Double.isFinite(sum)
        ? new Quantity(sum, dimension, shown)
        : overflow("plus", other.toString());
  }

  /** The difference. */
  public Quantity minus(Quantity other) {
    requireSame("minus", other);
    double difference = si - other.si;
    return Double.isFinite(difference)
        ? new Quantity(difference, dimension, shown)
        : overflow("minus", other.toString());
  }

  /** The product. */
  public Quantity times(Quantity other) {
    double product = si * other.si;
    return Double.isFinite(product)
        ? new Quantity(product, dimension.times(other.dimension), null)
        : overflow("times", other.toString());
  }

  /** A multiple. */
  public Quantity times(double factor) {
    double product = si * factor;
    return Double.isFinite(product)
        ? new Quantity(product, dimension, shown)
        : overflow("times", Decimal.text(factor));
  }

  /**
   * The quotient.
   *
   * @throws QuantityException if the divisor is zero
   */
  public Quantity per(Quantity divisor) {
    double quotient = si / divisor.si;
    return Double.isFinite(quotient)
        ? new Quantity(quotient, dimension.per(divisor.dimension), null)
        : overflow(divisor.isZero() ? BY_ZERO : "per", divisor.toString());
  }

  /**
   * A fraction.
   *
   * @throws QuantityException if the divisor is zero
   */
  public Quantity per(double divisor) {
    double quotient = si / divisor;
    return Double.isFinite(quotient)
        ? new Quantity(quotient, dimension, shown)
        : overflow(divisor == 0 ? BY_ZERO : "per", Decimal.text(divisor));
  }

  /**
   * A whole power.
   *
   * @throws QuantityException for zero to a negative power
   */
  public Quantity pow(int exponent) {
    return pow(exponent, 1);
  }

  /**
   * A rational power.
   *
   * @param numerator of the exponent
   * @param denominator of the exponent, not 0
   * @throws QuantityException for a root of a negative value, or zero to a negative power
   */
  public Quantity pow(int numerator, int denominator) {
    Dimension raised = dimension.pow(numerator, denominator);
    double power = Powers.rational(si, numerator, denominator);
    if (!Double.isFinite(power)) {
      String exponent = numerator + (denominator == 1 ? "" : "/" + denominator);
      boolean negativeRoot = si < 0 && Double.isNaN(power);
      throw new QuantityException(
          this
              + " to the power "
              + exponent
              + (negativeRoot
                  ? ": a root of a negative value; expected zero or more"
                  : isZero()
                      ? ": division by zero; expected a value other than zero"
                      : ": the result is too large"));
    }
    return new Quantity(power, raised, null);
  }

  /**
   * The square root.
   *
   * @throws QuantityException for a negative value
   */
  public Quantity sqrt() {
    return pow(1, 2);
  }

  /** The same with the other sign. */
  public Quantity negate() {
    return new Quantity(-si, dimension, shown);
  }

  /** Without sign. */
  public Quantity abs() {
    return new Quantity(Math.abs(si), dimension, shown);
  }

  /** The smaller of the two. */
  public Quantity min(Quantity other) {
    return compareTo(other) <= 0 ? this : other;
  }

  /** The larger of the two. */
  public Quantity max(Quantity other) {
    return compareTo(other) >= 0 ? this : other;
  }

  /** True for exactly zero. */
  public boolean isZero() {
    return si == 0;
  }

  /**
   * The order by value.
   *
   * @throws QuantityException if the dimensions differ
   */
  @Override
  public int compareTo(Quantity other) {
    requireSame("compared with", other);
    return Double.compare(si, other.si);
  }

  /**
   * This quantity if it has the expected dimension.
   *
   * @param what what the quantity stands for, as the user knows it: {@code "V_GS of M1"}
   * @throws QuantityException that names it, the value with its unit and what was expected
   */
  public Quantity requireDimension(String what, Dimension expected) {
    if (!dimension.equals(expected)) {
      throw new QuantityException(
          what
              + " = "
              + this
              + " is "
              + dimension.description()
              + ": expected "
              + expected.description());
    }
    return this;
  }

  /** Number and unit with this many significant digits: {@code "650.0 mV"} for 4. */
  public String format(int digits) {
    return Engineering.of(this, digits).text();
  }

  /**
   * Number and unit in full precision and ASCII: {@code parse} of it gives the same quantity to the
   * bit.
   */
  public String asciiText() {
    Unit unit = Engineering.of(this, Engineering.DIGITS).in();
    BigDecimal number = Decimal.shortest(unit.decimalFromSi(si), unit::toSi, si);
    if (unit.toSi(number) != si) {
      unit = CoherentUnits.of(dimension);
      number = unit.decimalFromSi(si);
    }
    String digits = Engineering.shortest(number);
    return unit.equals(Unit.ONE) ? digits : digits + " " + unit.ascii();
  }

  @Override
  public boolean equals(Object other) {
    return this == other
        || (other instanceof Quantity q && si == q.si && dimension.equals(q.dimension));
  }

  @Override
  public int hashCode() {
    return Double.hashCode(si) * 31 + dimension.hashCode();
  }

  /**
   * Engineering text with up to four significant digits: {@code "650 mV"}, {@code "387 µA/V²"},
   * {@code "333.3 mV"}. Trailing zeros are left out, unless digits were rounded away: then they
   * show that {@code "1.000 V"} is not exactly 1 V.
   */
  @Override
  public String toString() {
    return Engineering.brief(this).text();
  }

  @Override
  public MimeBundle display() {
    Engineering brief = Engineering.brief(this);
    String unit = brief.in().html();
    String space = brief.isClose() ? "" : "&nbsp;";
    String html = "<span>" + brief.number() + space + unit + "</span>";
    return MimeBundle.builder(brief.text()).with(MimeBundle.HTML, html).build();
  }

  private void requireSame(String operation, Quantity other) {
    if (!dimension.equals(other.dimension)) {
      throw new QuantityException(
          this
              + " "
              + operation
              + " "
              + other
              + ": "
              + dimension.description()
              + " and "
              + other.dimension.description()
              + "; expected the same dimension");
    }
  }

  private Quantity overflow(String operation, String operand) {
    throw new QuantityException(
        operation.equals(BY_ZERO)
            ? this + " per " + operand + ": division by zero; expected a divisor other than zero"
            : this + " " + operation + " " + operand + ": expected a finite result");
  }
}
