package pinchoff.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.um;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.testing.Close;
import pinchoff.testing.ReferenceTable;

/** Operating points of published worked examples. */
class SquareLawReferenceTest {

  static Stream<ReferenceTable.Row> rows() {
    return ReferenceTable.rows("operating-points");
  }

  @ParameterizedTest
  @MethodSource("rows")
  void agreesWithTheExample(ReferenceTable.Row row) {
    OperatingPoint op = operatingPoint(row);
    double expected = row.number("expected");
    double actual = figure(op, row.text("figure"));
    if (expected == 0) {
      assertEquals(0, actual, row.toString());
    } else {
      Close.assertRelative(expected, actual, row.number("tolerance"), row.toString());
    }
  }

  @Test
  void atLeastTwentyExamplesAreHeld() {
    long examples = rows().map(r -> r.text("example")).distinct().count();
    assertTrue(examples >= 20, () -> "only " + examples);
  }

  private static OperatingPoint operatingPoint(ReferenceTable.Row row) {
    Polarity polarity = row.text("polarity").equals("n") ? Polarity.N : Polarity.P;
    DeviceParameters parameters =
        Devices.plain(polarity, row.number("vth"), row.number("k") * 1e-6)
            .bodyFactor(Quantity.ofSi(row.number("gamma"), Dimension.ROOT_VOLTAGE))
            .surfacePotential(V(row.number("phi2")))
            .channelLengthModulation(
                Quantity.ofSi(row.number("lambda_l") * 1e-6, Dimension.LENGTH_PER_VOLTAGE))
            .build();
    Transistor transistor = Device.of(parameters).sized(um(row.number("w")), um(row.number("l")));
    Quantity vgs = V(row.number("vgs"));
    Quantity vds = V(row.number("vds"));
    Quantity vsb = V(row.number("vsb"));
    return polarity == Polarity.N
        ? transistor.at(Known.vgs(vgs), Known.vds(vds), Known.vsb(vsb))
        : transistor.at(Known.vsg(vgs), Known.vsd(vds), Known.vbs(vsb));
  }

  private static double figure(OperatingPoint op, String figure) {
    return switch (figure) {
      case "I_D" -> op.drainCurrent().si();
      case "g_m" -> op.transconductance().si();
      case "g_mb" -> op.bodyTransconductance().si();
      case "g_ds" -> op.outputConductance().si();
      case "r_o" -> op.outputResistance().orElseThrow().si();
      case "V_TH" -> op.threshold().si();
      case "V_OV" -> op.overdrive().si();
      case "V_DS,sat" -> op.saturationVoltage().si();
      case "g_mb/g_m" -> op.bodyTransconductance().per(op.transconductance()).si();
      case "triode" -> op.region() == Region.TRIODE && !op.isOnEdge() ? 1 : 0;
      case "edge" -> op.region() == Region.SATURATION && op.isOnEdge() ? 1 : 0;
      default -> throw new IllegalArgumentException("figure " + figure);
    };
  }
}
