package pinchoff.benchmarks;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import pinchoff.device.AllRegion;
import pinchoff.device.Channel;
import pinchoff.device.ChannelModel;
import pinchoff.device.Device;
import pinchoff.device.DeviceParameters;
import pinchoff.device.Known;
import pinchoff.device.OperatingPoint;
import pinchoff.device.Polarity;
import pinchoff.device.SquareLaw;
import pinchoff.device.Transistor;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Units;

/** Channel models against the same equations written by hand, in evaluations per second. */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
public class DeviceBenchmark {
  private final Transistor transistor =
      Device.of(
              DeviceParameters.builder("n", Polarity.N, pinchoff.device.Mode.ENHANCEMENT)
                  .nominalTemperature(Units.degC(27))
                  .zeroBiasThreshold(Units.V(0.45))
                  .processTransconductance(Quantity.parse("290 uA/V^2"))
                  .bodyFactor(Quantity.parse("0.44 V^0.5"))
                  .surfacePotential(Units.V(0.9))
                  .channelLengthModulation(Quantity.parse("0.08 um/V"))
                  .slopeFactor(Units.ratio(1.23))
                  .build())
          .sized(Units.um(2), Units.um(1));
  private final Channel channel = transistor.channel();
  private final ChannelModel allRegion = AllRegion.STANDARD;
  private final double[] result = new double[ChannelModel.SIZE];
  private final Known gate = Known.vgs(Units.mV(650));
  private final Known drain = Known.vds(Units.V(1));
  private double vgs = 0.65;
  private double vds = 1;
  private double vsb = 0.1;

  @Benchmark
  public double squareLaw() {
    SquareLaw.STANDARD.evaluate(channel, vgs, vds, 0, -vsb, result);
    return result[0] + result[1] + result[2] + result[3] + result[4];
  }

  @Benchmark
  public double squareLawByHand() {
    byHand(channel, vgs, vds, vsb, result);
    return result[0] + result[1] + result[2] + result[3] + result[4];
  }

  private static void byHand(Channel c, double vgs, double vds, double vsb, double[] out) {
    double root = Math.sqrt(c.phi() + vsb);
    double vov = vgs - (c.threshold() + c.gamma() * (root - Math.sqrt(c.phi())));
    double factor = 1 + c.lambda() * vds;
    double gm;
    double gds;
    double current;
    if (!(vov > 0)) {
      current = 0;
      gm = 0;
      gds = 0;
    } else if (vds >= vov) {
      double plain = 0.5 * c.beta() * vov * vov;
      current = plain * factor;
      gm = c.beta() * vov * factor;
      gds = c.lambda() * plain;
    } else {
      double plain = c.beta() * (vov - 0.5 * vds) * vds;
      current = plain * factor;
      gm = c.beta() * vds * factor;
      gds = c.beta() * (vov - vds) * factor + c.lambda() * plain;
    }
    double gmb = gm * c.gamma() / (2 * root);
    out[0] = current;
    out[1] = gm;
    out[2] = gds;
    out[3] = -(gm + gds + gmb);
    out[4] = gmb;
  }

  @Benchmark
  public double allRegion() {
    allRegion.evaluate(channel, vgs, vds, 0, -vsb, result);
    return result[0] + result[1] + result[2] + result[3] + result[4];
  }

  @Benchmark
  public OperatingPoint operatingPoint() {
    return transistor.at(gate, drain);
  }
}
