package pinchoff.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.device.AllRegion.Calibration;
import pinchoff.device.AllRegion.PinchOff;
import pinchoff.testing.Close;
import pinchoff.testing.Gen;

/** Laws that every channel model keeps, over random devices, sizes and biases. */
class ChannelModelLawTest {
  private static final int RUNS = 2000;
  private static final double STEP = 1e-6;

  static List<ChannelModel> models() {
    List<ChannelModel> all = new ArrayList<>();
    for (LengthModulation form : LengthModulation.values()) {
      all.add(SquareLaw.with(form));
    }
    for (PinchOff pinchOff : PinchOff.values()) {
      for (Calibration calibration : Calibration.values()) {
        all.add(AllRegion.with(pinchOff, calibration));
      }
    }
    return all;
  }

  /** Node voltages of gate, drain, source and body with the junctions in reverse. */
  private static double[] anyBias(Gen gen, Channel c) {
    double body = gen.uniform(-1, 1);
    double drain = body + c.sign() * gen.uniform(0, 2);
    double source = body + c.sign() * gen.uniform(0, 2);
    double gate = body + c.sign() * gen.uniform(-0.5, 3);
    return new double[] {gate, drain, source, body};
  }

  private static double[] evaluate(ChannelModel model, Channel c, double... v) {
    double[] result = new double[ChannelModel.SIZE];
    model.evaluate(c, v[0], v[1], v[2], v[3], result);
    for (double r : result) {
      assertTrue(Double.isFinite(r), () -> model.name() + " gives " + r);
    }
    return result;
  }

  private static void assertClose(double expected, double actual, double scale, String what) {
    Close.assertAbsolute(expected, actual, 1e-9 * scale + 1e-30, what);
  }

  @ParameterizedTest
  @MethodSource("models")
  void exchangingDrainAndSourceNegatesTheCurrent(ChannelModel model) {
    Gen.check(
        "I(G, D, S, B) = -I(G, S, D, B)",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] v = anyBias(gen, c);
          double[] one = evaluate(model, c, v);
          double[] other = evaluate(model, c, v[0], v[2], v[1], v[3]);
          assertClose(one[0], -other[0], Math.abs(one[0]), "current");
          double scale = Math.abs(one[2]) + Math.abs(one[3]);
          assertClose(one[1], -other[1], scale, "by gate");
          assertClose(one[2], -other[3], scale, "by drain");
          assertClose(one[3], -other[2], scale, "by source");
          assertClose(one[4], -other[4], scale, "by body");
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void nothingFlowsWithoutDrainVoltage(ChannelModel model) {
    Gen.check(
        "I = 0 at V_D = V_S",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] v = anyBias(gen, c);
          assertEquals(0, Math.abs(evaluate(model, c, v[0], v[2], v[2], v[3])[0]));
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void derivativesSumToZero(ChannelModel model) {
    Gen.check(
        "derivatives to all terminals sum to zero",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] r = evaluate(model, c, anyBias(gen, c));
          double scale = Math.abs(r[1]) + Math.abs(r[2]) + Math.abs(r[3]) + Math.abs(r[4]);
          Close.assertAbsolute(0, r[1] + r[2] + r[3] + r[4], 1e-14 * scale, "sum");
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void derivativesAgreeWithDifferences(ChannelModel model) {
    Gen.check(
        "derivatives are those of the current",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] v = anyBias(gen, c);
          double[] r = evaluate(model, c, v);
          double scale = c.beta() * 0.01 + Math.abs(r[2]) + Math.abs(r[3]);
          for (int i = 0; i < 4; i++) {
            if (nearEdge(model, c, v)) {
              return;
            }
            double slope = slope(model, c, v, i);
            Close.assertAbsolute(slope, r[i + 1], 1e-6 * scale, "derivative " + i);
          }
        });
  }

  /** Fourth-order central difference. */
  private static double slope(ChannelModel model, Channel c, double[] v, int index) {
    double h = 200 * STEP;
    double[] weights = {1, -8, 8, -1};
    int[] places = {-2, -1, 1, 2};
    double sum = 0;
    for (int i = 0; i < 4; i++) {
      double[] moved = v.clone();
      moved[index] += places[i] * h;
      sum += weights[i] * evaluate(model, c, moved)[0];
    }
    return sum / (12 * h);
  }

  /** True where a one-sided derivative is meant, or the roles of source and drain change. */
  private static boolean nearEdge(ChannelModel model, Channel c, double[] v) {
    double low = Math.min(c.sign() * v[1], c.sign() * v[2]);
    double vds = Math.abs(v[1] - v[2]);
    double vgs = c.sign() * v[0] - low;
    double vsb = low - c.sign() * v[3];
    double vov = vgs - c.thresholdAt(vsb);
    double near = 0.005;
    boolean kinks = !model.conductsBelowThreshold();
    return vds < near
        || (kinks
            && (Math.abs(vov) < near
                || Math.abs(vds - model.saturationVoltage(c, vgs, vsb)) < near));
  }

  @ParameterizedTest
  @MethodSource("models")
  void shiftingAllTerminalsChangesNothing(ChannelModel model) {
    Gen.check(
        "only differences of voltages count",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] v = anyBias(gen, c);
          double by = gen.between(-4, 4);
          double[] one = evaluate(model, c, v);
          double[] other = evaluate(model, c, v[0] + by, v[1] + by, v[2] + by, v[3] + by);
          double jump = model.isContinuous() ? 0 : 1;
          double scale = Math.abs(one[0]) + 1e-13 * c.beta();
          Close.assertAbsolute(one[0], other[0], 1e-9 * scale + jump * 1e-30, "current");
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void widthScalesCurrentsAndConductances(ChannelModel model) {
    Gen.check(
        "twice the width is twice everything",
        RUNS,
        gen -> {
          Transistor t = Devices.sized(gen, Devices.any(gen));
          double[] v = anyBias(gen, t.channel());
          double[] one = evaluate(model, t.channel(), v);
          double[] two = evaluate(model, t.times(2).channel(), v);
          for (int i = 0; i < ChannelModel.SIZE; i++) {
            Close.assertAbsolute(2 * one[i], two[i], 1e-14 * Math.abs(two[i]), "place " + i);
          }
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void currentRisesWithGateAndDrain(ChannelModel model) {
    Gen.check(
        "g_m and g_ds are not negative",
        RUNS,
        gen -> {
          Channel c = Devices.sized(gen, Devices.any(gen)).channel();
          double[] v = anyBias(gen, c);
          double[] r = evaluate(model, c, v);
          boolean forward = c.sign() * (v[1] - v[2]) >= 0;
          assertTrue(forward ? r[1] >= 0 : r[1] <= 0, "by gate " + r[1]);
          assertTrue(r[2] >= 0 && r[3] <= 0, "by drain " + r[2] + ", by source " + r[3]);
        });
  }

  @ParameterizedTest
  @MethodSource("models")
  void pDeviceIsTheReflectedNDeviceToTheBit(ChannelModel model) {
    Gen.check(
        "p is the reflected n",
        RUNS,
        gen -> {
          Channel n = Devices.sized(gen, Devices.any(gen)).channel();
          Channel p =
              new Channel(
                  -n.sign(),
                  n.beta(),
                  n.threshold(),
                  n.gamma(),
                  n.phi(),
                  n.lambda(),
                  n.slope(),
                  n.thermal(),
                  n.theta(),
                  n.criticalVoltage(),
                  n.alpha(),
                  n.alphaCurrent(),
                  n.alphaVoltage(),
                  n.alphaThreshold(),
                  n.alphaDrive());
          double[] v = anyBias(gen, n);
          double[] one = evaluate(model, n, v);
          double[] other = evaluate(model, p, -v[0], -v[1], -v[2], -v[3]);
          assertEquals(-one[0] + 0.0, other[0] + 0.0);
          for (int i = 1; i < ChannelModel.SIZE; i++) {
            assertEquals(one[i] + 0.0, other[i] + 0.0);
          }
        });
  }
}
