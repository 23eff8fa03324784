package pinchoff.device;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * The model parameters of one kind of transistor, in the terms of hand analysis.
 *
 * <p>Signs: the threshold is signed, everything else is a magnitude for n and p alike.
 *
 * @param name name in the process, for example {@code core-n}
 * @param polarity n or p
 * @param mode enhancement or depletion; the sign of the threshold must agree
 * @param flavour what it is for, in a few words; may be empty
 * @param nominalTemperature the temperature that all of it holds at
 * @param zeroBiasThreshold V_TH0, signed as V_GS is: positive for an n enhancement device, negative
 *     for a p one
 * @param processTransconductance k' = µ C_ox (A/V²), above 0 for both polarities; β = k' W/L
 * @param bodyFactor γ (√V), 0 or more for both polarities
 * @param surfacePotential 2φ_F (V), above 0 for both polarities
 * @param channelLengthModulation λ·L (m/V), 0 or more: λ is this over the effective length
 * @param slopeFactor n of weak inversion, 1 to 3; where empty, 1 + γ/(2√2φ_F)
 * @param oxideCapacitance C_ox (F/m²), above 0
 * @param overlap overlap capacitances
 * @param junction junction capacitances
 * @param temperatureCoefficients how threshold and mobility change with temperature
 * @param mobilityDegradation for the model with θ
 * @param velocitySaturation for the model with velocity saturation
 * @param alphaPower for the alpha-power law
 * @param noise noise of the channel
 * @param mismatch random differences of a pair
 * @param thresholdFrom how the threshold was found
 * @param transconductanceFrom how k' was found
 */
public record DeviceParameters(
    String name,
    Polarity polarity,
    Mode mode,
    String flavour,
    Temperature nominalTemperature,
    Quantity zeroBiasThreshold,
    Quantity processTransconductance,
    Quantity bodyFactor,
    Quantity surfacePotential,
    Quantity channelLengthModulation,
    Optional<Quantity> slopeFactor,
    Optional<Quantity> oxideCapacitance,
    Optional<Overlap> overlap,
    Optional<Junction> junction,
    Optional<TemperatureCoefficients> temperatureCoefficients,
    Optional<MobilityDegradation> mobilityDegradation,
    Optional<VelocitySaturation> velocitySaturation,
    Optional<AlphaPower> alphaPower,
    Optional<Noise> noise,
    Optional<Mismatch> mismatch,
    Optional<ExtractedFrom> thresholdFrom,
    Optional<ExtractedFrom> transconductanceFrom) {

  /** Stands in for 2φ_F where there is no body effect and nothing depends on it. */
  private static final Quantity UNUSED = Quantity.ofSi(0.7, Dimension.VOLTAGE);

  /** Checks dimensions and ranges, and that threshold and mode agree. */
  public DeviceParameters {
    if (name.isBlank()) {
      throw new DeviceException("the name of a device is blank: expected at least one character");
    }
    String of = " of " + name;
    zeroBiasThreshold.requireDimension("V_TH0" + of, Dimension.VOLTAGE);
    Check.positive("k'" + of, processTransconductance, Dimension.TRANSCONDUCTANCE_PARAMETER);
    Check.notNegative("body factor γ" + of, bodyFactor, Dimension.ROOT_VOLTAGE);
    Check.positive("surface potential 2φ_F" + of, surfacePotential, Dimension.VOLTAGE);
    Check.notNegative("λ·L" + of, channelLengthModulation, Dimension.LENGTH_PER_VOLTAGE);
    Check.positive("C_ox" + of, oxideCapacitance, Dimension.CAPACITANCE_PER_AREA);
    slopeFactor.ifPresent(
        n -> {
          n.requireDimension("slope factor" + of, Dimension.NONE);
          Check.within("slope factor" + of, n.si(), 1, 3);
        });
    checkMode(name, polarity, mode, zeroBiasThreshold);
  }

  private static void checkMode(String name, Polarity polarity, Mode mode, Quantity threshold) {
    double reflected = polarity.sign() * threshold.si();
    boolean fits = mode == Mode.ENHANCEMENT ? reflected >= 0 : reflected <= 0;
    if (!fits) {
      boolean positive = threshold.si() > 0;
      throw new DeviceException(
          "V_TH0 of %s = %s: %s threshold makes a %s device a %s device, but it is said to be %s"
              .formatted(
                  name,
                  threshold,
                  positive ? "a positive" : "a negative",
                  polarity.letter(),
                  mode == Mode.ENHANCEMENT ? "depletion" : "enhancement",
                  mode == Mode.ENHANCEMENT ? "enhancement" : "depletion"));
    }
  }

  /**
   * The slope factor n: as stated, or 1 + γ/(2√2φ_F), which is that of the body effect at V_SB = 0.
   */
  public double slopeFactorOrDefault() {
    return slopeFactor
        .map(Quantity::ratio)
        .orElse(1 + bodyFactor.si() / (2 * Math.sqrt(surfacePotential.si())));
  }

  /** Starts the parameters of a device; see {@link Builder} for what must be given. */
  public static Builder builder(String name, Polarity polarity, Mode mode) {
    return new Builder(name, polarity, mode);
  }

  /** A builder that holds these parameters, for a variant of them. */
  public Builder toBuilder() {
    Builder b = new Builder(name, polarity, mode);
    b.flavour = flavour;
    b.nominalTemperature = nominalTemperature;
    b.zeroBiasThreshold = zeroBiasThreshold;
    b.processTransconductance = processTransconductance;
    b.bodyFactor = bodyFactor;
    b.surfacePotential = surfacePotential;
    b.channelLengthModulation = channelLengthModulation;
    b.slopeFactor = slopeFactor;
    b.oxideCapacitance = oxideCapacitance;
    b.overlap = overlap;
    b.junction = junction;
    b.temperatureCoefficients = temperatureCoefficients;
    b.mobilityDegradation = mobilityDegradation;
    b.velocitySaturation = velocitySaturation;
    b.alphaPower = alphaPower;
    b.noise = noise;
    b.mismatch = mismatch;
    b.thresholdFrom = thresholdFrom;
    b.transconductanceFrom = transconductanceFrom;
    return b;
  }

  /**
   * Collects parameters. Threshold, k' and nominal temperature must be given. Without a body factor
   * there is no body effect; without λ·L no channel-length modulation. With a body factor the
   * surface potential must be given.
   */
  public static final class Builder {
    private final String name;
    private final Polarity polarity;
    private final Mode mode;
    private String flavour = "";
    private @Nullable Temperature nominalTemperature;
    private @Nullable Quantity zeroBiasThreshold;
    private @Nullable Quantity processTransconductance;
    private Quantity bodyFactor = Quantity.ofSi(0, Dimension.ROOT_VOLTAGE);
    private @Nullable Quantity surfacePotential;
    private Quantity channelLengthModulation = Quantity.ofSi(0, Dimension.LENGTH_PER_VOLTAGE);
    private Optional<Quantity> slopeFactor = Optional.empty();
    private Optional<Quantity> oxideCapacitance = Optional.empty();
    private Optional<Overlap> overlap = Optional.empty();
    private Optional<Junction> junction = Optional.empty();
    private Optional<TemperatureCoefficients> temperatureCoefficients = Optional.empty();
    private Optional<MobilityDegradation> mobilityDegradation = Optional.empty();
    private Optional<VelocitySaturation> velocitySaturation = Optional.empty();
    private Optional<AlphaPower> alphaPower = Optional.empty();
    private Optional<Noise> noise = Optional.empty();
    private Optional<Mismatch> mismatch = Optional.empty();
    private Optional<ExtractedFrom> thresholdFrom = Optional.empty();
    private Optional<ExtractedFrom> transconductanceFrom = Optional.empty();

    private Builder(String name, Polarity polarity, Mode mode) {
      this.name = name;
      this.polarity = polarity;
      this.mode = mode;
    }

    /** What it is for, in a few words; may be empty. */
    public Builder flavour(String value) {
      flavour = value;
      return this;
    }

    /** The temperature that all of it holds at. */
    public Builder nominalTemperature(Temperature value) {
      nominalTemperature = value;
      return this;
    }

    /** V_TH0, signed as V_GS is: positive for an n enhancement device, negative for a p one. */
    public Builder zeroBiasThreshold(Quantity value) {
      zeroBiasThreshold = value;
      return this;
    }

    /** K' = µ C_ox (A/V²), above 0 for both polarities; β = k' W/L. */
    public Builder processTransconductance(Quantity value) {
      processTransconductance = value;
      return this;
    }

    /** Γ (√V), 0 or more for both polarities. */
    public Builder bodyFactor(Quantity value) {
      bodyFactor = value;
      return this;
    }

    /** 2φ_F (V), above 0 for both polarities. */
    public Builder surfacePotential(Quantity value) {
      surfacePotential = value;
      return this;
    }

    /** Λ·L (m/V), 0 or more: λ is this over the effective length. */
    public Builder channelLengthModulation(Quantity value) {
      channelLengthModulation = value;
      return this;
    }

    /** N of weak inversion, 1 to 3; where empty, 1 + γ/(2√2φ_F). */
    public Builder slopeFactor(Quantity value) {
      slopeFactor = Optional.of(value);
      return this;
    }

    /** C_ox (F/m²), above 0. */
    public Builder oxideCapacitance(Quantity value) {
      oxideCapacitance = Optional.of(value);
      return this;
    }

    /** Overlap capacitances. */
    public Builder overlap(Overlap value) {
      overlap = Optional.of(value);
      return this;
    }

    /** Junction capacitances. */
    public Builder junction(Junction value) {
      junction = Optional.of(value);
      return this;
    }

    /** How threshold and mobility change with temperature. */
    public Builder temperatureCoefficients(TemperatureCoefficients value) {
      temperatureCoefficients = Optional.of(value);
      return this;
    }

    /** For the model with θ. */
    public Builder mobilityDegradation(MobilityDegradation value) {
      mobilityDegradation = Optional.of(value);
      return this;
    }

    /** For the model with velocity saturation. */
    public Builder velocitySaturation(VelocitySaturation value) {
      velocitySaturation = Optional.of(value);
      return this;
    }

    /** For the alpha-power law. */
    public Builder alphaPower(AlphaPower value) {
      alphaPower = Optional.of(value);
      return this;
    }

    /** Noise of the channel. */
    public Builder noise(Noise value) {
      noise = Optional.of(value);
      return this;
    }

    /** Random differences of a pair. */
    public Builder mismatch(Mismatch value) {
      mismatch = Optional.of(value);
      return this;
    }

    /** How the threshold was found. */
    public Builder thresholdFrom(ExtractedFrom value) {
      thresholdFrom = Optional.of(value);
      return this;
    }

    /** How k' was found. */
    public Builder transconductanceFrom(ExtractedFrom value) {
      transconductanceFrom = Optional.of(value);
      return this;
    }

    /** The checked parameters. */
    public DeviceParameters build() {
      if (surfacePotential == null && bodyFactor.si() != 0) {
        throw missing("surfacePotential (2φ_F), since a body factor is given");
      }
      return new DeviceParameters(
          name,
          polarity,
          mode,
          flavour,
          given(nominalTemperature, "nominalTemperature"),
          given(zeroBiasThreshold, "zeroBiasThreshold (V_TH0)"),
          given(processTransconductance, "processTransconductance (k')"),
          bodyFactor,
          surfacePotential == null ? UNUSED : surfacePotential,
          channelLengthModulation,
          slopeFactor,
          oxideCapacitance,
          overlap,
          junction,
          temperatureCoefficients,
          mobilityDegradation,
          velocitySaturation,
          alphaPower,
          noise,
          mismatch,
          thresholdFrom,
          transconductanceFrom);
    }

    private <T> T given(@Nullable T value, String what) {
      if (value == null) {
        throw missing(what);
      }
      return value;
    }

    private DeviceException missing(String what) {
      return new DeviceException("device " + name + ": " + what + " is missing");
    }
  }
}
