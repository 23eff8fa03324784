package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.quantity.Constants;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** What a bias calls for: forward biased junctions, broken ratings, oxide field, extrapolation. */
final class Cautions {
  /** Relative permittivity of silicon dioxide. */
  private static final double OXIDE = 3.9;

  /** From here a forward biased junction conducts visibly (common practice, no source). */
  private static final double CONDUCTING = 0.3;

  /** Here it carries a current like the channel's (common practice, no source). */
  private static final double STRONGLY_CONDUCTING = 0.6;

  /** Long-term limit of the field in the oxide, 5 MV/cm (from memory, common practice). */
  private static final double FIELD_LIMIT = 5e8;

  private static final double SHORT = 0.5e-6;
  private static final double LARGE_OVERDRIVE = 1;

  private final OperatingPoint op;
  private final Labels labels;
  private final List<Caution> found = new ArrayList<>();

  private Cautions(OperatingPoint op) {
    this.op = op;
    this.labels = Labels.of(op.transistor().polarity());
  }

  static List<Caution> of(OperatingPoint op) {
    Cautions c = new Cautions(op);
    c.roles();
    c.junction("source-body", -op.vsb());
    c.junction("drain-body", -(op.vsb() + op.vds()));
    c.ratings();
    c.oxideField();
    c.extrapolation();
    return List.copyOf(c.found);
  }

  private void add(String id, String text) {
    found.add(new Caution(id, text));
  }

  private static Quantity volts(double value) {
    return Quantity.ofSi(value, Dimension.VOLTAGE);
  }

  private void roles() {
    if (op.isSwapped()) {
      add(
          "swapped",
          "The named drain acts as the source: %s between the named terminals is %s. Figures are those of the acting source."
              .formatted(labels.drainSource(), volts(-op.vds())));
    }
  }

  private void junction(String which, double forward) {
    if (forward <= Band.of(forward, 0)) {
      return;
    }
    String what =
        forward >= STRONGLY_CONDUCTING
            ? "it carries more than the channel may, and these figures do not hold"
            : forward >= CONDUCTING
                ? "its current is not in these figures"
                : "its current is small but not in these figures";
    add(
        which,
        "The %s junction (acting terminals) is forward biased by %s: %s."
            .formatted(which, volts(forward), what));
  }

  private void ratings() {
    Ratings r = op.transistor().device().ratings();
    Bias b = op.bias();
    rating("V_GS", b.gate(), b.source(), r.gateSource());
    rating("V_GD", b.gate(), b.drain(), r.gateDrain());
    rating("V_GB", b.gate(), b.body(), r.gateBody());
    rating("V_DS", b.drain(), b.source(), r.drainSource());
    rating("V_DB", b.drain(), b.body(), r.drainBody());
    rating("V_BS", b.body(), b.source(), r.bodySource());
    Quantity each = op.power().per(op.transistor().multiplier());
    r.power()
        .filter(most -> each.si() > most.si() * (1 + Band.RELATIVE))
        .ifPresent(
            most ->
                add(
                    "rating-power",
                    "Rating exceeded: %s in each unit device, allowed is %s."
                        .formatted(each, most)));
  }

  private void rating(String name, Quantity a, Quantity b, Optional<Quantity> limit) {
    Quantity size = a.minus(b).abs();
    limit
        .filter(most -> size.si() > most.si() + Band.of(size.si(), most.si()))
        .ifPresent(
            most ->
                add(
                    "rating-" + name,
                    "Rating exceeded: |%s| = %s, allowed is %s.".formatted(name, size, most)));
  }

  private void oxideField() {
    Optional<Quantity> cox = op.transistor().device().parameters().oxideCapacitance();
    if (cox.isEmpty()) {
      return;
    }
    double thickness = OXIDE * Constants.VACUUM_PERMITTIVITY.si() / cox.get().si();
    Bias b = op.bias();
    Quantity most =
        b.gate()
            .minus(b.source())
            .abs()
            .max(b.gate().minus(b.drain()).abs())
            .max(b.gate().minus(b.body()).abs());
    double field = most.si() / thickness;
    if (field > FIELD_LIMIT) {
      add(
          "oxide-field",
          "Field in the oxide: %s across %s is %s; the long-term limit is about 5 MV/cm."
              .formatted(
                  most,
                  Quantity.ofSi(thickness, Dimension.LENGTH),
                  Quantity.ofSi(field, Dimension.FIELD).to("MV/cm")));
    }
  }

  private void extrapolation() {
    Transistor t = op.transistor();
    double length = t.effectiveLength().si();
    if (op.vov() > LARGE_OVERDRIVE && length < SHORT && t.model() instanceof SquareLaw) {
      add(
          "short-channel",
          "V_OV = %s at L = %s: carriers reach their saturation velocity here, which the square law leaves out."
              .formatted(volts(op.vov()), t.effectiveLength()));
    }
    boolean other = !t.temperature().equals(t.device().parameters().nominalTemperature());
    if (other && t.device().parameters().temperatureCoefficients().isEmpty()) {
      add(
          "temperature",
          "The parameters hold at %s and have no temperature coefficients: at %s only kT/q was changed."
              .formatted(t.device().parameters().nominalTemperature(), t.temperature()));
    }
  }
}
