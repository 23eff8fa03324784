package pinchoff.device;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.Map;
import java.util.Set;
import pinchoff.device.Known.Kind;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * The voltages of the four terminals against a common node.
 *
 * @param gate node voltage of the gate
 * @param drain node voltage of the terminal named drain
 * @param source node voltage of the terminal named source
 * @param body node voltage of the body
 * @param bodyAssumed true if nothing was said of the body, so that it is taken to be at the source
 */
public record Bias(
    Quantity gate, Quantity drain, Quantity source, Quantity body, boolean bodyAssumed) {

  private static final Quantity ZERO = Quantity.ofSi(0, Dimension.VOLTAGE);
  private static final Set<Kind> NODES = EnumSet.of(Kind.GATE, Kind.DRAIN, Kind.SOURCE, Kind.BODY);
  private static final Map<Kind, Kind> COUNTERPART =
      Map.of(
          Kind.VGS, Kind.VSG, Kind.VDS, Kind.VSD, Kind.VSB, Kind.VBS, Kind.VSG, Kind.VGS, Kind.VSD,
          Kind.VDS, Kind.VBS, Kind.VSB);

  /** Checks dimensions. */
  public Bias {
    gate.requireDimension("gate", Dimension.VOLTAGE);
    drain.requireDimension("drain", Dimension.VOLTAGE);
    source.requireDimension("source", Dimension.VOLTAGE);
    body.requireDimension("body", Dimension.VOLTAGE);
  }

  /** The bias that some terms say for a device. */
  static Bias of(Device device, Known... terms) {
    Map<Kind, Quantity> known = new EnumMap<>(Kind.class);
    for (Known term : terms) {
      refuseOtherPolarity(device, term.kind());
      Quantity before = known.put(term.kind(), term.value());
      if (before != null) {
        throw new DeviceException(
            "%s is given twice: %s and %s".formatted(term.kind().word(), before, term.value()));
      }
    }
    boolean nodes = known.keySet().stream().anyMatch(NODES::contains);
    if (nodes && !NODES.containsAll(known.keySet())) {
      throw new DeviceException(
          "bias of %s mixes node voltages with differences: %s; expected either gate, drain, source and body, or %s"
              .formatted(device.name(), words(known), differences(device)));
    }
    return nodes ? ofNodes(device, known) : ofDifferences(device, known);
  }

  private static void refuseOtherPolarity(Device device, Kind kind) {
    boolean p = device.polarity() == Polarity.P;
    boolean wrong =
        p
            ? EnumSet.of(Kind.VGS, Kind.VDS, Kind.VSB).contains(kind)
            : EnumSet.of(Kind.VSG, Kind.VSD, Kind.VBS).contains(kind);
    Kind meant = COUNTERPART.get(kind);
    if (wrong && meant != null) {
      throw new DeviceException(
          "%s given to %s, %s device: did you mean %s?"
              .formatted(kind.word(), device.name(), p ? "a p" : "an n", meant.word()));
    }
  }

  private static Bias ofNodes(Device device, Map<Kind, Quantity> known) {
    Quantity source = required(device, known, Kind.SOURCE);
    Quantity body = known.get(Kind.BODY);
    return new Bias(
        required(device, known, Kind.GATE),
        required(device, known, Kind.DRAIN),
        source,
        body == null ? source : body,
        body == null);
  }

  private static Bias ofDifferences(Device device, Map<Kind, Quantity> known) {
    boolean n = device.polarity() == Polarity.N;
    Quantity gate = required(device, known, n ? Kind.VGS : Kind.VSG);
    Quantity drain = required(device, known, n ? Kind.VDS : Kind.VSD);
    Quantity body = known.get(n ? Kind.VSB : Kind.VBS);
    int sign = device.polarity().sign();
    return new Bias(
        gate.times(sign),
        drain.times(sign),
        ZERO,
        body == null ? ZERO : body.times(-sign),
        body == null);
  }

  private static Quantity required(Device device, Map<Kind, Quantity> known, Kind kind) {
    Quantity value = known.get(kind);
    if (value == null) {
      throw new DeviceException(
          "bias of %s: %s is missing; given: %s"
              .formatted(device.name(), kind.word(), known.isEmpty() ? "nothing" : words(known)));
    }
    return value;
  }

  private static String differences(Device device) {
    return device.polarity() == Polarity.N ? "vgs, vds and vsb" : "vsg, vsd and vbs";
  }

  private static String words(Map<Kind, Quantity> known) {
    return String.join(", ", known.keySet().stream().map(Kind::word).toList());
  }
}
