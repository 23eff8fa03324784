package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import pinchoff.chart.Axis;
import pinchoff.chart.Chart;
import pinchoff.chart.Guide;
import pinchoff.chart.Line;
import pinchoff.chart.Marker;
import pinchoff.chart.Panel;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * I_D and √I_D against V_GS at one V_DS; V_SG and V_SD for a p device. In the square law √I_D is a
 * straight line from V_TH on.
 *
 * @param transistor whose curve
 * @param drainSource V_DS, or V_SD
 * @param sourceBody V_SB, or V_BS
 * @param from least V_GS
 * @param to largest V_GS
 * @param marked operating points to show
 */
public record TransferCurve(
    Transistor transistor,
    Quantity drainSource,
    Quantity sourceBody,
    Quantity from,
    Quantity to,
    List<OperatingPoint> marked)
    implements Displayable {
  private static final double MARGIN = 0.2;
  private static final double SPAN = 1.2;

  /** Checks the dimensions and the order of the limits. */
  public TransferCurve {
    Labels labels = Labels.of(transistor.polarity());
    marked = List.copyOf(marked);
    Check.positive(labels.drainSource(), drainSource, Dimension.VOLTAGE);
    sourceBody.requireDimension(labels.sourceBody(), Dimension.VOLTAGE);
    from.requireDimension("least " + labels.gateSource(), Dimension.VOLTAGE);
    to.requireDimension("largest " + labels.gateSource(), Dimension.VOLTAGE);
    if (from.compareTo(to) >= 0) {
      throw new DeviceException(
          "a transfer curve from %s = %s to %s: expected less to more"
              .formatted(labels.gateSource(), from, to));
    }
    for (OperatingPoint op : marked) {
      Curves.requireSame(transistor, op);
    }
  }

  static TransferCurve of(Transistor transistor, Quantity drainSource) {
    double threshold = transistor.channel().threshold();
    double most =
        transistor.device().ratings().gateSource().map(Quantity::si).orElse(threshold + SPAN);
    return new TransferCurve(
        transistor,
        drainSource,
        Curves.volts(0),
        Curves.volts(Math.min(0, threshold - MARGIN)),
        Curves.volts(Math.max(threshold + MARGIN, Math.min(most, threshold + SPAN))),
        List.of());
  }

  /** This curve over another range of V_GS, or V_SG. */
  public TransferCurve over(Quantity least, Quantity largest) {
    return new TransferCurve(transistor, drainSource, sourceBody, least, largest, marked);
  }

  /** This curve at a V_SB, or V_BS. */
  public TransferCurve at(Known sourceBodyVoltage) {
    return new TransferCurve(
        transistor, drainSource, Check.sourceBody(transistor, sourceBodyVoltage), from, to, marked);
  }

  /**
   * This curve with an operating point marked.
   *
   * @throws DeviceException if it belongs to another transistor
   */
  public TransferCurve mark(OperatingPoint op) {
    List<OperatingPoint> all = new ArrayList<>(marked);
    all.add(op);
    return new TransferCurve(transistor, drainSource, sourceBody, from, to, all);
  }

  /** The chart: the current above, its root below. */
  public Chart chart() {
    Labels labels = Labels.of(transistor.polarity());
    Curves curves = new Curves(transistor);
    double threshold = curves.channel().thresholdAt(sourceBody.si());
    double[] vgs = Curves.steps(from.si(), to.si(), threshold);
    double[] currents = curves.overGate(vgs, drainSource.si(), sourceBody.si());
    double[] roots = new double[currents.length];
    for (int i = 0; i < roots.length; i++) {
      roots[i] = Math.sqrt(Math.max(0, currents[i]));
    }
    Guide at = Guide.atX(labels.threshold(), Curves.volts(threshold));
    String body = sourceBody.isZero() ? "" : ", " + labels.sourceBody() + " = " + sourceBody;
    Chart chart =
        Chart.of(
                Axis.of(labels.gateSource(), Dimension.VOLTAGE),
                Panel.of(Axis.of("I_D", Dimension.CURRENT)).with(Line.of("I_D", vgs, currents), at),
                Panel.of(Axis.of("√I_D", Dimension.CURRENT.sqrt()))
                    .height(160)
                    .with(Line.of("√I_D", vgs, roots), at))
            .titled(
                "Transfer curve of %s at %s = %s%s"
                    .formatted(transistor, labels.drainSource(), drainSource, body));
    for (OperatingPoint op : marked) {
      chart = chart.with(Marker.of(Curves.mark(op), op.gateSourceVoltage(), op.drainCurrent()));
    }
    return chart;
  }

  @Override
  public MimeBundle display() {
    return chart().display();
  }
}
