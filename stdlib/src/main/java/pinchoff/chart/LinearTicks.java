package pinchoff.chart;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import pinchoff.drawing.TextLine;
import pinchoff.quantity.Unit;

/** Ticks at multiples of 1, 2 or 5 times a power of ten, all with the same number of decimals. */
final class LinearTicks {
  private static final int[] STEPS = {1, 2, 5, 10};
  private static final int MOST = 60;
  private static final int PLAIN_DIGITS = 7;

  private LinearTicks() {}

  /**
   * Ticks for a range.
   *
   * @param length of the axis in CSS pixels
   * @param room that a tick and its label need at least
   */
  static TickMarks of(Axis axis, Range range, double length, double room) {
    double roughStep = range.span() * room / length;
    double largest = Math.floor(range.size() / roughStep) * roughStep;
    Unit unit = AxisUnit.of(axis, largest);
    double size = unit.factor();
    return new TickMarks(
        ticks(new Range(range.low() / size, range.high() / size), roughStep / size, size),
        List.of(),
        AxisUnit.text(unit));
  }

  /** Ticks of a range in the unit of the axis. */
  private static List<TickMarks.Tick> ticks(Range range, double roughStep, double size) {
    int exponent = (int) Math.floor(StrictMath.log10(roughStep));
    int mantissa = mantissa(roughStep, exponent);
    BigDecimal step = BigDecimal.valueOf(mantissa).scaleByPowerOfTen(exponent);
    double width = step.doubleValue();
    double slack = 1e-9;
    long first = (long) Math.ceil(range.low() / width - slack);
    long last = (long) Math.floor(range.high() / width + slack);
    List<TickMarks.Tick> ticks = new ArrayList<>();
    for (long k = first; k <= last && ticks.size() < MOST; k++) {
      BigDecimal number = step.multiply(BigDecimal.valueOf(k));
      ticks.add(new TickMarks.Tick(number.doubleValue() * size, label(number, exponent)));
    }
    return ticks;
  }

  private static int mantissa(double roughStep, int exponent) {
    double scaled = roughStep / StrictMath.pow(10, exponent);
    for (int step : STEPS) {
      if (step >= scaled * (1 - 1e-9)) {
        return step;
      }
    }
    return 10;
  }

  private static TextLine label(BigDecimal number, int exponent) {
    if (number.signum() == 0) {
      return TextLine.plain("0");
    }
    int leading = number.precision() - number.scale() - 1;
    if (leading >= PLAIN_DIGITS || leading < -PLAIN_DIGITS) {
      BigDecimal scaled = number.scaleByPowerOfTen(-leading).stripTrailingZeros();
      return TextLine.power(
          minus(scaled.toPlainString()) + "·10", minus(Integer.toString(leading)));
    }
    return TextLine.plain(minus(number.setScale(Math.max(0, -exponent)).toPlainString()));
  }

  /** With a true minus sign. */
  static String minus(String number) {
    return number.replace('-', '−');
  }
}
