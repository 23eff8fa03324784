package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import pinchoff.chart.Axis;
import pinchoff.chart.Chart;
import pinchoff.chart.Item;
import pinchoff.chart.Line;
import pinchoff.chart.Locus;
import pinchoff.chart.Marker;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * g_m/I_D against the inversion coefficient by the all-region model, (1 − e^−√IC)/(√IC n U_T), with
 * both asymptotes: 1/(n U_T) in weak inversion and 1/(√IC n U_T) in strong inversion (Enz,
 * Krummenacher and Vittoz, 1995).
 *
 * @param transistor whose slope factor and temperature
 * @param marked operating points to show at their own g_m/I_D
 */
public record EfficiencyCurve(Transistor transistor, List<OperatingPoint> marked)
    implements Displayable {
  private static final int POINTS = 200;
  private static final int LOWEST = -3;
  private static final int HIGHEST = 3;

  /** Checks that a slope factor is known and that the marked points belong to the transistor. */
  public EfficiencyCurve {
    marked = List.copyOf(marked);
    AllRegion.STANDARD
        .lacking(transistor)
        .ifPresent(
            what -> {
              throw new DeviceException(
                  "g_m/I_D of " + transistor.device().name() + ": " + what + " is missing");
            });
    for (OperatingPoint op : marked) {
      Curves.requireSame(transistor, op);
    }
  }

  /** This curve with an operating point. */
  public EfficiencyCurve mark(OperatingPoint op) {
    List<OperatingPoint> all = new ArrayList<>(marked);
    all.add(op);
    return new EfficiencyCurve(transistor, all);
  }

  /** g_m/I_D at an inversion coefficient (1/V). */
  private static double at(double coefficient, double scale) {
    double root = Math.sqrt(coefficient);
    return -StrictMath.expm1(-root) / (root * scale);
  }

  /** The chart. */
  public Chart chart() {
    Channel c = transistor.channel();
    double scale = c.slope() * c.thermal();
    double[] ic = new double[POINTS + 1];
    double[] efficiency = new double[POINTS + 1];
    double[] strong = new double[POINTS + 1];
    double[] weak = new double[POINTS + 1];
    for (int i = 0; i <= POINTS; i++) {
      ic[i] = StrictMath.pow(10, LOWEST + (double) (HIGHEST - LOWEST) * i / POINTS);
      efficiency[i] = at(ic[i], scale);
      weak[i] = 1 / scale;
      strong[i] = ic[i] < 0.3 ? Double.NaN : 1 / (Math.sqrt(ic[i]) * scale);
    }
    List<Item> items = new ArrayList<>();
    items.add(Line.of("all-region", ic, efficiency));
    items.add(Locus.of("weak inversion", ic, weak));
    items.add(Locus.of("strong inversion", ic, strong));
    for (OperatingPoint op : marked) {
      op.transconductanceEfficiency()
          .ifPresent(
              value ->
                  items.add(
                      Marker.of(
                          op.transistor().model().name(),
                          Quantity.ofSi(op.inversion().coefficient(), Dimension.NONE),
                          value)));
    }
    return Chart.of(
            Axis.of("IC", Dimension.NONE).log(), Axis.of("g_m/I_D", Dimension.PER_VOLTAGE).log())
        .titled("Transconductance efficiency of " + transistor.device().name())
        .with(items);
  }

  @Override
  public MimeBundle display() {
    return chart().display();
  }
}
