package pinchoff.technology;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import pinchoff.device.AlphaPower;
import pinchoff.device.DeviceParameters;
import pinchoff.device.ExtractedFrom;
import pinchoff.device.GeometryRules;
import pinchoff.device.Junction;
import pinchoff.device.Mismatch;
import pinchoff.device.MobilityDegradation;
import pinchoff.device.Mode;
import pinchoff.device.Noise;
import pinchoff.device.Overlap;
import pinchoff.device.Polarity;
import pinchoff.device.Ratings;
import pinchoff.device.TemperatureCoefficients;
import pinchoff.device.VelocitySaturation;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** Makes the parameters, rules and ratings of one device of what a file states. */
final class DeviceParts {
  private final Section device;

  DeviceParts(Section device) {
    this.device = device;
  }

  Polarity polarity() {
    return device.words("polarity").equals("n") ? Polarity.N : Polarity.P;
  }

  Mode mode() {
    return device.words("mode").equals("depletion") ? Mode.DEPLETION : Mode.ENHANCEMENT;
  }

  DeviceParameters parameters(String name, Temperature nominal) {
    Section square = device.in("squareLaw");
    DeviceParameters.Builder builder =
        DeviceParameters.builder(name, polarity(), mode())
            .flavour(device.words("flavour"))
            .nominalTemperature(nominal)
            .zeroBiasThreshold(square.required("zeroBiasThreshold"))
            .processTransconductance(square.required("processTransconductance"))
            .bodyFactor(square.required("bodyFactor"))
            .channelLengthModulation(square.required("channelLengthModulation"));
    square.amount("surfacePotential").ifPresent(builder::surfacePotential);
    from(square, "zeroBiasThreshold").ifPresent(builder::thresholdFrom);
    from(square, "processTransconductance").ifPresent(builder::transconductanceFrom);
    device.in("process").amount("oxideCapacitance").ifPresent(builder::oxideCapacitance);
    device.in("allRegion").amount("slopeFactor").ifPresent(builder::slopeFactor);
    add("mobilityDegradation", this::mobilityDegradation, builder::mobilityDegradation);
    add("velocitySaturation", this::velocitySaturation, builder::velocitySaturation);
    add("alphaPower", this::alphaPower, builder::alphaPower);
    add("temperature", this::temperature, builder::temperatureCoefficients);
    add("overlap", this::overlap, builder::overlap);
    add("junction", this::junction, builder::junction);
    add("noise", this::noise, builder::noise);
    add("mismatch", this::mismatch, builder::mismatch);
    return builder.build();
  }

  private <T> void add(String key, Function<Section, T> make, Consumer<T> use) {
    Section section = device.in(key);
    if (section.isStated()) {
      use.accept(make.apply(section));
    }
  }

  private static Optional<ExtractedFrom> from(Section section, String key) {
    return section
        .document()
        .stated(section.path(key))
        .filter(s -> s.region().isPresent() || s.method().isPresent())
        .map(s -> new ExtractedFrom(s.region().orElse(""), s.method().orElse("")));
  }

  private MobilityDegradation mobilityDegradation(Section s) {
    return new MobilityDegradation(s.required("coefficient"));
  }

  private VelocitySaturation velocitySaturation(Section s) {
    Quantity mobility =
        s.amount("mobility").orElseGet(() -> device.in("process").required("mobility"));
    return new VelocitySaturation(s.required("velocity"), mobility);
  }

  private AlphaPower alphaPower(Section s) {
    return new AlphaPower(
        s.ratio("exponent"),
        s.required("drainCurrent"),
        s.required("saturationVoltage"),
        s.required("supply"),
        s.required("threshold"),
        s.required("length"));
  }

  private TemperatureCoefficients temperature(Section s) {
    return new TemperatureCoefficients(s.required("thresholdDrift"), s.ratio("mobilityExponent"));
  }

  private Overlap overlap(Section s) {
    return new Overlap(s.required("gateSource"), s.required("gateDrain"));
  }

  private Junction junction(Section s) {
    return new Junction(
        s.required("area"),
        s.required("sidewall"),
        s.required("builtIn"),
        s.ratio("areaGrading"),
        s.ratio("sidewallGrading"),
        s.required("diffusionLength"));
  }

  private Noise noise(Section s) {
    return new Noise(s.amount("excessFactor").map(Quantity::ratio), s.amount("flicker"));
  }

  private Mismatch mismatch(Section s) {
    return new Mismatch(
        s.required("threshold"),
        s.required("currentFactor"),
        s.amount("thresholdDistance"),
        s.amount("currentFactorDistance"));
  }

  GeometryRules rules() {
    Section s = device.in("geometry");
    return new GeometryRules(
        s.amount("minimumWidth"),
        s.amount("minimumLength"),
        s.amount("grid"),
        s.orZero("widthOffset", Dimension.LENGTH),
        s.orZero("lengthOffset", Dimension.LENGTH));
  }

  Ratings ratings() {
    Section s = device.in("ratings");
    return new Ratings(
        s.amount("gateSource"),
        s.amount("gateDrain"),
        s.amount("gateBody"),
        s.amount("drainSource"),
        s.amount("drainBody"),
        s.amount("bodySource"),
        s.amount("power"));
  }
}
