package pinchoff.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.device.Known.body;
import static pinchoff.device.Known.drain;
import static pinchoff.device.Known.gate;
import static pinchoff.device.Known.source;
import static pinchoff.device.Known.vbs;
import static pinchoff.device.Known.vds;
import static pinchoff.device.Known.vgs;
import static pinchoff.device.Known.vsb;
import static pinchoff.device.Known.vsd;
import static pinchoff.device.Known.vsg;
import static pinchoff.quantity.Units.A;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.um;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.QuantityException;
import pinchoff.testing.Close;
import pinchoff.testing.Gen;

class OperatingPointTest {
  private final Transistor n = Devices.coreN().sized(um(2), um(1));
  private final Transistor p = Devices.coreP().sized(um(4), um(1));

  /** Common practice, no source: in the square law V_DS,sat is the overdrive. */
  @ParameterizedTest
  @ValueSource(doubles = {0.5, 0.65, 0.9, 1.3})
  void saturationBeginsAtTheOverdrive(double gateVoltage) {
    OperatingPoint op = n.at(vgs(V(gateVoltage)), vds(V(1.8)));
    assertEquals(op.overdrive(), op.saturationVoltage());
  }

  /** Common practice, no source: without λ the current at the edge is ½ k′ (W/L) V_OV². */
  @ParameterizedTest
  @CsvSource({"0.6, 0.45, 200e-6, 10", "1.2, 0.7, 50e-6, 3", "0.3, -0.2, 120e-6, 1.5"})
  void theCurrentAtTheEdge(double gateVoltage, double threshold, double k, double ratio) {
    Transistor t =
        Device.of(Devices.plain(Polarity.N, threshold, k).build()).sized(um(ratio), um(1));
    Quantity overdrive = V(gateVoltage).minus(V(threshold));
    OperatingPoint op = t.at(vgs(V(gateVoltage)), vds(overdrive));
    assertTrue(op.isOnEdge());
    assertEquals(Region.SATURATION, op.region());
    double expected = 0.5 * k * ratio * overdrive.si() * overdrive.si();
    Close.assertRelative(expected, op.drainCurrent().si(), 1e-12, "edge");
  }

  /** Common practice, no source: by the square law nothing flows at or below the threshold. */
  @ParameterizedTest
  @ValueSource(doubles = {-1, 0, 0.3, 0.449999, 0.45})
  void nothingFlowsAtOrBelowTheThreshold(double gateVoltage) {
    OperatingPoint op = n.at(vgs(V(gateVoltage)), vds(V(1)));
    assertEquals(A(0), op.drainCurrent());
    assertEquals(Region.CUTOFF, op.region());
  }

  /** Common practice, no source: the drain need only exceed V_OV, not the gate voltage. */
  @Test
  void theDrainMayBeBelowTheGate() {
    OperatingPoint op = n.at(vgs(V(0.65)), vds(V(0.3)));
    assertTrue(op.drainSourceVoltage().compareTo(op.gateSourceVoltage()) < 0);
    assertEquals(Region.SATURATION, op.region());
  }

  /** Common practice, no source: thresholds from below zero (depletion) to a few volts. */
  @ParameterizedTest
  @ValueSource(doubles = {-4, -0.5, 0, 0.45, 2, 5})
  void thresholdsOfManyKinds(double threshold) {
    Transistor t =
        Device.of(Devices.plain(Polarity.N, threshold, 1e-4).build()).sized(um(1), um(1));
    assertEquals(Region.CUTOFF, t.at(vgs(V(threshold)), vds(V(1))).region());
    OperatingPoint on = t.at(vgs(V(threshold + 0.5)), vds(V(1)));
    assertEquals(Region.SATURATION, on.region());
    Close.assertRelative(0.5e-4 * 0.25, on.drainCurrent().si(), 1e-9, "current");
  }

  @Test
  void marginsAreDistancesToTheEdges() {
    OperatingPoint op = n.at(vgs(mV(650)), vds(V(1)));
    assertEquals(
        List.of("to triode", "to cutoff"),
        op.edges().stream().map(OperatingPoint.Edge::name).toList());
    Close.assertRelative(0.8, op.edges().get(0).distance().si(), 1e-12, "to triode");
    Close.assertRelative(0.2, op.margin().si(), 1e-12, "least");
  }

  @Test
  void aPDeviceIsTheMirrorImage() {
    Gen.check(
        "mirror",
        500,
        gen -> {
          double gs = gen.uniform(0, 1.8);
          double ds = gen.uniform(0, 1.8);
          double sb = gen.uniform(0, 0.8);
          Transistor mirrored =
              Device.of(
                      Devices.plain(Polarity.N, 0.43, 80e-6)
                          .bodyFactor(p.device().parameters().bodyFactor())
                          .surfacePotential(p.device().parameters().surfacePotential())
                          .channelLengthModulation(
                              p.device().parameters().channelLengthModulation())
                          .build())
                  .sized(um(4), um(1));
          OperatingPoint op = p.at(vsg(V(gs)), vsd(V(ds)), vbs(V(sb)));
          OperatingPoint image = mirrored.at(vgs(V(gs)), vds(V(ds)), vsb(V(sb)));
          assertEquals(image.drainCurrent(), op.drainCurrent());
          assertEquals(image.region(), op.region());
          assertEquals(image.transconductance(), op.transconductance());
        });
  }

  @Test
  void nodesAndDifferencesAgree() {
    OperatingPoint nodes = p.at(gate(V(1.1)), drain(V(0.6)), source(V(1.8)), body(V(1.8)));
    OperatingPoint differences = p.at(vsg(V(1.8).minus(V(1.1))), vsd(V(1.8).minus(V(0.6))));
    assertEquals(differences.drainCurrent(), nodes.drainCurrent());
  }

  @Test
  void rolesAreTakenByTheVoltages() {
    OperatingPoint op = n.at(gate(V(1)), drain(V(0)), source(V(0.3)), body(V(0)));
    assertTrue(op.isSwapped());
    assertTrue(op.drainCurrent().si() > 0);
    assertTrue(op.cautions().stream().anyMatch(c -> c.id().equals("swapped")));
    assertTrue(op.page().text().contains("The named drain acts as the source"));
  }

  static Stream<Arguments> refusals() {
    Transistor n = Devices.coreN().sized(um(2), um(1));
    Transistor p = Devices.coreP().sized(um(4), um(1));
    return Stream.of(
        refusal(
            "vgs given to plain-p, a p device: did you mean vsg?",
            () -> p.at(vgs(V(1)), vsd(V(1)))),
        refusal(
            "vsd given to plain-n, an n device: did you mean vds?",
            () -> n.at(vgs(V(1)), vsd(V(1)))),
        refusal("bias of plain-n: vds is missing; given: vgs", () -> n.at(vgs(V(1)))),
        refusal("bias of plain-n: vgs is missing; given: nothing", () -> n.at()),
        refusal("vgs is given twice: 1 V and 2 V", () -> n.at(vgs(V(1)), vgs(V(2)), vds(V(1)))),
        refusal(
            "bias of plain-n mixes node voltages with differences: vds, gate; expected either gate,"
                + " drain, source and body, or vgs, vds and vsb",
            () -> n.at(gate(V(1)), vds(V(1)))),
        refusal(
            "V_SB = -1 V of plain-n: 2φ_F + V_SB = -150 mV, expected above 0, since the body effect"
                + " has no meaning there",
            () -> n.at(vgs(V(1)), vds(V(1)), vsb(V(-1)))),
        refusal(
            "W of plain-n = 100 nm: below the minimum of the process, 220 nm",
            () -> Devices.coreN().sized(um(0.1), um(1))),
        refusal("0 unit devices of plain-n: expected 1 to 1000000", () -> n.times(0)));
  }

  private static Arguments refusal(String message, Runnable attempt) {
    return Arguments.of(message, attempt);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("refusals")
  void mistakesAreNamed(String message, Runnable attempt) {
    assertEquals(message, assertThrows(DeviceException.class, attempt::run).getMessage());
  }

  @Test
  void aTermOfAnotherDimensionIsRefused() {
    assertEquals(
        "vgs = 3 µA is a current (A): expected a voltage (V)",
        assertThrows(QuantityException.class, () -> vgs(pinchoff.quantity.Units.uA(3)))
            .getMessage());
  }

  @Test
  void brokenRatingsAndForwardJunctionsAreCautions() {
    OperatingPoint hot = n.at(vgs(V(2.5)), vds(V(1)));
    assertTrue(hot.cautions().stream().anyMatch(c -> c.text().contains("|V_GS| = 2.5 V")));
    OperatingPoint forward = n.at(vgs(V(0.8)), vds(V(1)), vsb(V(-0.4)));
    assertTrue(
        forward.cautions().stream()
            .anyMatch(
                c -> c.text().contains("source-body junction") && c.text().contains("400 mV")),
        () -> forward.cautions().toString());
    assertFalse(n.at(vgs(mV(650)), vds(V(1))).cautions().stream().findAny().isPresent());
  }
}
