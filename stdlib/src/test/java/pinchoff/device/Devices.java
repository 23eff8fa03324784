package pinchoff.device;

import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.quantity;
import static pinchoff.quantity.Units.um;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;
import pinchoff.testing.Gen;

/** Invented devices for tests. */
final class Devices {
  static final Temperature NOMINAL = Temperature.ofKelvin(300);

  private Devices() {}

  /** Parameters with threshold and k' only. */
  static DeviceParameters.Builder plain(Polarity polarity, double threshold, double k) {
    boolean enhancement = polarity.sign() * threshold >= 0;
    return DeviceParameters.builder(
            "plain-" + polarity.letter(), polarity, enhancement ? Mode.ENHANCEMENT : Mode.DEPLETION)
        .nominalTemperature(NOMINAL)
        .zeroBiasThreshold(V(threshold))
        .processTransconductance(Quantity.ofSi(k, Dimension.TRANSCONDUCTANCE_PARAMETER));
  }

  /** A core n device of an invented 0.18 µm process. */
  static Device coreN() {
    return Device.of(
        plain(Polarity.N, 0.45, 320e-6)
            .bodyFactor(quantity("0.45 V^0.5"))
            .surfacePotential(V(0.85))
            .channelLengthModulation(quantity("0.08 um/V"))
            .oxideCapacitance(quantity("8.4 fF/um^2"))
            .build(),
        GeometryRules.atLeast(um(0.22), um(0.18)),
        Ratings.of(V(1.98)),
        Source.of("invented.tech.json", "0123456789abcdef"));
  }

  /** A core p device of the same process. */
  static Device coreP() {
    return Device.of(
        plain(Polarity.P, -0.43, 80e-6)
            .bodyFactor(quantity("0.4 V^0.5"))
            .surfacePotential(V(0.8))
            .channelLengthModulation(quantity("0.1 um/V"))
            .build(),
        GeometryRules.atLeast(um(0.22), um(0.18)),
        Ratings.of(V(1.98)),
        Source.of("invented.tech.json", "0123456789abcdef"));
  }

  /** Any device of either polarity and mode, with body effect and channel-length modulation. */
  static Device any(Gen gen) {
    Polarity polarity = gen.chance(0.5) ? Polarity.N : Polarity.P;
    return Device.of(
        plain(polarity, gen.uniform(-1, 1.2), gen.magnitude(-5, -3))
            .bodyFactor(Quantity.ofSi(gen.uniform(0, 0.8), Dimension.ROOT_VOLTAGE))
            .surfacePotential(V(gen.uniform(0.6, 1)))
            .channelLengthModulation(
                Quantity.ofSi(gen.uniform(0, 2e-7), Dimension.LENGTH_PER_VOLTAGE))
            .slopeFactor(Quantity.ofSi(gen.uniform(1, 1.7), Dimension.NONE))
            .build());
  }

  /** A transistor of any size. */
  static Transistor sized(Gen gen, Device device) {
    return device
        .sized(um(gen.uniform(0.2, 50)), um(gen.uniform(0.2, 10)))
        .times(gen.between(1, 8));
  }
}
