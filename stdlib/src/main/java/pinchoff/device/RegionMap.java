package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import pinchoff.chart.Axis;
import pinchoff.chart.Chart;
import pinchoff.chart.Item;
import pinchoff.chart.Locus;
import pinchoff.chart.Marker;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * The plane of V_DS and V_GS with the regions of a transistor and the boundary between triode and
 * saturation; V_SD and V_SG for a p device.
 *
 * @param transistor whose regions
 * @param sourceBody V_SB, or V_BS
 * @param drainReach largest V_DS, or V_SD
 * @param gateReach largest V_GS, or V_SG
 * @param marked operating points to show with their least margin
 */
public record RegionMap(
    Transistor transistor,
    Quantity sourceBody,
    Quantity drainReach,
    Quantity gateReach,
    List<OperatingPoint> marked)
    implements Displayable {
  private static final int POINTS = 120;
  private static final double USUAL = 1.8;

  /** Checks the dimensions, and that the marked points belong to the transistor. */
  public RegionMap {
    marked = List.copyOf(marked);
    Labels labels = Labels.of(transistor.polarity());
    sourceBody.requireDimension(labels.sourceBody(), Dimension.VOLTAGE);
    Check.positive("largest " + labels.drainSource(), drainReach, Dimension.VOLTAGE);
    Check.positive("largest " + labels.gateSource(), gateReach, Dimension.VOLTAGE);
    for (OperatingPoint op : marked) {
      Curves.requireSame(transistor, op);
    }
  }

  static RegionMap of(Transistor transistor) {
    Ratings ratings = transistor.device().ratings();
    return new RegionMap(
        transistor,
        Curves.volts(0),
        ratings.drainSource().orElse(Curves.volts(USUAL)),
        ratings.gateSource().orElse(Curves.volts(USUAL)),
        List.of());
  }

  /** This map at a V_SB, or V_BS. */
  public RegionMap at(Known sourceBodyVoltage) {
    return new RegionMap(
        transistor, Check.sourceBody(transistor, sourceBodyVoltage), drainReach, gateReach, marked);
  }

  /** This map up to other voltages. */
  public RegionMap upTo(Quantity largestDrain, Quantity largestGate) {
    return new RegionMap(transistor, sourceBody, largestDrain, largestGate, marked);
  }

  /**
   * This map with an operating point.
   *
   * @throws DeviceException if it belongs to another transistor
   */
  public RegionMap mark(OperatingPoint op) {
    List<OperatingPoint> all = new ArrayList<>(marked);
    all.add(op);
    return new RegionMap(transistor, sourceBody, drainReach, gateReach, all);
  }

  /** The chart. */
  public Chart chart() {
    Labels labels = Labels.of(transistor.polarity());
    String body = sourceBody.isZero() ? "" : " at " + labels.sourceBody() + " = " + sourceBody;
    return Chart.of(
            Axis.of(labels.drainSource(), Dimension.VOLTAGE).range(Curves.volts(0), drainReach),
            Axis.of(labels.gateSource(), Dimension.VOLTAGE)
                .range(Curves.volts(lowest()), gateReach))
        .titled("Regions of " + transistor + body)
        .with(items(labels));
  }

  private double lowest() {
    double threshold = transistor.channel().thresholdAt(sourceBody.si());
    return transistor.model().conductsBelowThreshold() || threshold > 0
        ? Math.min(0, gateReach.si() / 2)
        : Math.min(2 * threshold, -0.2);
  }

  private List<Item> items(Labels labels) {
    Channel channel = transistor.channel();
    double vsb = sourceBody.si();
    double from =
        transistor.model().conductsBelowThreshold()
            ? lowest()
            : Math.max(lowest(), Math.min(gateReach.si(), channel.thresholdAt(vsb)));
    double[] gate = new double[POINTS + 1];
    double[] edge = new double[POINTS + 1];
    for (int i = 0; i <= POINTS; i++) {
      gate[i] = from + (gateReach.si() - from) * i / POINTS;
      edge[i] =
          Math.min(drainReach.si(), transistor.model().saturationVoltage(channel, gate[i], vsb));
    }
    List<Item> items = new ArrayList<>();
    if (from > lowest()) {
      items.add(area(Region.CUTOFF.words(), new double[] {lowest(), from}, zeros(2), full(2)));
    }
    items.add(area(Region.TRIODE.words(), gate, zeros(gate.length), edge));
    items.add(area(Region.SATURATION.words(), gate, edge, full(gate.length)));
    items.add(Locus.of(labels.drainSource() + " = " + labels.saturation(), edge, gate));
    for (OperatingPoint op : marked) {
      items.add(
          Marker.of(op.margin() + " of margin", op.drainSourceVoltage(), op.gateSourceVoltage()));
    }
    return items;
  }

  /** The area between two values of V_DS over the values of V_GS. */
  private static Item area(String name, double[] gate, double[] left, double[] right) {
    int n = gate.length;
    double[] xs = new double[2 * n];
    double[] ys = new double[2 * n];
    for (int i = 0; i < n; i++) {
      xs[i] = left[i];
      ys[i] = gate[i];
      xs[2 * n - 1 - i] = right[i];
      ys[2 * n - 1 - i] = gate[i];
    }
    return pinchoff.chart.Region.of(name, xs, ys);
  }

  private static double[] zeros(int n) {
    return new double[n];
  }

  private double[] full(int n) {
    double[] all = new double[n];
    java.util.Arrays.fill(all, drainReach.si());
    return all;
  }

  @Override
  public MimeBundle display() {
    return chart().display();
  }
}
