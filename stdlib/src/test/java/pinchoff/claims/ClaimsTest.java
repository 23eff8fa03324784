package pinchoff.claims;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.percent;
import static pinchoff.quantity.Units.uA;

import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.derive.Derivation;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.page.Standing;

class ClaimsTest {

  /** A place where premises are set. */
  private record Setting(Map<String, String> premises) implements Host {
    @Override
    public Optional<String> premise(String name) {
      return Optional.ofNullable(premises.get(name));
    }

    @Override
    public Map<String, String> technologies() {
      return Map.of("x.tech.json", "abc");
    }

    @Override
    public void publish(MimeBundle bundle) {
      throw new AssertionError("nothing is shown here");
    }
  }

  private final Host before = Host.current();

  @AfterEach
  void putBack() {
    Host.install(before);
  }

  private static void set(String name, String text) {
    Host.install(new Setting(Map.of(name, text)));
  }

  @Test
  void aPremiseHasItsUsualValueUnlessItIsSet() {
    assertEquals(V(1.8), Premise.of("V_DD", V(1.8)).value());
    set("V_DD", "1.62 V");
    Premise premise = Premise.of("V_DD", V(1.8));
    assertEquals(V(1.62), premise.value());
    assertTrue(premise.overridden());
    assertTrue(premise.page().text().contains("set from outside; usually 1.8 V"));
    assertEquals(Optional.empty(), Optional.of(premise).filter(p -> p.value().equals(V(1.8))));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "20 uA|premise V_DD = 20 µA is a current (A): expected a voltage (V)",
        "1.62|premise V_DD = 1.62 is a pure number: expected a voltage (V)",
        "high|",
        "NaN V|"
      })
  void aWrongSettingIsRefusedByName(String text, String part) {
    set("V_DD", text);
    String message =
        assertThrows(ClaimException.class, () -> Premise.of("V_DD", V(1.8))).getMessage();
    assertTrue(message.startsWith("premise V_DD, set from outside to \"" + text + "\": "), message);
    assertTrue(part == null || message.contains(part), message);
  }

  @Test
  void limitsHoldForSettingsAndUsualValuesAlike() {
    set("V_DD", "2.5 V");
    assertEquals(
        "premise V_DD = 2.5 V, set from outside: expected min 1.6 V, max 2 V",
        assertThrows(ClaimException.class, () -> Premise.of("V_DD", V(1.8)).between(V(1.6), V(2)))
            .getMessage());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "V DD", "1V", "<b>", "a-b"})
  void aPremiseNeedsANameThatFormulasCanUse(String name) {
    assertThrows(ClaimException.class, () -> Premise.of(name, V(1)));
  }

  @Test
  void formulasUsePremises() {
    Derivation d = Derivation.of("x = V_DD*2").using(Premise.of("V_DD", V(1.8)));
    assertEquals(V(3.6), d.value("x"));
    assertEquals("premise", d.inputs().get(0).origin());
  }

  @ParameterizedTest
  @CsvSource({"17.9, FAILS", "18, EDGE", "18.1, HOLDS", "20, HOLDS", "22, EDGE", "22.5, FAILS"})
  void aSpecIsJudgedByItsNearerLimit(double current, Standing standing) {
    Spec spec = Spec.of("I_D of M1", uA(current)).min(uA(18)).typ(uA(20)).max(uA(22));
    assertEquals(standing, spec.verdict().standing());
  }

  @Test
  void aSpecWithoutLimitsIsNotAPass() {
    assertEquals(Standing.UNKNOWN, Spec.of("x", V(1)).verdict().standing());
    assertEquals(Standing.UNKNOWN, Spec.of("x", V(1)).typ(V(1)).verdict().standing());
  }

  @Test
  void limitsMustMakeSense() {
    assertThrows(RuntimeException.class, () -> Spec.of("x", V(1)).min(V(2)).max(V(1)));
    assertThrows(RuntimeException.class, () -> Spec.of("x", V(1)).min(uA(2)));
    assertThrows(ClaimException.class, () -> Claim.of("x", V(1)).within(uA(1)));
    assertThrows(ClaimException.class, () -> Claim.of(" x", V(1)));
  }

  @Test
  void aClaimCarriesItsTolerance() {
    String json =
        String.valueOf(
            Claim.of("R_B", V(1)).within(percent(1)).display().data().get(MimeBundle.VALUES));
    assertTrue(json.contains("claim R_B") && json.contains("relative=0.01"), json);
    String absolute =
        String.valueOf(Claim.of("R_B", V(1)).within(mV(5)).display().data().get(MimeBundle.VALUES));
    assertTrue(absolute.contains("absolute=0.005"), absolute);
  }

  @Test
  void provenanceListsWhatWasRead() {
    Host.install(new Setting(Map.of()));
    Premise premise = Premise.of("V_DD", V(1.8));
    assertFalse(premise.overridden());
    String text = Provenance.current().page().text();
    for (String part : new String[] {"x.tech.json", "abc", "V_DD", "1.8 V", "Java"}) {
      assertTrue(text.contains(part), text);
    }
  }
}
