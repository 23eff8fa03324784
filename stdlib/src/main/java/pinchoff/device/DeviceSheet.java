package pinchoff.device;

import java.util.Optional;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.quantity.Quantity;

/** A kind of transistor as it is shown: the parameters of hand analysis. */
final class DeviceSheet {
  private DeviceSheet() {}

  static Page of(Device device) {
    DeviceParameters p = device.parameters();
    Page.Builder page =
        Page.titled(
            "{}: {} {} device{}",
            device.name(),
            p.polarity() == Polarity.N ? "n" : "p",
            p.mode() == Mode.DEPLETION ? "depletion" : "enhancement",
            p.flavour().isEmpty() ? "" : ", " + p.flavour());
    Table.Builder table = Table.sheet();
    add(page, table, "V_TH0", p.zeroBiasThreshold(), "signed as V_GS is");
    add(page, table, "k'", p.processTransconductance(), "mobility times C_ox");
    add(page, table, "γ", p.bodyFactor(), "");
    add(page, table, "2φ_F", p.surfacePotential(), "");
    add(page, table, "λ·L", p.channelLengthModulation(), "λ at a length is this over L");
    add(page, table, "n", p.slopeFactor(), "slope factor of weak inversion");
    add(page, table, "C_ox", p.oxideCapacitance(), "");
    add(page, table, "W_min", device.rules().minimumWidth(), "");
    add(page, table, "L_min", device.rules().minimumLength(), "");
    page.table(table);
    page.prose(
        "All hold at {}. {}",
        p.nominalTemperature(),
        device
            .source()
            .contentHash()
            .map(h -> "From " + device.source().technology() + " (" + h.substring(0, 12) + ").")
            .orElse("Given in a cell."));
    device
        .source()
        .contentHash()
        .ifPresent(hash -> page.technology(device.source().technology(), hash));
    return page.build();
  }

  private static void add(
      Page.Builder page, Table.Builder table, String symbol, Quantity value, String remark) {
    table.line(Symbol.of(symbol), value, remark);
    page.value(Value.of(Value.Kind.PARAMETER, symbol, symbol, value));
  }

  private static void add(
      Page.Builder page,
      Table.Builder table,
      String symbol,
      Optional<Quantity> value,
      String remark) {
    value.ifPresent(v -> add(page, table, symbol, v, remark));
  }
}
