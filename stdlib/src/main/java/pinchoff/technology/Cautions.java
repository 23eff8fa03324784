package pinchoff.technology;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * What a reader of a technology should know before trusting it: values that do not agree with each
 * other, and values that do not say where they come from. None of it makes a file wrong, since a
 * fitted parameter is free to differ from what the layers make of it.
 */
final class Cautions {
  /** Where long-term stress of the oxide begins: 6 MV/cm (common practice, no source). */
  private static final double OXIDE_FIELD = 6e8;

  private static final List<String> VOLTAGES =
      List.of("gateSource", "gateDrain", "gateBody", "drainSource", "drainBody");

  private final Document document;
  private final Temperature nominal;
  private final List<String> cautions = new ArrayList<>();

  private Cautions(Document document, Temperature nominal) {
    this.document = document;
    this.nominal = nominal;
  }

  static List<String> of(Document document, Temperature nominal) {
    Cautions all = new Cautions(document, nominal);
    for (String name : document.names("devices")) {
      all.device(name, new Section(document, "devices." + name));
    }
    return List.copyOf(all.cautions);
  }

  private void device(String name, Section device) {
    layers(name, device);
    source(name, device.in("squareLaw"));
    rail(name, device);
  }

  /** Parameters against what the layers make of them. */
  private void layers(String name, Section device) {
    Section process = device.in("process");
    Section square = device.in("squareLaw");
    Optional<Quantity> thickness = process.amount("oxideThickness");
    Optional<Quantity> doping = process.amount("channelDoping");
    Optional<Quantity> oxide =
        process.amount("oxideCapacitance").or(() -> thickness.map(Silicon::oxideCapacitance));
    agree(
        name + ": C_ox",
        process.amount("oxideCapacitance"),
        "ε_ox/t_ox",
        thickness.map(Silicon::oxideCapacitance),
        0.02);
    agree(
        name + ": k′",
        square.amount("processTransconductance"),
        "μ C_ox",
        process.amount("mobility").flatMap(mobility -> oxide.map(mobility::times)),
        0.05);
    agree(
        name + ": γ",
        square.amount("bodyFactor"),
        "√(2 q ε_si N)/C_ox",
        doping.flatMap(n -> oxide.map(c -> Silicon.bodyFactor(n, c))),
        0.1);
    agree(
        name + ": 2φ_F",
        square.amount("surfacePotential"),
        "2 kT/q ln(N/n_i)",
        doping.map(n -> Silicon.surfacePotential(n, nominal)),
        0.05);
    agree(
        name + ": slope factor n",
        device.in("allRegion").amount("slopeFactor"),
        "1 + γ/(2 √2φ_F)",
        slopeFactor(square),
        0.1);
    field(name, device.in("ratings").amount("gateSource"), thickness);
  }

  private static Optional<Quantity> slopeFactor(Section square) {
    return square
        .amount("bodyFactor")
        .flatMap(
            gamma -> square.amount("surfacePotential").map(phi -> gamma.per(phi.sqrt()).times(0.5)))
        .map(chi -> Quantity.ofSi(1 + chi.ratio(), chi.dimension()));
  }

  private void agree(
      String what,
      Optional<Quantity> stated,
      String formula,
      Optional<Quantity> expected,
      double tolerance) {
    if (stated.isEmpty() || expected.isEmpty()) {
      return;
    }
    double off = stated.get().per(expected.get()).ratio() - 1;
    if (Math.abs(off) > tolerance) {
      String percent = Quantity.ofSi(Math.abs(off), Dimension.NONE).to("%").format(2);
      cautions.add(
          what
              + " = "
              + stated.get()
              + " is "
              + percent
              + (off > 0 ? " above " : " below ")
              + formula
              + " = "
              + expected.get());
    }
  }

  private void field(String name, Optional<Quantity> rating, Optional<Quantity> thickness) {
    if (rating.isPresent() && thickness.isPresent()) {
      Quantity field = rating.get().per(thickness.get());
      if (field.si() > OXIDE_FIELD) {
        cautions.add(
            name
                + ": the rated V_GS puts "
                + field
                + " across the oxide; long-term stress begins at about 600 V/µm");
      }
    }
  }

  /** Whether k′ and V_TH say how they were found. */
  private void source(String name, Section square) {
    List<String> unknown = new ArrayList<>();
    for (String key : List.of("zeroBiasThreshold", "processTransconductance")) {
      Optional<Stated> stated = document.stated(square.path(key));
      if (stated.filter(s -> s.region().isPresent() && s.method().isPresent()).isEmpty()) {
        unknown.add(key.startsWith("z") ? "V_TH0" : "k′");
      }
    }
    if (!unknown.isEmpty()) {
      cautions.add(
          name
              + ": "
              + String.join(" and ", unknown)
              + (unknown.size() == 1 ? " does" : " do")
              + " not say from which region and by which method");
    }
  }

  /** The rail against the ratings. */
  private void rail(String name, Section device) {
    Section rail = new Section(document, "rails").in(device.words("rail"));
    Optional<Quantity> supply = rail.amount("maximum").or(() -> rail.amount("nominal"));
    Section ratings = device.in("ratings");
    for (String key : VOLTAGES) {
      Optional<Quantity> rating = ratings.amount(key);
      if (supply.isPresent() && rating.isPresent() && supply.get().compareTo(rating.get()) > 0) {
        cautions.add(
            name
                + ": its rail may reach "
                + supply.get()
                + ", but "
                + ratings.path(key)
                + " is "
                + rating.get());
      }
    }
  }
}
