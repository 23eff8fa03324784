package pinchoff.device;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.formula.NamedValue;
import pinchoff.formula.NamedValues;
import pinchoff.quantity.Quantity;

/** The figures of an operating point under names that formulas can use. */
final class NamedFigures {
  private final String suffix;
  private final String origin;
  private final List<NamedValue> values = new ArrayList<>();

  private NamedFigures(String suffix, String origin) {
    this.suffix = suffix;
    this.origin = origin;
  }

  static NamedValues of(OperatingPoint op, String suffix) {
    if (!suffix.matches("[A-Za-z0-9]{1,16}")) {
      throw new DeviceException(
          "as(\"" + suffix + "\"): expected 1 to 16 letters or digits, for example as(\"1\")");
    }
    NamedFigures figures = new NamedFigures(suffix, "bias of " + op.transistor().device().name());
    figures.add(op);
    List<NamedValue> all = List.copyOf(figures.values);
    return () -> all;
  }

  private void add(OperatingPoint op) {
    Transistor t = op.transistor();
    DeviceParameters parameters = t.device().parameters();
    boolean n = t.polarity() == Polarity.N;
    add(n ? "V_GS" : "V_SG", op.gateSourceVoltage());
    add(n ? "V_DS" : "V_SD", op.drainSourceVoltage());
    add(n ? "V_SB" : "V_BS", op.sourceBodyVoltage());
    add("V_TH", op.threshold());
    add("V_OV", op.overdrive());
    add(n ? "V_DSsat" : "V_SDsat", op.saturationVoltage());
    add("I_D", op.drainCurrent());
    add("g_m", op.transconductance());
    add("g_mb", op.bodyTransconductance());
    add("g_ds", op.outputConductance());
    add("r_o", op.outputResistance());
    add("W", t.totalWidth());
    add("L", t.length());
    add(n ? "k_n" : "k_p", parameters.processTransconductance());
    add("lambda", parameters.channelLengthModulation().per(t.effectiveLength()));
    add("gamma", parameters.bodyFactor());
  }

  private void add(String name, Quantity value) {
    // digits join a letter (W1), a longer name needs its subscript (V_GS1)
    boolean word = name.length() > 1 && !name.contains("_");
    values.add(new NamedValue(name + (word ? "_" : "") + suffix, value, origin));
  }

  private void add(String name, Optional<Quantity> value) {
    value.ifPresent(v -> add(name, v));
  }
}
