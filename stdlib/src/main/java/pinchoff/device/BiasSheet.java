package pinchoff.device;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import pinchoff.page.Page;
import pinchoff.page.Phrase;
import pinchoff.page.Standing;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.page.Verdict;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** An operating point as it is shown: region and margins, figures, cautions, trust line. */
final class BiasSheet {
  /** Errors up to this are called small (common practice, no source). */
  private static final double SMALL = 0.1;

  /** Errors up to this are called moderate (common practice, no source). */
  private static final double MODERATE = 0.3;

  /** This close to V_DS,sat the output resistance is optimistic (common practice, no source). */
  private static final double NEAR_EDGE = 0.1;

  private static final Pattern SYMBOL =
      Pattern.compile("\\b(?:[A-Zg]_[A-Za-z]+(?:,sat)?(?:/[Ig]_[A-Za-z]+)?|r_o|IC|P)\\b");

  private final OperatingPoint op;
  private final Labels labels;
  private final List<Value> values = new ArrayList<>();

  private BiasSheet(OperatingPoint op) {
    this.op = op;
    this.labels = Labels.of(op.transistor().polarity());
  }

  static Page of(OperatingPoint op) {
    return new BiasSheet(op).page();
  }

  private Page page() {
    Transistor t = op.transistor();
    Page.Builder page = Page.titled("{}", heading(t));
    page.prose("{} at {}{}. {}", t.model().name(), t.temperature(), source(t), labels.signs());
    page.verdict(region(), "{}", op.region().words());
    page.table(bias());
    page.table(figures());
    op.cautions().forEach(c -> page.caution("{}", c.text()));
    trust(page);
    values.add(Value.verdict("region", "region", region()));
    values.add(Value.figure("region name", "region", op.region().words()));
    op.cautions().forEach(c -> values.add(Value.caution("caution " + c.id(), c.id(), c.text())));
    values.forEach(page::value);
    t.device()
        .source()
        .contentHash()
        .ifPresent(hash -> page.technology(t.device().source().technology(), hash));
    return page.build();
  }

  private static Phrase heading(Transistor t) {
    String units = t.multiplier() == 1 ? "" : t.multiplier() + " × ";
    return Phrase.of("{}, {}W/L = {}/{}", t.device().name(), units, t.width(), t.length());
  }

  private static String source(Transistor t) {
    Source source = t.device().source();
    return source
        .contentHash()
        .map(hash -> ", parameters of " + source.technology() + " (" + hash.substring(0, 12) + ")")
        .orElse(", parameters given in a cell");
  }

  private Verdict region() {
    if (op.isOnEdge()) {
      return Verdict.edge().saying("on the edge");
    }
    return Verdict.holds(op.margin()).saying("clear of its edges");
  }

  private Table bias() {
    Table.Builder table = Table.sheet();
    String body = op.bias().bodyAssumed() ? "not given: body tied to source" : "";
    line(table, "V_GS", labels.gateSource(), op.gateSourceVoltage(), "");
    line(table, "V_DS", labels.drainSource(), op.drainSourceVoltage(), "");
    line(table, "V_SB", labels.sourceBody(), op.sourceBodyVoltage(), body);
    line(table, "V_TH", labels.threshold(), op.threshold(), bodyEffect());
    line(table, "V_OV", "V_OV", op.overdrive(), labels.overdrive());
    if (op.region() != Region.CUTOFF) {
      String definition = op.transistor().model().saturationDefinition();
      boolean p = op.transistor().polarity() == Polarity.P;
      line(
          table,
          "V_DSsat",
          labels.saturation(),
          op.saturationVoltage(),
          p ? definition.replace("V_DS,sat", "V_SD,sat") : definition);
    }
    for (OperatingPoint.Edge edge : op.edges()) {
      line(table, "margin " + edge.name(), edge.name(), edge.distance(), edge.difference());
    }
    return table.build();
  }

  private String bodyEffect() {
    Channel c = op.channel();
    double shift = c.thresholdAt(op.vsb()) - c.threshold();
    return shift == 0
        ? ""
        : "%s by %s for %s"
            .formatted(
                shift > 0 ? "raised" : "lowered", volts(Math.abs(shift)), labels.sourceBody());
  }

  private Table figures() {
    Table.Builder table = Table.sheet();
    String flow = op.transistor().polarity() == Polarity.N ? "into the drain" : "out of the drain";
    line(table, "I_D", "I_D", op.drainCurrent(), op.isSwapped() ? "acting terminals" : flow);
    if (op.drainCurrent().si() > 0) {
      line(table, "g_m", "g_m", op.transconductance(), "");
      line(table, "g_mb", "g_mb", op.bodyTransconductance(), "");
      line(table, "g_ds", "g_ds", op.outputConductance(), "");
      line(table, "r_o", "r_o", op.outputResistance(), "1/g_ds");
      line(table, "g_m/I_D", "g_m/I_D", op.transconductanceEfficiency(), "");
      line(table, "g_m/g_ds", "g_m/g_ds", op.intrinsicGain(), "intrinsic gain");
    }
    Inversion inversion = op.inversion();
    line(
        table,
        "IC",
        "IC",
        Quantity.ofSi(inversion.coefficient(), Dimension.NONE),
        inversion.level().word() + " inversion");
    line(table, "P", "P", op.power(), "in all unit devices");
    return table.build();
  }

  private void line(Table.Builder table, String id, String name, Quantity value, String remark) {
    Object shown = name.matches("to .*|until .*") ? "margin " + name : notation(name);
    table.line(shown, value, notation(remark));
    values.add(Value.figure(id, name, value));
  }

  private void line(
      Table.Builder table, String id, String name, Optional<Quantity> value, String remark) {
    value.ifPresent(v -> line(table, id, name, v, remark));
  }

  /** A remark with its symbols set as such: words with a subscript. */
  private static Phrase notation(String remark) {
    Matcher symbols = SYMBOL.matcher(remark);
    List<Object> found = new ArrayList<>();
    while (symbols.find()) {
      found.add(Symbol.of(symbols.group()));
    }
    return Phrase.of(symbols.replaceAll("{}"), found.toArray());
  }

  private void trust(Page.Builder page) {
    ChannelModel model = op.transistor().model();
    if (model.conductsBelowThreshold()) {
      page.trust(
          Standing.HOLDS,
          "The {} model joins weak and strong inversion; it has no short-channel effects beyond λ.",
          model.name());
      return;
    }
    Optional<TrustComparison> comparison = TrustComparison.of(op);
    if (comparison.isEmpty()) {
      page.trust(
          Standing.UNKNOWN,
          "Not compared with the all-region model: it needs a slope factor or a body factor.");
    } else if (op.region() == Region.CUTOFF) {
      page.trust(
          Standing.FAILS,
          "Below {} the {} says no current; the all-region model with the same parameters says {}.",
          Symbol.of(labels.threshold()),
          model.name(),
          Quantity.ofSi(comparison.get().allRegionCurrent(), Dimension.CURRENT));
    } else {
      compared(page, comparison.get());
    }
    if (op.region() == Region.SATURATION && op.vds() - op.saturationVoltage().si() < NEAR_EDGE) {
      page.trust(
          Standing.EDGE,
          "This close to {} the output resistance is optimistic, and nothing here cross-checks it.",
          Symbol.of(labels.saturation()));
    }
    elsewhere(page);
  }

  private void compared(Page.Builder page, TrustComparison c) {
    double worst = Math.max(Math.abs(c.currentError()), Math.abs(c.gmErrorAtVoltage()));
    worst = Math.max(worst, Math.abs(c.gmErrorAtCurrent().orElse(0)));
    Standing standing =
        worst <= SMALL ? Standing.HOLDS : worst <= MODERATE ? Standing.EDGE : Standing.FAILS;
    page.trust(
        standing,
        "The {} against the all-region model with the same parameters (n = {}, matched in strong"
            + " inversion and saturation): {} {} at equal {}; {} {} at equal {}; {} {} at equal {},"
            + " {} at equal {}.",
        op.transistor().model().name(),
        Quantity.ofSi(c.slope(), Dimension.NONE),
        Symbol.of("I_D"),
        percent(c.currentError()),
        Symbol.of(labels.gateSource()),
        Symbol.of(labels.gateSource()),
        c.voltageError().isPresent() ? signed(volts(c.voltageError().getAsDouble())) : "not found",
        Symbol.of("I_D"),
        Symbol.of("g_m"),
        percent(c.gmErrorAtCurrent()),
        Symbol.of("I_D"),
        percent(c.gmErrorAtVoltage()),
        Symbol.of(labels.gateSource()));
    if (op.region() == Region.TRIODE) {
      page.trust(
          Standing.UNKNOWN,
          "The conductance at {} = 0 differs by {}; most of that is 1/n, an artefact of matching the"
              + " two models in saturation.",
          Symbol.of(labels.drainSource()),
          percent(c.triodeError()));
    }
  }

  /** Parameters are fitted in one region and trusted in others. */
  private void elsewhere(Page.Builder page) {
    DeviceParameters p = op.transistor().device().parameters();
    if (op.region() == Region.CUTOFF) {
      return;
    }
    Map<String, List<Symbol>> regions = new LinkedHashMap<>();
    p.thresholdFrom().ifPresent(from -> add(regions, from.region(), "V_TH0"));
    p.transconductanceFrom().ifPresent(from -> add(regions, from.region(), "k'"));
    regions.forEach(
        (region, symbols) ->
            page.trust(
                Standing.EDGE,
                symbols.size() == 1
                    ? "{} was extracted in {} and is used in {} here."
                    : "{} and {} were extracted in {} and are used in {} here.",
                Stream.concat(symbols.stream(), Stream.of(region, op.region().words())).toArray()));
  }

  private void add(Map<String, List<Symbol>> regions, String region, String symbol) {
    if (!region.isEmpty() && !region.equals(op.region().words())) {
      regions.computeIfAbsent(region, r -> new ArrayList<>()).add(Symbol.of(symbol));
    }
  }

  private static Quantity volts(double value) {
    return Quantity.ofSi(value, Dimension.VOLTAGE);
  }

  private static String signed(Quantity value) {
    return (value.si() < 0 ? "−" : "+") + value.abs().format(3);
  }

  private static String percent(OptionalDouble error) {
    return error.isPresent() ? percent(error.getAsDouble()) : "not found";
  }

  private static String percent(double error) {
    int digits = Math.abs(error) < 0.1 ? 2 : 3;
    return (error < 0 ? "−" : "+")
        + Quantity.ofSi(Math.abs(error), Dimension.NONE).to("%").format(digits);
  }
}
