package pinchoff.technology;

import static pinchoff.technology.Range.ANY;
import static pinchoff.technology.Range.NOT_NEGATIVE;
import static pinchoff.technology.Range.POSITIVE;
import static pinchoff.technology.Range.between;
import static pinchoff.technology.Shape.amount;

import java.util.List;
import pinchoff.quantity.Dimension;

/** The part of the format that describes a transistor: one group for each parameter set. */
final class DeviceFormat {
  private static final Shape.Group PROCESS =
      Shape.Group.of(
          Field.of(
              "oxideThickness", "t_ox", amount(Dimension.LENGTH, POSITIVE), "gate oxide thickness"),
          Field.of(
              "oxideCapacitance",
              "C_ox",
              amount(Dimension.CAPACITANCE_PER_AREA, POSITIVE),
              "gate capacitance per area"),
          Field.of("mobility", "μ", amount(Dimension.MOBILITY, POSITIVE), "mobility at low field"),
          Field.of(
              "channelDoping",
              "N",
              amount(Dimension.NUMBER_DENSITY, POSITIVE),
              "doping under the channel"));

  private static final Shape.Group SQUARE_LAW =
      Shape.Group.of(
          Field.of(
                  "zeroBiasThreshold",
                  "V_TH0",
                  amount(Dimension.VOLTAGE, ANY),
                  "threshold at V_SB = 0, signed as V_GS is")
              .must(),
          Field.of(
                  "processTransconductance",
                  "k'",
                  amount(Dimension.TRANSCONDUCTANCE_PARAMETER, POSITIVE),
                  "process transconductance, mobility times C_ox")
              .must(),
          Field.of(
                  "bodyFactor",
                  "γ",
                  amount(Dimension.ROOT_VOLTAGE, NOT_NEGATIVE),
                  "body factor, positive for n and p")
              .must(),
          Field.of(
              "surfacePotential",
              "2φ_F",
              amount(Dimension.VOLTAGE, POSITIVE),
              "surface potential, positive for n and p; needed if there is a body factor"),
          Field.of(
                  "channelLengthModulation",
                  "λ·L",
                  amount(Dimension.LENGTH_PER_VOLTAGE, NOT_NEGATIVE),
                  "channel-length modulation times effective length")
              .must());

  private static final Shape.Group ALL_REGION =
      Shape.Group.of(
          Field.of(
                  "slopeFactor",
                  "n",
                  amount(Dimension.NONE, between(1, 3, "1 to 3")),
                  "slope factor of weak inversion at V_SB = 0")
              .must());

  private static final Shape.Group MOBILITY_DEGRADATION =
      Shape.Group.of(
          Field.of(
                  "coefficient",
                  "θ",
                  amount(Dimension.PER_VOLTAGE, NOT_NEGATIVE),
                  "mobility degradation: k' falls by 1 + θ V_OV")
              .must());

  private static final Shape.Group VELOCITY_SATURATION =
      Shape.Group.of(
          Field.of(
                  "velocity",
                  "v_sat",
                  amount(Dimension.VELOCITY, POSITIVE),
                  "saturation velocity; the critical field is 2 v_sat/μ")
              .must(),
          Field.of(
              "mobility",
              "μ",
              amount(Dimension.MOBILITY, POSITIVE),
              "mobility of this set; that of the process if it is not given"));

  private static final Shape.Group ALPHA_POWER =
      Shape.Group.of(
          Field.of(
                  "exponent",
                  "α",
                  amount(Dimension.NONE, between(1, 2, "1 to 2")),
                  "exponent of the saturation current")
              .must(),
          Field.of(
                  "drainCurrent",
                  "I_D0",
                  amount(Dimension.CURRENT_PER_LENGTH, POSITIVE),
                  "drain current per width with gate and drain at the supply")
              .must(),
          Field.of(
                  "saturationVoltage",
                  "V_D0",
                  amount(Dimension.VOLTAGE, POSITIVE),
                  "saturation voltage with the gate at the supply")
              .must(),
          Field.of(
                  "supply",
                  "V_DD",
                  amount(Dimension.VOLTAGE, POSITIVE),
                  "supply that the two are given at")
              .must(),
          Field.of(
                  "threshold",
                  "V_TH",
                  amount(Dimension.VOLTAGE, ANY),
                  "threshold fitted for this law, positive for enhancement, n and p")
              .must(),
          Field.of(
                  "length",
                  "L",
                  amount(Dimension.LENGTH, POSITIVE),
                  "drawn length that the set was fitted at")
              .must());

  private static final Shape.Group OVERLAP =
      Shape.Group.of(
          Field.of(
                  "gateSource",
                  "C_ov,s",
                  amount(Dimension.CAPACITANCE_PER_LENGTH, NOT_NEGATIVE),
                  "gate over source, per width")
              .must(),
          Field.of(
                  "gateDrain",
                  "C_ov,d",
                  amount(Dimension.CAPACITANCE_PER_LENGTH, NOT_NEGATIVE),
                  "gate over drain, per width")
              .must());

  private static final Shape.Group JUNCTION =
      Shape.Group.of(
          Field.of(
                  "area",
                  "C_J",
                  amount(Dimension.CAPACITANCE_PER_AREA, NOT_NEGATIVE),
                  "junction capacitance per area at zero bias")
              .must(),
          Field.of(
                  "sidewall",
                  "C_JSW",
                  amount(Dimension.CAPACITANCE_PER_LENGTH, NOT_NEGATIVE),
                  "junction capacitance per perimeter at zero bias")
              .must(),
          Field.of(
                  "builtIn",
                  "P_B",
                  amount(Dimension.VOLTAGE, POSITIVE),
                  "built-in potential of the junctions")
              .must(),
          Field.of(
                  "areaGrading",
                  "M_J",
                  amount(Dimension.NONE, between(0, 1, "0 to 1")),
                  "grading exponent of the area")
              .must(),
          Field.of(
                  "sidewallGrading",
                  "M_JSW",
                  amount(Dimension.NONE, between(0, 1, "0 to 1")),
                  "grading exponent of the sidewall")
              .must(),
          Field.of(
                  "diffusionLength",
                  "L_diff",
                  amount(Dimension.LENGTH, POSITIVE),
                  "length of source and drain areas away from the gate")
              .must());

  private static final Shape.Group TEMPERATURE =
      Shape.Group.of(
          Field.of(
                  "thresholdDrift",
                  "a",
                  amount(Dimension.VOLTAGE_PER_TEMPERATURE, between(0, 0.01, "0 to 10 mV/K")),
                  "how much easier the device is to turn on, per kelvin")
              .must(),
          Field.of(
                  "mobilityExponent",
                  "m",
                  amount(Dimension.NONE, between(0, 4, "0 to 4")),
                  "mobility goes as temperature to the power of minus this")
              .must());

  private static final Shape.Group NOISE =
      Shape.Group.of(
          Field.of(
              "excessFactor",
              "γ_n",
              amount(Dimension.NONE, between(1e-3, 100, "0.001 to 100")),
              "thermal noise in saturation is 4kT times this times g_m; 2/3 of the slope factor if"
                  + " it is not given"),
          Field.of(
              "flicker",
              "K",
              amount(Dimension.VOLTAGE_SQUARED.times(Dimension.CAPACITANCE), NOT_NEGATIVE),
              "flicker noise: the squared gate voltage per hertz is this over W L C_ox f"));

  private static final Shape.Group MISMATCH =
      Shape.Group.of(
          Field.of(
                  "threshold",
                  "A_VT",
                  amount(Dimension.VOLTAGE_LENGTH, NOT_NEGATIVE),
                  "threshold difference of a pair times √(W L)")
              .must(),
          Field.of(
                  "currentFactor",
                  "A_β",
                  amount(Dimension.LENGTH, between(0, 2e-7, "0 to 20 %*um")),
                  "relative difference of β of a pair times √(W L)")
              .must(),
          Field.of(
              "thresholdDistance",
              "S_VT",
              amount(Dimension.FIELD, NOT_NEGATIVE),
              "threshold difference of a pair per distance"),
          Field.of(
              "currentFactorDistance",
              "S_β",
              amount(Dimension.PER_LENGTH, NOT_NEGATIVE),
              "relative difference of β of a pair per distance"));

  private static final Shape.Group GEOMETRY =
      Shape.Group.of(
          Field.of("minimumWidth", "W_min", amount(Dimension.LENGTH, POSITIVE), "least drawn width")
              .must(),
          Field.of(
                  "minimumLength",
                  "L_min",
                  amount(Dimension.LENGTH, POSITIVE),
                  "least drawn length")
              .must(),
          Field.of("grid", amount(Dimension.LENGTH, POSITIVE), "step of drawn sizes"),
          Field.of(
              "widthOffset", "ΔW", amount(Dimension.LENGTH, ANY), "drawn minus effective width"),
          Field.of(
              "lengthOffset", "ΔL", amount(Dimension.LENGTH, ANY), "drawn minus effective length"));

  private static final Shape.Group RATINGS =
      Shape.Group.of(
          Field.of(
              "gateSource", "V_GS,max", amount(Dimension.VOLTAGE, POSITIVE), "most gate to source"),
          Field.of(
              "gateDrain", "V_GD,max", amount(Dimension.VOLTAGE, POSITIVE), "most gate to drain"),
          Field.of(
              "gateBody", "V_GB,max", amount(Dimension.VOLTAGE, POSITIVE), "most gate to body"),
          Field.of(
              "drainSource",
              "V_DS,max",
              amount(Dimension.VOLTAGE, POSITIVE),
              "most drain to source"),
          Field.of(
              "drainBody", "V_DB,max", amount(Dimension.VOLTAGE, POSITIVE), "most drain to body"),
          Field.of(
              "bodySource", "V_BS,max", amount(Dimension.VOLTAGE, POSITIVE), "most body to source"),
          Field.of(
              "power",
              "P_max",
              amount(Dimension.POWER, POSITIVE),
              "most dissipation of one unit device"));

  static final Shape.Group DEVICE =
      Shape.Group.of(
          Field.of("polarity", new Shape.Choice(List.of("n", "p")), "n or p").must(),
          Field.of(
                  "mode",
                  new Shape.Choice(List.of("enhancement", "depletion")),
                  "enhancement (off at V_GS = 0) or depletion (on at V_GS = 0)")
              .must(),
          Field.of("flavour", Shape.WORDS, "what the device is for, in a few words"),
          Field.of("rail", Shape.WORDS, "the rail that it is made for"),
          Field.of("process", PROCESS, "what the layers are like"),
          Field.of("squareLaw", SQUARE_LAW, "parameters of the square law").must(),
          Field.of("allRegion", ALL_REGION, "parameters of the all-region model"),
          Field.of(
              "mobilityDegradation", MOBILITY_DEGRADATION, "parameters of mobility degradation"),
          Field.of("velocitySaturation", VELOCITY_SATURATION, "parameters of velocity saturation"),
          Field.of("alphaPower", ALPHA_POWER, "parameters of the alpha-power law"),
          Field.of("temperature", TEMPERATURE, "change with temperature"),
          Field.of("overlap", OVERLAP, "overlap capacitances of the gate"),
          Field.of("junction", JUNCTION, "capacitances of the junctions"),
          Field.of("noise", NOISE, "noise of the channel"),
          Field.of("mismatch", MISMATCH, "random differences of a pair drawn alike"),
          Field.of("geometry", GEOMETRY, "what may be drawn, and what becomes of it").must(),
          Field.of("ratings", RATINGS, "what the process allows, as magnitudes"),
          Field.of(
              "corners",
              CornerFormat.CORNERS,
              "corners of this device, if they differ from its polarity's"));

  private DeviceFormat() {}
}
