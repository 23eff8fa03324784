package pinchoff.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.device.Known.vds;
import static pinchoff.device.Known.vgs;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.um;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import pinchoff.numeric.LogSquare;
import pinchoff.quantity.Constants;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

class TrustComparisonTest {
  private static final double SLOPE = 1.3;

  private final Transistor transistor =
      Device.of(
              Devices.plain(Polarity.N, 0.45, 300e-6)
                  .slopeFactor(Quantity.ofSi(SLOPE, Dimension.NONE))
                  .build())
          .sized(um(10), um(1));

  private TrustComparison at(double coefficient) {
    double ut = Constants.thermalVoltage(transistor.temperature()).si();
    double overdrive = SLOPE * ut * LogSquare.inverse(coefficient);
    return TrustComparison.of(transistor.at(vgs(V(0.45 + overdrive)), vds(V(4)))).orElseThrow();
  }

  /**
   * At IC = 0.9: g_m of the square law is √(2 β I) against I/(n U_T) (1 − e^−√IC)/√IC at equal
   * current, and β V_OV at equal voltage; worked out by hand from the equations of Enz,
   * Krummenacher and Vittoz (1995).
   */
  @Test
  void moderateInversionByHand() {
    TrustComparison c = at(0.9);
    double root = Math.sqrt(0.9);
    double efficiency = -StrictMath.expm1(-root) / root;
    double byCurrent = Math.sqrt(4 * 0.9) / (2 * 0.9 * efficiency) - 1;
    double overdrive = LogSquare.inverse(0.9);
    double byVoltage = overdrive / (2 * 0.9 * efficiency) - 1;
    assertEquals(byCurrent, c.gmErrorAtCurrent().orElseThrow(), 1e-6);
    assertEquals(byVoltage, c.gmErrorAtVoltage(), 1e-6);
    assertEquals(0.6, c.gmErrorAtCurrent().orElseThrow(), 0.05);
    assertEquals(-0.2, c.gmErrorAtVoltage(), 0.05);
  }

  @Test
  void bothAgreeInStrongInversion() {
    TrustComparison c = at(1000);
    assertEquals(0, c.currentError(), 2e-3);
    assertEquals(0, c.gmErrorAtCurrent().orElseThrow(), 2e-3);
    assertEquals(1 / SLOPE - 1, c.triodeError().orElseThrow(), 0.02);
  }

  @Test
  void theErrorGrowsAsInversionWeakens() {
    double last = 0;
    for (double ic : new double[] {100, 30, 10, 3, 1, 0.3}) {
      double error = Math.abs(at(ic).gmErrorAtCurrent().orElseThrow());
      assertTrue(error > last, () -> "at IC " + ic);
      last = error;
    }
  }

  @Test
  void withoutSlopeFactorThereIsNothingToCompareWith() {
    Transistor bare = Device.of(Devices.plain(Polarity.N, 0.45, 1e-4).build()).sized(um(1), um(1));
    OperatingPoint op = bare.at(vgs(V(0.7)), vds(V(1)));
    assertEquals(Optional.empty(), TrustComparison.of(op));
    assertTrue(op.page().text().contains("Not compared with the all-region model"));
  }
}
