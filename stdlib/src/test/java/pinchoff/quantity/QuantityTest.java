package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.quantity.Units.*;

import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.display.MimeBundle;

class QuantityTest {

  @Test
  void waysToOneQuantityGiveTheSameBits() {
    assertEquals(V(0.65), mV(650));
    assertEquals(V(0.65), quantity("650 mV"));
    assertEquals(V(0.65), quantity("0.00065 kV"));
    assertEquals(um(2), quantity("2 um"));
    assertEquals(um(0.18), nm(180));
    assertEquals(um(0.18), quantity("0.18 µm"));
    assertEquals(um(0.18), quantity("1.8e-7 m"));
    assertEquals(fF(5), quantity("0.005 pF"));
    assertEquals(percent(35), ratio(0.35));
    assertEquals(ppm(350_000), ratio(0.35));
    assertEquals(cm(1), mm(10));
    assertEquals(0.18, um(0.18).in("um"));
    assertEquals(180, um(0.18).in("nm"));
    assertEquals(650, V(0.65).in("mV"));
  }

  @ParameterizedTest
  @CsvSource({
    "1.8, V, 1.8",
    "650, mV, 0.65",
    "20, uA, 2e-5",
    "10, kohm, 10000",
    "-3, us, -3e-6",
    "0, V, 0",
    "-0.0, V, 0.0",
    "1.12, eV, 1.79443783008e-19"
  })
  void holdsTheValueInSi(double value, String unit, double si) {
    assertEquals(si, Quantity.of(value, Unit.parse(unit)).si());
  }

  @Test
  void calculates() {
    assertEquals(V(2.45), V(1.8).plus(mV(650)));
    assertEquals(V(1.15), V(1.8).minus(mV(650)));
    assertEquals(mV(200), kohm(10).times(uA(20)));
    assertEquals(kohm(10), mV(200).per(uA(20)));
    assertEquals(V(3.6), V(1.8).times(2));
    assertEquals(V(0.9), V(1.8).per(2));
    assertEquals(quantity("9 V^2"), V(3).pow(2));
    assertEquals(quantity("3 √V"), V(9).sqrt());
    assertEquals(quantity("0.25 1/V"), V(4).pow(-1));
    assertEquals(quantity("8 V^1.5"), V(4).pow(3, 2));
    assertEquals(V(-1), V(1).negate());
    assertEquals(V(1), V(-1).abs());
    assertEquals(V(1), V(1).min(V(2)));
    assertEquals(V(2), V(1).max(V(2)));
    assertEquals(2.0, V(3.6).per(V(1.8)).ratio());
    assertTrue(V(0).isZero());
    assertFalse(V(1e-300).isZero());
    assertTrue(V(1).compareTo(mV(999)) > 0);
    assertEquals(0, V(1).compareTo(mV(1000)));
  }

  /** The square law by hand: ½ · 387 µA/V² · 10 · (0.2 V)² = 77.4 µA. */
  @Test
  void carriesUnitsThroughAFormula() {
    Quantity overdrive = mV(650).minus(mV(450));
    Quantity current =
        quantity("387 uA/V^2").times(um(10).per(um(1))).times(overdrive.pow(2)).per(2);
    assertEquals("77.4 µA", current.toString());
    assertEquals(Dimension.CURRENT, current.dimension());
    Quantity body = quantity("0.45 V^0.5").times(V(1.8).sqrt().minus(V(0.8).sqrt()));
    assertEquals(Dimension.VOLTAGE, body.dimension());
  }

  static Stream<Arguments> refused() {
    Map<String, Supplier<Object>> cases =
        Map.ofEntries(
            Map.entry(
                "1 V plus 20 µA: a voltage (V) and a current (A); expected the same dimension",
                () -> V(1).plus(uA(20))),
            Map.entry(
                "1 V minus 2 s: a voltage (V) and a time (s); expected the same dimension",
                () -> V(1).minus(s(2))),
            Map.entry(
                "1 V compared with 1 A: a voltage (V) and a current (A); expected the same dimension",
                () -> V(1).compareTo(A(1))),
            Map.entry(
                "2 V compared with 1 A: a voltage (V) and a current (A); expected the same dimension",
                () -> V(2).max(A(1))),
            Map.entry(
                "650 mV in mA: a voltage (V) is not a current (A); expected a unit such as V",
                () -> mV(650).in("mA")),
            Map.entry(
                "2 µm² in V: an area (m^2) is not a voltage (V); expected a unit such as m^2",
                () -> um(2).times(um(1)).to("V")),
            Map.entry("10 µA is a current (A): expected a pure number", () -> uA(10).ratio()),
            Map.entry(
                "V_GS of M1 = 10 µA is a current (A): expected a voltage (V)",
                () -> uA(10).requireDimension("V_GS of M1", Dimension.VOLTAGE)),
            Map.entry(
                "3 A²/V³ plus 1: a quantity in A^2/V^3 and a pure number; expected the same dimension",
                () -> quantity("3 A^2/V^3").plus(ratio(1))),
            Map.entry("NaN V: expected a finite number", () -> V(Double.NaN)),
            Map.entry("-Infinity uA: expected a finite number", () -> uA(Double.NEGATIVE_INFINITY)),
            Map.entry(
                "NaN A/V^2: expected a finite number",
                () -> Quantity.ofSi(Double.NaN, Dimension.TRANSCONDUCTANCE_PARAMETER)),
            Map.entry("1e307 MV: out of range in SI", () -> Quantity.of(1e307, Unit.parse("MV"))),
            Map.entry(
                "4.94065645841247e-324 aV: out of range in SI",
                () -> Quantity.of(Double.MIN_VALUE, Unit.parse("aV"))),
            Map.entry(
                "1e308 V plus 1e308 V: expected a finite result", () -> V(1e308).plus(V(1e308))),
            Map.entry(
                "-1e308 V minus 1e308 V: expected a finite result",
                () -> V(-1e308).minus(V(1e308))),
            Map.entry(
                "1e200 V times 1e200 A: expected a finite result", () -> V(1e200).times(A(1e200))),
            Map.entry("1 V times NaN: expected a finite result", () -> V(1).times(Double.NaN)),
            Map.entry(
                "1 V per 0 V: division by zero; expected a divisor other than zero",
                () -> V(1).per(V(0))),
            Map.entry(
                "0 V per 0 A: division by zero; expected a divisor other than zero",
                () -> V(0).per(A(0))),
            Map.entry(
                "1 V per 0: division by zero; expected a divisor other than zero",
                () -> V(1).per(0)),
            Map.entry("1 V per NaN: expected a finite result", () -> V(1).per(Double.NaN)),
            Map.entry(
                "-1 V to the power 1/2: a root of a negative value; expected zero or more",
                () -> V(-1).sqrt()),
            Map.entry(
                "0 V to the power -1: division by zero; expected a value other than zero",
                () -> V(0).pow(-1)),
            Map.entry("1e200 V to the power 2: the result is too large", () -> V(1e200).pow(2)),
            Map.entry(
                "V to the power 1/0: expected a denominator other than 0", () -> V(1).pow(1, 0)),
            Map.entry("1e300 V in nV: the number is too large", () -> V(1e300).in("nV")));
    return cases.entrySet().stream().map(e -> Arguments.of(e.getKey(), e.getValue()));
  }

  @ParameterizedTest
  @MethodSource("refused")
  void namesTheValuesAndWhatWasExpected(String message, Supplier<Object> call) {
    var thrown = assertThrows(QuantityException.class, call::get);
    assertEquals(message, thrown.getMessage());
    assertEquals(Optional.empty(), thrown.issue());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "27 degC|4|an absolute temperature is degC(27)",
        "1,8 V|2|expected a point as decimal mark",
        "1.000,5 V|6|expected a point as decimal mark",
        "V|1|expected a number",
        "'' |1|expected a number",
        "NaN|1|expected a number",
        "NaN V|1|expected a number",
        "Infinity V|1|expected a number",
        "- V|1|expected a number",
        ". V|1|expected a number",
        "--1 V|1|expected a number",
        "1e99999 V|2|at most 4 digits",
        "1e999 V|1|out of range",
        "-1e999 V|1|out of range",
        "1e-999 V|1|out of range",
        "1.8 V V|7|unexpected \"V\"",
        "1_000 V|2|unexpected \"_\"",
        "0x10 V|2|unknown unit \"x\"",
        "1 000 V|3|a number inside a unit",
        "5 mv|3|did you mean mV?",
        "1.8V;|5|unexpected \";\"",
        "2 m^40|3|exponent 40 of m",
        "20 dB|4|plain ratio"
      })
  void pointsAtWhatItCannotRead(String text, int column, String message) {
    var thrown = assertThrows(QuantityException.class, () -> Quantity.parse(text));
    var issue = thrown.issue().orElseThrow();
    assertTrue(issue.sentence().contains(message), issue::sentence);
    assertEquals(column, issue.span().start().column(), thrown.getMessage());
  }

  @ParameterizedTest
  @CsvSource({
    "1.8V, 1.8",
    "'  1.8  V  ', 1.8",
    "+1.8 V, 1.8",
    "-1.8 V, -1.8",
    "−1.8 V, -1.8",
    ".5 V, 0.5",
    "5. V, 5",
    "1.8e0 V, 1.8",
    "18E-1 V, 1.8",
    "1.8e+0 V, 1.8",
    "5eV, 8.01088317e-19",
    "1e3, 1000",
    "0e9999 V, 0",
    "35%, 0.35"
  })
  void readsNumbersAsPeopleWriteThem(String text, double si) {
    assertEquals(si, Quantity.parse(text).si());
  }

  @Test
  void remembersAUnitWhereItSaysSomething() {
    assertEquals(Optional.empty(), mV(650).displayUnit());
    assertEquals(Optional.empty(), quantity("8.5 fF/um^2").displayUnit());
    assertEquals(Optional.of(Unit.parse("eV")), eV(1).displayUnit());
    assertEquals(Optional.of(Unit.parse("cm")), cm(1).displayUnit());
    assertEquals(Optional.of(Unit.parse("V")), mV(650).to("V").displayUnit());
    assertEquals("1.5 eV", eV(1).plus(J(0)).times(1.5).toString());
    assertEquals("-1 eV", eV(1).negate().toString());
    assertEquals("1 eV", eV(-1).abs().toString());
    assertEquals("2 eV", eV(4).per(2).toString());
    assertEquals("630 mV", V(1.8).times(percent(35)).toString());
    assertEquals(mV(650), mV(650).to("V"));
  }

  @Test
  void equalityLooksAtValueAndDimension() {
    assertEquals(V(1), V(1).to("mV"));
    assertEquals(V(1).hashCode(), V(1).to("mV").hashCode());
    assertNotEquals(V(1), A(1));
    assertNotEquals(V(1), V(2));
    assertNotEquals(V(1), (Object) "1 V");
    assertEquals(V(0), V(-0.0));
    assertEquals(V(0).hashCode(), V(0).negate().hashCode());
    assertEquals("0 V", V(0).negate().toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "650 mV|650 mV",
        "387 µA/V²|387 uA/V^2",
        "10 kΩ|10 kohm",
        "0.45 √V|0.45 V^0.5",
        "5 nV/√Hz|5 nV/Hz^0.5",
        "1.12 eV|1.12 eV",
        "450 cm²/(V·s)|450 cm^2/(V*s)",
        "0.35|0.35",
        "35 %|35 %",
        "0 V|0 V",
        "1.23456789012345678 V|1.2345678901234567 V",
        "60°|60 deg"
      })
  void asciiTextReadsBack(String text, String ascii) {
    Quantity quantity = Quantity.parse(text);
    assertEquals(ascii, quantity.asciiText());
    assertEquals(quantity, Quantity.parse(ascii));
  }

  @Test
  void showsItselfAsTextAndHtml() {
    MimeBundle bundle = quantity("387 uA/V^2").display();
    assertEquals("387 µA/V²", bundle.plainText());
    assertEquals(
        Optional.of("<span>387&nbsp;µA/V<sup>2</sup></span>"), bundle.textOf(MimeBundle.HTML));
    assertEquals(Optional.of("<span>0.35</span>"), ratio(0.35).display().textOf(MimeBundle.HTML));
    assertEquals(
        Optional.of("<span>60°</span>"), quantity("60°").display().textOf(MimeBundle.HTML));
  }
}
