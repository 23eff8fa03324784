package pinchoff.device;

import java.util.List;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.formula.NamedValues;
import pinchoff.page.Page;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * A transistor at a bias: region, margins and small-signal figures.
 *
 * <p>All figures are those of the acting source, with the signs of {@link pinchoff.device}: for p
 * devices V_SG, V_SD and V_BS stand where this page says V_GS, V_DS and V_SB. If the terminals
 * named source and drain have changed roles, {@link #isSwapped} is true and {@link #drainCurrent}
 * is still positive: it flows from the acting drain to the acting source.
 */
public final class OperatingPoint implements Displayable {
  private final Transistor transistor;
  private final Bias bias;
  private final Channel channel;
  private final boolean swapped;
  private final double vgs;
  private final double vds;
  private final double vsb;
  private final double current;
  private final double gm;
  private final double gds;
  private final double gmb;
  private final double saturation;
  private final Inversion inversion;

  private OperatingPoint(Transistor transistor, Bias bias) {
    this.transistor = transistor;
    this.bias = bias;
    this.channel = transistor.channel();
    int sign = channel.sign();
    double named = sign * bias.drain().minus(bias.source()).si();
    this.swapped = named < 0;
    Quantity source = swapped ? bias.drain() : bias.source();
    this.vds = Math.abs(named);
    this.vgs = sign * bias.gate().minus(source).si();
    this.vsb = sign * source.minus(bias.body()).si();
    refuseAccumulation();
    double[] result = new double[ChannelModel.SIZE];
    transistor.model().evaluate(channel, sign * vgs, sign * vds, 0, -sign * vsb, result);
    this.current = sign * result[ChannelModel.CURRENT];
    this.gm = result[ChannelModel.BY_GATE];
    this.gds = result[ChannelModel.BY_DRAIN];
    this.gmb = result[ChannelModel.BY_BODY];
    this.saturation = transistor.model().saturationVoltage(channel, vgs, vsb);
    this.inversion = Inversion.of(channel, vgs, vsb, transistor);
  }

  /** The operating point of a transistor at a bias. */
  static OperatingPoint of(Transistor transistor, Bias bias) {
    return new OperatingPoint(transistor, bias);
  }

  private void refuseAccumulation() {
    if (channel.gamma() > 0 && !(channel.phi() + vsb > 0)) {
      Labels l = Labels.of(transistor.polarity());
      throw new DeviceException(
          "%s = %s of %s: 2φ_F + %s = %s, expected above 0, since the body effect has no meaning there"
              .formatted(
                  l.sourceBody(),
                  volts(vsb),
                  transistor.device().name(),
                  l.sourceBody(),
                  volts(channel.phi() + vsb)));
    }
  }

  private static Quantity volts(double value) {
    return Quantity.ofSi(value, Dimension.VOLTAGE);
  }

  private static Quantity siemens(double value) {
    return Quantity.ofSi(value, Dimension.CONDUCTANCE);
  }

  /** The transistor. */
  public Transistor transistor() {
    return transistor;
  }

  /** The node voltages. */
  public Bias bias() {
    return bias;
  }

  /** True if the terminal named drain acts as the source. */
  public boolean isSwapped() {
    return swapped;
  }

  /** V_GS, or V_SG of a p device. */
  public Quantity gateSourceVoltage() {
    return volts(vgs);
  }

  /** V_DS, or V_SD of a p device; never negative. */
  public Quantity drainSourceVoltage() {
    return volts(vds);
  }

  /** V_SB, or V_BS of a p device. */
  public Quantity sourceBodyVoltage() {
    return volts(vsb);
  }

  /** V_TH at this V_SB; for a p device −V_TH, which is positive for an enhancement device. */
  public Quantity threshold() {
    return volts(channel.thresholdAt(vsb));
  }

  /** V_OV = V_GS − V_TH at this V_SB; for a p device V_SG + V_TH. */
  public Quantity overdrive() {
    return volts(vov());
  }

  /** V_DS,sat of the model in use; zero where the square law says no current. */
  public Quantity saturationVoltage() {
    return volts(saturation);
  }

  /** I_D from the acting drain to the acting source, or the other way for a p device. */
  public Quantity drainCurrent() {
    return Quantity.ofSi(current, Dimension.CURRENT);
  }

  /** g_m = ∂I_D/∂V_GS. */
  public Quantity transconductance() {
    return siemens(gm);
  }

  /** g_mb = ∂I_D/∂V_BS. */
  public Quantity bodyTransconductance() {
    return siemens(gmb);
  }

  /** g_ds = ∂I_D/∂V_DS. */
  public Quantity outputConductance() {
    return siemens(gds);
  }

  /** r_o = 1/g_ds; empty if the model has no output conductance here. */
  public java.util.Optional<Quantity> outputResistance() {
    return gds > 0
        ? java.util.Optional.of(Quantity.ofSi(1 / gds, Dimension.RESISTANCE))
        : java.util.Optional.empty();
  }

  /** g_m/I_D; empty without current. */
  public java.util.Optional<Quantity> transconductanceEfficiency() {
    return current > 0
        ? java.util.Optional.of(Quantity.ofSi(gm / current, Dimension.PER_VOLTAGE))
        : java.util.Optional.empty();
  }

  /** g_m/g_ds; empty if the model has no output conductance here. */
  public java.util.Optional<Quantity> intrinsicGain() {
    return gds > 0
        ? java.util.Optional.of(Quantity.ofSi(gm / gds, Dimension.NONE))
        : java.util.Optional.empty();
  }

  /** I_D V_DS, dissipated in all unit devices together. */
  public Quantity power() {
    return drainCurrent().times(drainSourceVoltage());
  }

  /** How strongly the channel is inverted at the source. */
  public Inversion inversion() {
    return inversion;
  }

  /** The region; on an edge, the one that begins there. */
  public Region region() {
    if (!transistor.model().conductsBelowThreshold() && vov() <= thresholdBand()) {
      return Region.CUTOFF;
    }
    return vds >= saturation - saturationBand() ? Region.SATURATION : Region.TRIODE;
  }

  /** True if a region edge is within the tolerance band of 1 nV + 1e-12 relative. */
  public boolean isOnEdge() {
    boolean atThreshold =
        !transistor.model().conductsBelowThreshold() && Math.abs(vov()) <= thresholdBand();
    return atThreshold
        || (region() != Region.CUTOFF && Math.abs(vds - saturation) <= saturationBand());
  }

  /**
   * The least of the distances to the edges of the region: what V_DS or V_GS may move before the
   * transistor leaves it. Never negative.
   */
  public Quantity margin() {
    return edges().stream()
        .map(Edge::distance)
        .map(Quantity::abs)
        .reduce(Quantity::min)
        .orElseThrow();
  }

  /** The edges of the region with their signed distances. */
  public List<Edge> edges() {
    Labels l = Labels.of(transistor.polarity());
    boolean smooth = transistor.model().conductsBelowThreshold();
    Edge toThreshold =
        new Edge(
            region() == Region.CUTOFF ? "until it conducts" : "to cutoff",
            region() == Region.CUTOFF ? l.threshold() + " − " + l.gateSource() : l.overdrive(),
            volts(region() == Region.CUTOFF ? -vov() : vov()));
    Edge toSaturation =
        region() == Region.TRIODE
            ? new Edge(
                "to saturation", l.saturation() + " − " + l.drainSource(), volts(saturation - vds))
            : new Edge(
                "to triode", l.drainSource() + " − " + l.saturation(), volts(vds - saturation));
    if (region() == Region.CUTOFF) {
      return List.of(toThreshold);
    }
    return smooth ? List.of(toSaturation) : List.of(toSaturation, toThreshold);
  }

  /**
   * One edge of a region.
   *
   * @param name where it leads, for example "to triode"
   * @param difference the voltages whose difference it is
   * @param distance how far away it is: positive inside the region
   */
  public record Edge(String name, String difference, Quantity distance) {}

  /** What must be said beside the figures. */
  public List<Caution> cautions() {
    return Cautions.of(this);
  }

  /**
   * The figures under names with a suffix, for formulas: {@code as("1")} gives V_GS1, V_TH1, V_OV1,
   * I_D1, g_m1, W1, L1 and so on; V_SG1, V_SD1, V_BS1 for a p device, whose V_TH1 is −V_TH.
   *
   * @param suffix letters and digits, for example {@code "1"}
   */
  public NamedValues as(String suffix) {
    return NamedFigures.of(this, suffix);
  }

  /** The bias sheet: region with margins, figures, cautions, and how far the model applies here. */
  public Page page() {
    return BiasSheet.of(this);
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }

  @Override
  public String toString() {
    return "%s in %s%s: I_D = %s"
        .formatted(transistor, region().words(), isOnEdge() ? " (edge)" : "", drainCurrent());
  }

  Channel channel() {
    return channel;
  }

  double vgs() {
    return vgs;
  }

  double vds() {
    return vds;
  }

  double vsb() {
    return vsb;
  }

  double vov() {
    return vgs - channel.thresholdAt(vsb);
  }

  private double thresholdBand() {
    return Band.of(vgs, channel.thresholdAt(vsb));
  }

  private double saturationBand() {
    return Band.of(vds, Math.max(Math.abs(vgs), saturation));
  }
}
