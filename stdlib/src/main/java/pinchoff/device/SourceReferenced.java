package pinchoff.device;

/**
 * A model whose equations are written from the acting source, for an n device with V_DS of zero or
 * more. Here they are made antisymmetric in drain and source, and reflected for p.
 */
abstract class SourceReferenced implements ChannelModel {

  /** Index of ∂I/∂V_BS in what {@link #forward} writes. */
  static final int BY_BODY_SOURCE = 3;

  /**
   * Writes I_D, ∂I/∂V_GS, ∂I/∂V_DS and ∂I/∂V_BS to the first four places.
   *
   * @param vds zero or more
   */
  abstract void forward(Channel channel, double vgs, double vds, double vsb, double[] result);

  @Override
  public final void evaluate(
      Channel channel, double gate, double drain, double source, double body, double[] result) {
    int sign = channel.sign();
    boolean swapped = sign * (drain - source) < 0;
    double acting = swapped ? drain : source;
    double other = swapped ? source : drain;
    forward(
        channel, sign * (gate - acting), sign * (other - acting), sign * (acting - body), result);
    double gm = result[BY_GATE];
    double gds = result[BY_DRAIN];
    double gmb = result[BY_BODY_SOURCE];
    double rest = gm + gds + gmb;
    if (swapped) {
      result[CURRENT] = -sign * result[CURRENT];
      result[BY_GATE] = -gm;
      result[BY_DRAIN] = rest;
      result[BY_SOURCE] = -gds;
      result[BY_BODY] = -gmb;
    } else {
      result[CURRENT] = sign * result[CURRENT];
      result[BY_SOURCE] = -rest;
      result[BY_BODY] = gmb;
    }
  }

  static void nothing(double[] result) {
    result[CURRENT] = 0;
    result[BY_GATE] = 0;
    result[BY_DRAIN] = 0;
    result[BY_BODY_SOURCE] = 0;
  }
}
