package pinchoff.device;

import java.util.Optional;

/**
 * The square law (Shichman and Hodges, JSSC SC-3 (1968) 285).
 *
 * <p>With V_OV = V_GS − V_TH: no current for V_OV ≤ 0; triode, 0 ≤ V_DS &lt; V_OV: β (V_OV V_DS −
 * V_DS²/2); saturation, V_DS ≥ V_OV: (β/2) V_OV². Channel-length modulation multiplies this as
 * {@link LengthModulation} says. V_TH = V_TH0 + γ (√(2φ_F + V_SB) − √2φ_F).
 *
 * <p>In saturation g_m = 2 I_D/V_OV holds with the length factor in both regions; √(2 β I_D) does
 * not. Valid for long channels with V_OV of about 150 mV and more.
 */
public final class SquareLaw extends SourceReferenced {

  /** The usual form: the length factor 1 + λ V_DS in triode and saturation. */
  public static final SquareLaw STANDARD = new SquareLaw(LengthModulation.BOTH);

  private final LengthModulation form;

  private SquareLaw(LengthModulation form) {
    this.form = form;
  }

  /** The square law with a form of channel-length modulation. */
  public static SquareLaw with(LengthModulation form) {
    return form == LengthModulation.BOTH ? STANDARD : new SquareLaw(form);
  }

  /** The form of channel-length modulation. */
  public LengthModulation lengthModulation() {
    return form;
  }

  @Override
  public String name() {
    return form == LengthModulation.BOTH ? "square law" : "square law, λ " + form.words();
  }

  @Override
  void forward(Channel c, double vgs, double vds, double vsb, double[] result) {
    double vov = vgs - c.thresholdAt(vsb);
    if (!(vov > 0)) {
      nothing(result);
      return;
    }
    if (vds >= vov) {
      saturation(c, vov, vds, result);
    } else {
      triode(c, vov, vds, result);
    }
    result[BY_BODY_SOURCE] = result[BY_GATE] * c.backGateRatio(vsb);
  }

  private void saturation(Channel c, double vov, double vds, double[] result) {
    double plain = 0.5 * c.beta() * vov * vov;
    boolean offset = form == LengthModulation.OFFSET;
    double factor = 1 + c.lambda() * (offset ? vds - vov : vds);
    result[CURRENT] = plain * factor;
    result[BY_GATE] = c.beta() * vov * factor - (offset ? c.lambda() * plain : 0);
    result[BY_DRAIN] = c.lambda() * plain;
  }

  private void triode(Channel c, double vov, double vds, double[] result) {
    double lambda = form == LengthModulation.BOTH ? c.lambda() : 0;
    double plain = c.beta() * (vov - 0.5 * vds) * vds;
    double factor = 1 + lambda * vds;
    result[CURRENT] = plain * factor;
    result[BY_GATE] = c.beta() * vds * factor;
    result[BY_DRAIN] = c.beta() * (vov - vds) * factor + lambda * plain;
  }

  @Override
  public double saturationVoltage(Channel channel, double vgs, double vsb) {
    return Math.max(0, vgs - channel.thresholdAt(vsb));
  }

  @Override
  public String saturationDefinition() {
    return "V_DS,sat = V_OV";
  }

  @Override
  public boolean conductsBelowThreshold() {
    return false;
  }

  @Override
  public boolean isContinuous() {
    return form != LengthModulation.SATURATION_ONLY;
  }

  @Override
  public Optional<String> lacking(Transistor transistor) {
    return Optional.empty();
  }
}
