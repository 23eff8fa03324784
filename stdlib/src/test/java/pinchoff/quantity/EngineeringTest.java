package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import pinchoff.testing.Gen;

class EngineeringTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        // text | four digits | toString
        "650 mV|650.0 mV|650 mV",
        "0.65 V|650.0 mV|650 mV",
        "1.8 V|1.800 V|1.8 V",
        "999.96 mV|1.000 V|1.000 V",
        "999.94 mV|999.9 mV|999.9 mV",
        "999.95 mV|1.000 V|1.000 V",
        "0.99995 V|1.000 V|1.000 V",
        "9.9996 V|10.00 V|10.00 V",
        "-999.96 mV|-1.000 V|-1.000 V",
        "-450 mV|-450.0 mV|-450 mV",
        "0 V|0 V|0 V",
        "0 mV|0 V|0 V",
        "0|0|0",
        "20 uA|20.00 µA|20 µA",
        "1e-18 A|1.000 aA|1 aA",
        "1e-19 A|1.000e-19 A|1e-19 A",
        "999.96e-21 A|1.000 aA|1.000 aA",
        "1.602176634e-19 C|1.602e-19 C|1.602e-19 C",
        "999.9e6 V|999.9 MV|999.9 MV",
        "1e9 V|1.000e9 V|1e9 V",
        "12345 A|12.35 kA|12.35 kA",
        "5e6 A|5.000e6 A|5e6 A",
        "3e12 Hz|3.000 THz|3 THz",
        "1500 K|1500 K|1500 K",
        "12345 K|12350 K|12350 K",
        "20000 F|20000 F|20000 F",
        "0.5 mK|500.0 µK|500 µK",
        "1e-9 K|1.000e-9 K|1e-9 K",
        "387 uA/V^2|387.0 µA/V²|387 µA/V²",
        "1 mA/V^2|1.000 mA/V²|1 mA/V²",
        "0.45 V^0.5|0.4500 √V|0.45 √V",
        "5 nV/√Hz|5.000 nV/√Hz|5 nV/√Hz",
        "1.6e-17 V^2/Hz|1.600e-17 V²/Hz|1.6e-17 V²/Hz",
        "8.5 fF/um^2|8.500 fF/µm²|8.5 fF/µm²",
        "8.5 mF/m^2|8.500 mF/m²|8.5 mF/m²",
        "0.3 fF/um|300.0 aF/µm|300 aF/µm",
        "450 cm^2/V/s|450.0 cm²/(V·s)|450 cm²/(V·s)",
        "5 mV*um|5.000 mV·µm|5 mV·µm",
        "0.1 um/V|0.1000 µm/V|0.1 µm/V",
        "0.06 1/V|0.06000 1/V|0.06 1/V",
        "4 V/um|4.000 V/µm|4 V/µm",
        "1e7 cm/s|1.000e7 cm/s|1e7 cm/s",
        "3e17 1/cm^3|3.000e17 1/cm³|3e17 1/cm³",
        "2 um^2|2.000 µm²|2 µm²",
        "0.5 mm^2|500000 µm²|500000 µm²",
        "1 mm^2|1.000 mm²|1 mm²",
        "-2 mV/K|-2.000 mV/K|-2 mV/K",
        "300 ohm/sq|300.0 Ω/sq|300 Ω/sq",
        "65 mV/dec|65.00 mV/dec|65 mV/dec",
        "35 %|35.00 %|35 %",
        "20 ppm/K|20.00 ppm/K|20 ppm/K",
        "60 deg|60.00°|60°",
        "1.12 eV|1.120 eV|1.12 eV",
        "25 meV|25.00 meV|25 meV",
        "1 cm|1.000 cm|1 cm",
        "0.35|0.3500|0.35",
        "1234.5|1235|1235",
        "1e6|1.000e6|1e6",
        "0.001|0.001000|0.001",
        "0.0009|9.000e-4|9e-4",
        "1e300 V|1.000e300 V|1e300 V",
        "5e-324 V|4.941e-324 V|4.941e-324 V"
      })
  void showsFourDigitsAndAPrefix(String text, String four, String brief) {
    Quantity quantity = Quantity.parse(text);
    assertEquals(four, quantity.format(4));
    assertEquals(brief, quantity.toString());
  }

  @ParameterizedTest
  @CsvSource({"1, 700 mV", "2, 650 mV", "3, 650 mV", "6, 650.000 mV", "17, 650.00000000000000 mV"})
  void showsTheDigitsAskedFor(int digits, String shown) {
    assertEquals(shown, Units.mV(650).format(digits));
  }

  @Test
  void numberAndUnitComeApart() {
    Engineering shown = Engineering.of(Units.mV(650), 4);
    assertEquals("650.0", shown.number());
    assertEquals("mV", shown.unit());
    assertEquals("", Engineering.of(Units.ratio(2), 4).unit());
  }

  @Test
  void refusesADigitCountThatMakesNoSense() {
    var thrown = assertThrows(QuantityException.class, () -> Units.V(1).format(0));
    assertEquals("0 significant digits: expected 1 to 17", thrown.getMessage());
    assertThrows(QuantityException.class, () -> Units.V(1).format(18));
  }

  @Test
  void aChosenUnitIsKept() {
    assertEquals("0.6500 V", Units.mV(650).to("V").format(4));
    assertEquals("1800 mV", Units.V(1.8).to("mV").toString());
    assertEquals("0.02 mA", Units.uA(20).to("mA").toString());
    assertEquals("2e-5 A", Units.uA(20).to("A").toString());
    assertEquals("1.794e-19 J", Units.eV(1.12).to("J").format(4));
    assertEquals("300.1 K", Quantity.parse("300.1 K").toString());
  }

  /** What is shown differs from the value by at most half a unit of its last digit. */
  @Test
  void roundsToTheNearest() {
    Gen.check(
        "rounding",
        5000,
        gen -> {
          Dimension dimension = DimensionTest.any(gen);
          Quantity quantity = Quantity.ofSi(gen.signed(-24, 15), dimension);
          int digits = gen.between(1, 10);
          Engineering shown = Engineering.of(quantity, digits);
          BigDecimal number = new BigDecimal(shown.number());
          BigDecimal exact = shown.in().decimalFromSi(quantity.si());
          int lead = number.precision() - number.scale() - 1;
          BigDecimal half = new BigDecimal("0.5").scaleByPowerOfTen(lead - digits + 1);
          BigDecimal lost = exact.subtract(number).abs();
          assertTrue(lost.compareTo(half) <= 0, () -> quantity.si() + " as " + shown.text());
          assertEquals(dimension, Quantity.parse(shown.text()).dimension(), shown::text);
        });
  }

  @Test
  void withinReachOfThePrefixesOneToThreeDigitsStandBeforeTheMark() {
    Gen.check(
        "prefix",
        5000,
        gen -> {
          NamedUnit unit =
              gen.pick(
                  Stream.of(NamedUnit.VOLT, NamedUnit.AMPERE, NamedUnit.FARAD, NamedUnit.OHM)
                      .toList());
          int low = unit == NamedUnit.OHM ? -9 : -18;
          int high = unit == NamedUnit.FARAD ? 2 : 5;
          Quantity quantity = Quantity.ofSi(gen.signed(low, high), unit.dimension());
          double number = Math.abs(Double.parseDouble(Engineering.of(quantity, 4).number()));
          assertTrue(number >= 1 && number < 1000, () -> quantity.si() + " as " + quantity);
        });
  }

  @ParameterizedTest
  @CsvSource({
    "A, 0, 2e-4, 5e-5, µA, 50",
    "A, -2e-4, 1e-6, -5e-5, µA, -50",
    "V, 0.2, 1.8, 0.2, V, 0.2",
    "V, 0, 0, 0, V, 0",
    "Hz, 1, 1e9, 1e6, GHz, 0.001",
    "S, 0, 1e-3, 2.5e-4, mS, 0.25",
    "1, 0, 1, 0.1, '', 0.1",
    "A/V^2, 0, 4e-4, 1e-4, µA/V², 100",
    "V, 0, 0.3, 0.30000000000000004, mV, 300"
  })
  void ticksShareOneUnit(
      String dimension, double low, double high, double at, String unit, String label) {
    Ticks ticks = Engineering.ticks(Unit.parse(dimension).dimension(), low, high);
    assertEquals(unit, ticks.unit().symbol());
    assertEquals(label, ticks.label(at));
    assertEquals(Double.parseDouble(label), ticks.in(at), 1e-9);
  }

  @Test
  void ticksRefuseWhatIsNotFinite() {
    assertThrows(
        QuantityException.class, () -> Engineering.ticks(Dimension.VOLTAGE, 0, Double.NaN));
    assertThrows(
        QuantityException.class,
        () -> Engineering.ticks(Dimension.VOLTAGE, 0, 1).label(Double.POSITIVE_INFINITY));
  }
}
