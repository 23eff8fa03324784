package pinchoff.device;

import java.util.List;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * A sized transistor: a number of unit devices in parallel, the model that describes it, and its
 * temperature.
 *
 * @param device what kind of transistor
 * @param width drawn W of one unit device
 * @param length drawn L
 * @param multiplier how many unit devices, 1 or more
 * @param model the equations in use
 * @param temperature of the channel
 */
public record Transistor(
    Device device,
    Quantity width,
    Quantity length,
    int multiplier,
    ChannelModel model,
    Temperature temperature) {

  private static final int MOST_UNITS = 1_000_000;

  /** Checks sizes against the rules, and that the device has what the model needs. */
  public Transistor {
    GeometryRules rules = device.rules();
    size("W", device, width, rules.minimumWidth(), rules.widthOffset());
    size("L", device, length, rules.minimumLength(), rules.lengthOffset());
    if (multiplier < 1 || multiplier > MOST_UNITS) {
      throw new DeviceException(
          multiplier + " unit devices of " + device.name() + ": expected 1 to " + MOST_UNITS);
    }
  }

  private static void size(
      String what,
      Device device,
      Quantity value,
      java.util.Optional<Quantity> minimum,
      Quantity offset) {
    String name = what + " of " + device.name();
    Check.positive(name, value, Dimension.LENGTH);
    minimum
        .filter(m -> value.si() < m.si() * (1 - Band.RELATIVE))
        .ifPresent(
            m -> {
              throw new DeviceException(
                  name + " = " + value + ": below the minimum of the process, " + m);
            });
    if (value.compareTo(offset) <= 0) {
      throw new DeviceException(
          name + " = " + value + ": nothing is left after the offset of " + offset);
    }
  }

  /** A transistor of one unit device at the nominal temperature, by the square law. */
  static Transistor of(Device device, Quantity width, Quantity length) {
    return new Transistor(
        device, width, length, 1, SquareLaw.STANDARD, device.parameters().nominalTemperature());
  }

  /** This many times as many unit devices in parallel. */
  public Transistor times(int units) {
    long all = (long) multiplier * units;
    int capped = (int) Math.max(Integer.MIN_VALUE, Math.min(Integer.MAX_VALUE, all));
    return new Transistor(device, width, length, capped, model, temperature);
  }

  /**
   * The same transistor by other equations.
   *
   * @throws DeviceException if its parameters lack what the model needs
   */
  public Transistor with(ChannelModel other) {
    other
        .lacking(this)
        .ifPresent(
            what -> {
              throw new DeviceException(
                  "model \"%s\" for %s: %s is missing"
                      .formatted(other.name(), device.name(), what));
            });
    return new Transistor(device, width, length, multiplier, other, temperature);
  }

  /** The same transistor at another temperature. */
  public Transistor with(Temperature other) {
    return new Transistor(device, width, length, multiplier, model, other);
  }

  /** W of one unit device in the equations: drawn minus offset. */
  public Quantity effectiveWidth() {
    return width.minus(device.rules().widthOffset());
  }

  /** L in the equations: drawn minus offset. */
  public Quantity effectiveLength() {
    return length.minus(device.rules().lengthOffset());
  }

  /** Drawn W of all unit devices together. */
  public Quantity totalWidth() {
    return width.times(multiplier);
  }

  /** W/L in the equations, of all unit devices together. */
  public Quantity ratio() {
    return effectiveWidth().times(multiplier).per(effectiveLength());
  }

  /** n or p. */
  public Polarity polarity() {
    return device.polarity();
  }

  /** Geometry, temperature and parameters as plain numbers for {@link ChannelModel#evaluate}. */
  public Channel channel() {
    return Channel.of(this);
  }

  /**
   * Biases the transistor.
   *
   * @param terms for n {@code vgs, vds} and, unless it is zero, {@code vsb}; for p {@code vsg, vsd,
   *     vbs}; or node voltages {@code gate, drain, source} and, unless it is tied to the source,
   *     {@code body}
   * @throws DeviceException if a term is missing, given twice or of the other polarity, or 2φ_F +
   *     V_SB is not above zero
   */
  public OperatingPoint at(Known... terms) {
    return OperatingPoint.of(this, Bias.of(device, terms));
  }

  /**
   * I_D against V_DS for these V_GS, with the edge of saturation.
   *
   * @param drives V_GS of each curve; V_SG for a p device
   */
  public OutputCurves outputCurves(Quantity... drives) {
    return OutputCurves.of(this, List.of(drives));
  }

  /**
   * I_D and √I_D against V_GS.
   *
   * @param drain {@code vds} for n, {@code vsd} for p
   * @throws DeviceException if it is anything else
   */
  public TransferCurve transferCurve(Known drain) {
    boolean n = polarity() == Polarity.N;
    if (drain.kind() != (n ? Known.Kind.VDS : Known.Kind.VSD)) {
      throw new DeviceException(
          "%s for a transfer curve of %s: expected %s"
              .formatted(drain, device.name(), n ? "vds" : "vsd"));
    }
    return TransferCurve.of(this, drain.value());
  }

  /** The plane of V_DS and V_GS with the regions; V_SD and V_SG for a p device. */
  public RegionMap regionMap() {
    return RegionMap.of(this);
  }

  /**
   * g_m/I_D against the inversion coefficient, with both asymptotes.
   *
   * @throws DeviceException if no slope factor is known
   */
  public EfficiencyCurve efficiencyCurve() {
    return new EfficiencyCurve(this, List.of());
  }

  @Override
  public String toString() {
    return "%s, W/L = %s%s/%s"
        .formatted(device, multiplier == 1 ? "" : multiplier + "×", width, length);
  }
}
