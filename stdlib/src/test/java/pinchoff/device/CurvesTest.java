package pinchoff.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.device.Known.vds;
import static pinchoff.device.Known.vgs;
import static pinchoff.device.Known.vsb;
import static pinchoff.device.Known.vsd;
import static pinchoff.device.Known.vsg;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.um;

import org.junit.jupiter.api.Test;
import pinchoff.chart.Chart;
import pinchoff.chart.Item;
import pinchoff.chart.Line;
import pinchoff.chart.Locus;
import pinchoff.chart.Marker;
import pinchoff.chart.Points;
import pinchoff.display.MimeBundle;
import pinchoff.testing.Close;

class CurvesTest {
  private final Transistor n = Devices.coreN().sized(um(2), um(1));
  private final Transistor p = Devices.coreP().sized(um(4), um(1));

  private static <T extends Item> T only(Chart chart, Class<T> type) {
    return chart.panels().get(0).items().stream()
        .filter(type::isInstance)
        .map(type::cast)
        .findFirst()
        .orElseThrow();
  }

  /** With λ in both regions the locus is ½ k′ (W/L) V_DS² (1 + λ V_DS). */
  @Test
  void theEdgeOfSaturationIsTheParabolaWithLambda() {
    Points locus = only(n.outputCurves(V(0.6), V(1)).chart(), Locus.class).points();
    for (int i = 0; i < locus.size(); i++) {
      double v = locus.x(i);
      double expected = 0.5 * 320e-6 * 2 * v * v * (1 + 0.08 * v);
      assertEquals(expected, locus.y(i), 1e-12, "at " + v);
    }
  }

  @Test
  void curvesHoldTheirOwnOperatingPoints() {
    Points curve = only(n.outputCurves(V(0.8)).chart(), Line.class).points();
    for (int i = 1; i < curve.size(); i += 17) {
      double expected = n.at(vgs(V(0.8)), vds(V(curve.x(i)))).drainCurrent().si();
      Close.assertRelative(expected, curve.y(i), 1e-12, "at " + curve.x(i));
    }
  }

  @Test
  void aMarkedPointLiesOnItsCurve() {
    OperatingPoint op = n.at(vgs(V(0.8)), vds(V(1)));
    Marker marker = only(n.outputCurves(V(0.8)).mark(op).chart(), Marker.class);
    assertEquals(op.drainCurrent(), marker.y());
    assertEquals(V(1), marker.x());
  }

  @Test
  void theRootOfTheCurrentIsStraightWithoutLambda() {
    Transistor plain = Device.of(Devices.plain(Polarity.N, 0.4, 1e-4).build()).sized(um(1), um(1));
    Chart chart = plain.transferCurve(vds(V(3))).chart();
    Points root = ((Line) chart.panels().get(1).items().get(0)).points();
    double slope = Math.sqrt(0.5e-4);
    for (int i = 0; i < root.size(); i++) {
      assertEquals(slope * Math.max(0, root.x(i) - 0.4), root.y(i), 1e-12, "at " + root.x(i));
    }
  }

  @Test
  void bodyEffectMovesTheThresholdOfTheCurve() {
    String shifted = n.transferCurve(vds(V(1))).at(vsb(V(0.5))).chart().description();
    double threshold = 0.45 + 0.45 * (Math.sqrt(1.35) - Math.sqrt(0.85));
    assertTrue(shifted.contains("\"V_TH\" at " + V(threshold)), shifted);
  }

  @Test
  void aPDeviceHasItsOwnSymbols() {
    String text = p.outputCurves(V(0.6), V(0.8)).chart().description();
    assertTrue(text.contains("V_SG = 600 mV") && text.contains("V_SD"), text);
  }

  @Test
  void mistakesAreNamed() {
    assertEquals(
        "vds(1 V) for a transfer curve of plain-p: expected vsd",
        message(() -> p.transferCurve(vds(V(1)))));
    assertEquals(
        "0 output curves: expected 1 to 16 values of V_GS", message(() -> n.outputCurves()));
    assertTrue(
        message(() -> n.outputCurves(V(1)).mark(p.at(vsg(V(1)), vsd(V(1)))))
            .contains("expected one of the same transistor"));
  }

  private static String message(Runnable attempt) {
    return assertThrows(DeviceException.class, attempt::run).getMessage();
  }

  @Test
  void theyShowAPictureAndWords() {
    MimeBundle bundle = n.outputCurves(mV(600)).display();
    assertTrue(bundle.data().containsKey(MimeBundle.PNG), () -> bundle.data().keySet().toString());
    assertTrue(bundle.plainText().contains("edge of saturation"), bundle::plainText);
  }

  @Test
  void theRegionMapHasTheBoundaryAtTheOverdrive() {
    Chart chart = n.regionMap().mark(n.at(vgs(V(0.8)), vds(V(1)))).chart();
    Points boundary = only(chart, Locus.class).points();
    for (int i = 0; i < boundary.size(); i++) {
      double expected = Math.min(1.98, Math.max(0, boundary.y(i) - 0.45));
      assertEquals(expected, boundary.x(i), 1e-12);
    }
    String text = chart.description();
    for (String part : new String[] {"cutoff", "triode", "saturation", "350 mV of margin"}) {
      assertTrue(text.contains(part), text);
    }
  }

  /** Weak-inversion limit 1/(n U_T) and IC = 10: Enz, Krummenacher and Vittoz (1995). */
  @Test
  void efficiencyFollowsTheInterpolation() {
    Transistor t =
        Device.of(
                Devices.plain(Polarity.N, 0.45, 3e-4)
                    .slopeFactor(
                        pinchoff.quantity.Quantity.ofSi(1.3, pinchoff.quantity.Dimension.NONE))
                    .build())
            .sized(um(1), um(1));
    Points curve = only(t.efficiencyCurve().chart(), Line.class).points();
    double limit = 1 / (1.3 * 0.0258519997864);
    assertEquals(limit, curve.y(0), 0.02 * limit);
    for (int i = 0; i < curve.size(); i++) {
      if (Math.abs(curve.x(i) - 10) < 1e-9) {
        Close.assertRelative(9.01111932896, curve.y(i), 1e-6, "IC = 10");
      }
    }
    assertThrows(
        DeviceException.class,
        () ->
            Device.of(Devices.plain(Polarity.N, 0.45, 3e-4).build())
                .sized(um(1), um(1))
                .efficiencyCurve());
  }
}
