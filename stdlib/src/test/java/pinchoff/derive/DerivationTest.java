package pinchoff.derive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.quantity.Units.A;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.degC;
import static pinchoff.quantity.Units.kohm;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.percent;
import static pinchoff.quantity.Units.quantity;
import static pinchoff.quantity.Units.uA;
import static pinchoff.quantity.Units.um;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.formula.NamedValue;
import pinchoff.formula.NamedValues;
import pinchoff.page.Standing;
import pinchoff.testing.Close;
import pinchoff.testing.Golden;

class DerivationTest {
  private static final String BIAS =
      """
      V_OV       = sqrt(2*I_REF/(k_n*W/L))   // square law, saturation
      V_GS       = V_TH + V_OV
      R_B [kohm] = (V_DD - V_GS)/I_REF       // from the rail to the gate
      V_OV >= 100 mV                         // strong inversion
      """;

  private static Derivation bias() {
    return Derivation.of(BIAS)
        .using("I_REF", uA(20))
        .using("k_n", quantity("290 uA/V^2"))
        .using("W", um(2))
        .using("L", um(1))
        .using("V_TH", V(0.45))
        .using("V_DD", V(1.8));
  }

  @Test
  void stepsAreWorkedOutInOrder() {
    Derivation d = bias();
    Close.assertRelative(Math.sqrt(2 * 20e-6 / 580e-6), d.value("V_OV").si(), 1e-15, "V_OV");
    Close.assertRelative(
        (1.8 - 0.45 - Math.sqrt(2 * 20e-6 / 580e-6)) / 20e-6, d.value("R_B").si(), 1e-14, "R_B");
    assertEquals("54.37 kΩ", d.value("R_B").toString());
    assertTrue(d.holds());
    assertEquals(Standing.HOLDS, d.steps().get(3).verdict().orElseThrow().standing());
  }

  @Test
  void looksAsReviewed() {
    Golden.assertMatches("derive/bias.txt", bias().page().text());
    Golden.assertMatches("derive/bias.tex", bias().latex());
    String faulty =
        """
        a = V_DD + I_REF
        b = a*2
        c = ln(V_0V/V_DD)
        V_OV = sqrt(V_TH - V_DD)
        e = V_DD/(V_TH - V_TH)
        f = 3 V_TH
        V_DD = 3 V
        g = h*2
        h = 4
        i = i + 1
        V_X such that V_X^2 = V_DD^2
        V_Y such that V_Y = V_DD, V_Y <= 1 V
        X such that X = 2*X + X/3
        P [W] = V_DD*V_DD
        """;
    Golden.assertMatches(
        "derive/faults.txt",
        Derivation.of(faulty)
            .using("V_DD", V(1.8))
            .using("V_TH", V(0.45))
            .using("I_REF", uA(20))
            .page()
            .text());
  }

  @Test
  void aNameSuppliedTwiceIsRefused() {
    assertEquals(
        "I_REF is supplied twice: 20 µA (given) and 30 µA (given)",
        assertThrows(DerivationException.class, () -> bias().using("I_REF", uA(30))).getMessage());
  }

  @Test
  void whatIsAskedForMustBeThere() {
    assertTrue(
        assertThrows(DerivationException.class, () -> bias().value("R_b"))
            .getMessage()
            .startsWith("R_b is not in this derivation; did you mean R_B?"));
    assertTrue(
        assertThrows(DerivationException.class, () -> bias().with("V_DS", V(1)))
            .getMessage()
            .startsWith("V_DS is no input of this derivation"));
  }

  @ParameterizedTest
  @CsvSource({
    "V_OV, I_REF, 0.5",
    "V_OV, W, -0.5",
    "V_OV, L, 0.5",
  })
  void relativeSensitivitiesOfAPowerLawAreItsExponents(String result, String input, double power) {
    double found =
        bias().sensitivities(result).to().stream()
            .filter(t -> t.input().equals(input))
            .findFirst()
            .orElseThrow()
            .relative();
    assertEquals(power, found, 1e-12);
  }

  @Test
  void theStrongestSensitivityIsFirst() {
    List<Sensitivities.To> to = bias().sensitivities("R_B").to();
    for (int i = 1; i < to.size(); i++) {
      assertTrue(Math.abs(to.get(i - 1).relative()) >= Math.abs(to.get(i).relative()));
    }
  }

  @Test
  void errorsOfInputsGiveCornersAndRootSumSquare() {
    Derivation divider =
        Derivation.of("V_B = V_DD*R_2/(R_1 + R_2)")
            .using("V_DD", V(1.8))
            .using("R_1", kohm(10))
            .using("R_2", kohm(20))
            .within("R_1", percent(10))
            .within("R_2", percent(10));
    Spread spread = divider.spread("V_B");
    Close.assertRelative(1.8 * 18 / 29, spread.least().si(), 1e-12, "least");
    Close.assertRelative(1.8 * 22 / 31, spread.most().si(), 1e-12, "most");
    double each = 1.8 * 20.0 * 10 / 900 * 0.1;
    Close.assertRelative(each * Math.sqrt(2), spread.rootSumSquare().si(), 1e-12, "rss");
    assertTrue(spread.complete());
    assertTrue(
        assertThrows(DerivationException.class, () -> bias().spread("R_B"))
            .getMessage()
            .startsWith("no input has an error"));
  }

  @Test
  void aRangeGivesATableAndAChart() {
    Sweep sweep = bias().over("I_REF", uA(10), uA(40), 4);
    assertEquals(List.of(1e-5, 2e-5, 3e-5, 4e-5), round(sweep.at()));
    Close.assertRelative(
        bias().with("I_REF", uA(30)).value("R_B").si(),
        sweep.results().get("R_B").get(2),
        1e-9,
        "");
    assertTrue(sweep.chart("R_B").description().contains("R_B against I_REF"));
    assertThrows(DerivationException.class, () -> sweep.chart("R_C"));
    assertThrows(DerivationException.class, () -> bias().over("I_REF", uA(1), uA(2), 1));
  }

  private static List<Double> round(List<Double> values) {
    return values.stream().map(v -> Math.rint(v * 1e9) / 1e9).toList();
  }

  @Test
  void aPointWithoutAValueIsAGap() {
    Sweep sweep =
        Derivation.of("y = sqrt(V_A)/1 V^0.5").using("V_A", V(1)).over("V_A", V(-1), V(1), 3);
    assertTrue(Double.isNaN(sweep.results().get("y").get(0)));
    assertEquals(1, sweep.results().get("y").get(2));
  }

  @Test
  void explainKeepsTheChainOnly() {
    Derivation chain = bias().explain("V_GS");
    assertEquals(2, chain.steps().size());
    assertEquals(bias().value("V_GS"), chain.value("V_GS"));
    assertFalse(chain.inputs().stream().anyMatch(i -> i.name().equals("V_DD")));
  }

  @Test
  void resultsFeedAnotherDerivation() {
    Derivation next = Derivation.of("P = V_GS*I").using(bias()).using("I", uA(20));
    Close.assertRelative(bias().value("V_GS").si() * 20e-6, next.value("P").si(), 1e-15, "P");
  }

  @Test
  void suppliersOfferMoreThanIsUsed() {
    NamedValues many =
        () ->
            List.of(new NamedValue("V_A", V(1), "premise"), new NamedValue("V_B", V(2), "premise"));
    Derivation d = Derivation.of("x = V_A/1 V").using(many);
    assertEquals(List.of("V_A"), d.inputs().stream().map(Input::name).toList());
  }

  @Test
  void aTemperatureCountsInKelvins() {
    Derivation d = Derivation.of("U_T = k_B*T/q").using("T", degC(27));
    Close.assertRelative(0.0258649257863, d.value("U_T").si(), 1e-11, "kT/q at 300.15 K");
  }

  @Test
  void variablesOfTheSessionAreTakenAsTheyAreThen() {
    Map<String, Object> variables =
        new java.util.HashMap<>(Map.of("V_A", V(1), "N", 4, "T", degC(27)));
    Host before = Host.install(new Variables(variables));
    try {
      Derivation d = Derivation.of("V_B = V_A*N\nU_T = k_B*T/q");
      variables.put("V_A", V(5));
      assertEquals(V(4), d.value("V_B"));
      assertEquals("variable of this session", d.inputs().get(0).origin());
      assertEquals(V(8), d.using("V_A", V(2)).value("V_B"));
    } finally {
      Host.install(before);
    }
  }

  /** A session with some variables. */
  private record Variables(Map<String, Object> variables) implements Host {
    @Override
    public Optional<Object> lookup(String name) {
      return Optional.ofNullable(variables.get(name));
    }

    @Override
    public void publish(MimeBundle bundle) {
      throw new AssertionError("nothing is shown here");
    }
  }

  @Test
  void anotherInputNeedsOnlyAnotherRun() {
    Derivation d = bias().with("I_REF", uA(80));
    Close.assertRelative(2 * bias().value("V_OV").si(), d.value("V_OV").si(), 1e-14, "V_OV");
    assertThrows(RuntimeException.class, () -> bias().with("I_REF", V(1)));
  }

  @Test
  void zeroCurrentIsARootToo() {
    Derivation d =
        Derivation.of("I such that beta/2*(I*R)^2 = I, I > 0 A")
            .using("beta", quantity("1 mA/V^2"))
            .using("R", kohm(2));
    Close.assertRelative(2 / (1e-3 * 4e6), d.value("I").si(), 1e-9, "I");
    assertEquals(A(0), d.steps().get(0).rejected().get(0).value());
  }

  @Test
  void theValuesEntryHasResultsWithSensitivities() {
    String json = String.valueOf(bias().display().data().get(MimeBundle.VALUES));
    for (String part : List.of("R_B", "check 4", "sensitivities", "I_REF")) {
      assertTrue(json.contains(part), () -> part + " in " + json);
    }
  }

  @Test
  void unitsAsNamesAreAmbiguous() {
    Derivation d = Derivation.of("x = 20 uA/W").using("W", um(2));
    assertTrue(
        d.issues().get(0).message().startsWith("W here is a unit, but there is also a quantity"),
        () -> d.issues().toString());
    assertEquals(List.of(), Derivation.of("x = 20 uA / W").using("W", um(2)).issues());
    assertEquals(mV(50), Derivation.of("x = 50 mV").value("x"));
  }
}
