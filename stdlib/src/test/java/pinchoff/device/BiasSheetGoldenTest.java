package pinchoff.device;

import static pinchoff.device.Known.drain;
import static pinchoff.device.Known.gate;
import static pinchoff.device.Known.source;
import static pinchoff.device.Known.vbs;
import static pinchoff.device.Known.vds;
import static pinchoff.device.Known.vgs;
import static pinchoff.device.Known.vsd;
import static pinchoff.device.Known.vsg;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.um;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import pinchoff.testing.Golden;

/** How operating points and devices are shown. */
class BiasSheetGoldenTest {

  @Test
  void asPlainText() {
    Transistor n = Devices.coreN().sized(um(2), um(1)).times(2);
    Transistor p = Devices.coreP().sized(um(4), um(1));
    List<OperatingPoint> points =
        List.of(
            n.at(vgs(mV(650)), vds(V(1))),
            n.at(vgs(mV(650)), vds(mV(200))),
            n.at(vgs(mV(400)), vds(V(1))),
            n.at(gate(V(1)), drain(V(0)), source(V(0.3))),
            n.with(AllRegion.STANDARD).at(vgs(mV(480)), vds(V(1))),
            p.at(vsg(mV(700)), vsd(mV(100)), vbs(mV(300))));
    Golden.assertMatches(
        "device/bias-sheets.txt",
        points.stream().map(op -> op.page().text()).collect(Collectors.joining("\n\n")));
  }

  @Test
  void aDeviceAsPlainText() {
    Golden.assertMatches("device/device.txt", Devices.coreN().page().text());
  }
}
