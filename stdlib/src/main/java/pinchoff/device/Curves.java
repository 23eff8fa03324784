package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import pinchoff.display.Host;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** Currents of a transistor along a line of biases, as plain SI numbers. */
final class Curves {
  private static final int POINTS = 240;

  private final Transistor transistor;
  private final Channel channel;
  private final double[] result = new double[ChannelModel.SIZE];

  Curves(Transistor transistor) {
    this.transistor = transistor;
    this.channel = transistor.channel();
  }

  Channel channel() {
    return channel;
  }

  /** I_D for voltages in the reflected sense of the n equations. */
  double current(double vgs, double vds, double vsb) {
    int sign = channel.sign();
    transistor.model().evaluate(channel, sign * vgs, sign * vds, 0, -sign * vsb, result);
    return sign * result[ChannelModel.CURRENT] + 0.0;
  }

  /** Evenly spaced values with one more where a curve bends. */
  static double[] steps(double from, double to, double bend) {
    List<Double> steps = new ArrayList<>();
    for (int i = 0; i <= POINTS; i++) {
      double at = from + (to - from) * i / POINTS;
      double before = steps.isEmpty() ? from : steps.get(steps.size() - 1);
      if (bend > before && bend < at) {
        steps.add(bend);
      }
      steps.add(at);
    }
    return steps.stream().mapToDouble(Double::doubleValue).toArray();
  }

  double[] overDrain(double[] vds, double vgs, double vsb) {
    Host.current().checkpoint();
    double[] currents = new double[vds.length];
    for (int i = 0; i < vds.length; i++) {
      currents[i] = current(vgs, vds[i], vsb);
    }
    return currents;
  }

  double[] overGate(double[] vgs, double vds, double vsb) {
    Host.current().checkpoint();
    double[] currents = new double[vgs.length];
    for (int i = 0; i < vgs.length; i++) {
      currents[i] = current(vgs[i], vds, vsb);
    }
    return currents;
  }

  static Quantity volts(double value) {
    return Quantity.ofSi(value, Dimension.VOLTAGE);
  }

  /** The name of a marked operating point: its region and current. */
  static String mark(OperatingPoint op) {
    return op.drainCurrent() + ", " + op.region().words();
  }

  static void requireSame(Transistor transistor, OperatingPoint op) {
    if (!op.transistor().equals(transistor)) {
      throw new DeviceException(
          "an operating point of %s on the curves of %s: expected one of the same transistor"
              .formatted(op.transistor(), transistor));
    }
  }
}
