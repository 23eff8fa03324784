package pinchoff.chart;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.drawing.TextLine;
import pinchoff.quantity.Engineering;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Unit;

/**
 * Ticks at powers of ten, and between them where there are few. A label has its own prefix ("10
 * nA"); pure numbers and units that take no prefix have powers of ten.
 */
final class LogTicks {
  private static final double FINE_ROOM = 45;
  private static final double MOST_ROOM = 60;
  private static final int THOUSAND = 3;
  private static final int PLAIN_FROM = -3;
  private static final int PLAIN_TO = 4;

  private final Axis axis;
  private final Range range;
  private final Unit unit;
  private final double length;
  private final double decadeLength;
  private final double room;

  private LogTicks(Axis axis, Range range, double length, double room) {
    this.axis = axis;
    this.range = range;
    this.unit = axis.unit().orElseGet(() -> Engineering.ticks(axis.dimension(), 0, 1).unit());
    this.length = length;
    this.decadeLength = length / StrictMath.log10(range.high() / range.low());
    this.room = room;
  }

  static TickMarks of(Axis axis, Range range, double length, double room) {
    return new LogTicks(axis, range, length, room).marks();
  }

  private TickMarks marks() {
    List<Double> values = labelled();
    if (values.size() < 2) {
      // Within a decade the places are logarithmic, the numbers those of a linear axis.
      return LinearTicks.of(axis, range, length, room);
    }
    List<Engineering> prefixed = values.stream().map(this::engineering).toList();
    long units =
        axis.unit().isPresent() ? 1 : prefixed.stream().map(Engineering::in).distinct().count();
    if (units > 1 && prefixed.stream().allMatch(e -> e.number().matches("\\d{1,3}"))) {
      return marks(values, prefixed.stream().map(e -> TextLine.plain(e.text())).toList(), "");
    }
    Unit common =
        axis.unit()
            .or(() -> units == 1 ? Optional.of(prefixed.get(0).in()) : Optional.empty())
            .orElse(unit);
    boolean plain = values.stream().allMatch(v -> isPlain(v / common.factor()));
    return marks(
        values,
        values.stream()
            .map(v -> v / common.factor())
            .map(number -> plain ? plain(number) : power(number))
            .toList(),
        common.symbol());
  }

  private TickMarks marks(List<Double> values, List<TextLine> labels, String unitText) {
    List<TickMarks.Tick> ticks = new ArrayList<>();
    for (int i = 0; i < values.size(); i++) {
      ticks.add(new TickMarks.Tick(values.get(i), labels.get(i)));
    }
    return new TickMarks(ticks, fine(), TextLine.plain(unitText));
  }

  /** The values that bear a label. */
  private List<Double> labelled() {
    int needed = (int) Math.ceil(Math.min(room, MOST_ROOM) / decadeLength);
    int every = needed <= 1 ? 1 : THOUSAND * Math.floorDiv(needed + THOUSAND - 1, THOUSAND);
    double halfway = decadeLength * StrictMath.log10(2); // from 1 to 2, the closest of 1, 2, 5
    int[] within = halfway > room ? new int[] {1, 2, 5} : new int[] {1};
    List<Double> values = new ArrayList<>();
    for (int decade = firstDecade(); decade <= lastDecade(); decade++) {
      if (Math.floorMod(decade, every) == 0) {
        for (int m : within) {
          addWithin(values, m * power(decade));
        }
      }
    }
    return values;
  }

  /** Grid lines at 2 to 9 times a power of ten, or at the powers that bear no label. */
  private List<Double> fine() {
    List<Double> values = new ArrayList<>();
    int last = decadeLength >= FINE_ROOM ? 9 : 1;
    for (int decade = firstDecade(); decade <= lastDecade(); decade++) {
      for (int m = 1; m <= last; m++) {
        addWithin(values, m * power(decade));
      }
    }
    return values;
  }

  private void addWithin(List<Double> values, double value) {
    double slack = 1e-9;
    if (value >= range.low() * (1 - slack) && value <= range.high() * (1 + slack)) {
      values.add(value);
    }
  }

  private int firstDecade() {
    return (int) Math.floor(StrictMath.log10(range.low() / unit.factor()));
  }

  private int lastDecade() {
    return (int) Math.ceil(StrictMath.log10(range.high() / unit.factor()));
  }

  private double power(int decade) {
    return Double.parseDouble("1e" + decade) * unit.factor();
  }

  private Engineering engineering(double value) {
    return Engineering.of(Quantity.ofSi(value, axis.dimension()), 1);
  }

  private static boolean isPlain(double number) {
    double exponent = StrictMath.log10(number);
    return exponent > PLAIN_FROM - 0.01 && exponent < PLAIN_TO + 0.01;
  }

  private static TextLine plain(double number) {
    return TextLine.plain(new BigDecimal(number).round(new MathContext(1)).toPlainString());
  }

  private static TextLine power(double number) {
    int exponent = (int) Math.floor(StrictMath.log10(number) + 1e-9);
    long mantissa = Math.round(number / StrictMath.pow(10, exponent));
    String before = mantissa == 1 ? "10" : mantissa + "·10";
    return TextLine.power(before, LinearTicks.minus(Integer.toString(exponent)));
  }
}
