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
 * I_D against V_DS for some V_GS, with the edge of saturation as a dashed locus; V_SG and V_SD for
 * a p device.
 *
 * @param transistor whose curves
 * @param drives V_GS of each curve, or V_SG
 * @param sourceBody V_SB of all curves, or V_BS
 * @param reach largest V_DS, or V_SD
 * @param marked operating points to show
 */
public record OutputCurves(
    Transistor transistor,
    List<Quantity> drives,
    Quantity sourceBody,
    Quantity reach,
    List<OperatingPoint> marked)
    implements Displayable {
  private static final int MOST_CURVES = 16;
  private static final int LOCUS_POINTS = 80;

  /** Checks the dimensions, and that the marked points belong to the transistor. */
  public OutputCurves {
    drives = List.copyOf(drives);
    marked = List.copyOf(marked);
    Labels labels = Labels.of(transistor.polarity());
    if (drives.isEmpty() || drives.size() > MOST_CURVES) {
      throw new DeviceException(
          "%d output curves: expected 1 to %d values of %s"
              .formatted(drives.size(), MOST_CURVES, labels.gateSource()));
    }
    drives.forEach(v -> v.requireDimension(labels.gateSource(), Dimension.VOLTAGE));
    sourceBody.requireDimension(labels.sourceBody(), Dimension.VOLTAGE);
    Check.positive("largest " + labels.drainSource(), reach, Dimension.VOLTAGE);
    for (OperatingPoint op : marked) {
      Curves.requireSame(transistor, op);
    }
  }

  static OutputCurves of(Transistor transistor, List<Quantity> drives) {
    Quantity reach =
        transistor.device().ratings().drainSource().orElseGet(() -> farEnough(transistor, drives));
    return new OutputCurves(transistor, drives, Curves.volts(0), reach, List.of());
  }

  /** Twice the largest overdrive, and a volt at least. */
  private static Quantity farEnough(Transistor transistor, List<Quantity> drives) {
    double threshold = transistor.channel().threshold();
    double most = drives.stream().mapToDouble(Quantity::si).max().orElse(0) - threshold;
    return Curves.volts(Math.max(1, 2 * most));
  }

  /** These curves up to another largest V_DS, or V_SD. */
  public OutputCurves upTo(Quantity largest) {
    return new OutputCurves(transistor, drives, sourceBody, largest, marked);
  }

  /** These curves at a V_SB, or V_BS. */
  public OutputCurves at(Known sourceBodyVoltage) {
    return new OutputCurves(
        transistor, drives, Check.sourceBody(transistor, sourceBodyVoltage), reach, marked);
  }

  /**
   * These curves with an operating point marked.
   *
   * @throws DeviceException if it belongs to another transistor
   */
  public OutputCurves mark(OperatingPoint op) {
    List<OperatingPoint> all = new ArrayList<>(marked);
    all.add(op);
    return new OutputCurves(transistor, drives, sourceBody, reach, all);
  }

  /** The chart. */
  public Chart chart() {
    Labels labels = Labels.of(transistor.polarity());
    Curves curves = new Curves(transistor);
    double vsb = sourceBody.si();
    List<Item> items = new ArrayList<>();
    double strongest = Double.NEGATIVE_INFINITY;
    for (Quantity drive : drives) {
      strongest = Math.max(strongest, drive.si());
      double bend = transistor.model().saturationVoltage(curves.channel(), drive.si(), vsb);
      double[] vds = Curves.steps(0, reach.si(), bend);
      items.add(
          Line.of(
              labels.gateSource() + " = " + drive, vds, curves.overDrain(vds, drive.si(), vsb)));
    }
    items.add(edge(curves, strongest, vsb));
    for (OperatingPoint op : marked) {
      items.add(Marker.of(Curves.mark(op), op.drainSourceVoltage(), op.drainCurrent()));
    }
    String body = sourceBody.isZero() ? "" : ", " + labels.sourceBody() + " = " + sourceBody;
    return Chart.of(
            Axis.of(labels.drainSource(), Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Output curves of " + transistor + body)
        .with(items);
  }

  /** Where each curve enters saturation, from the threshold to the strongest drive. */
  private Locus edge(Curves curves, double strongest, double vsb) {
    double from = curves.channel().thresholdAt(vsb);
    double[] vds = new double[LOCUS_POINTS + 1];
    double[] currents = new double[LOCUS_POINTS + 1];
    for (int i = 0; i <= LOCUS_POINTS; i++) {
      double vgs = from + Math.max(0, strongest - from) * i / LOCUS_POINTS;
      double at = transistor.model().saturationVoltage(curves.channel(), vgs, vsb);
      boolean seen = at <= reach.si();
      vds[i] = seen ? at : Double.NaN;
      currents[i] = seen ? curves.current(vgs, at, vsb) : Double.NaN;
    }
    return Locus.of("edge of saturation", vds, currents);
  }

  @Override
  public MimeBundle display() {
    return chart().display();
  }
}
