package pinchoff.source;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SuggestionsTest {
  private static final List<String> NAMES =
      List.of("V_OV", "V_GS", "V_TH", "I_D", "R_B", "zeroBiasThreshold", "bodyFactor", "MV", "mV");

  @ParameterizedTest
  @CsvSource({
    "V_OC, V_OV",
    "v_ov, V_OV",
    "V_VO, V_OV",
    "VGS, V_GS",
    "V__GS, V_GS",
    "Id, I_D",
    "zeroBiasTreshold, zeroBiasThreshold",
    "body_factor, bodyFactor",
    "mv, mV",
    "I_D, I_D"
  })
  void findsTheNearestName(String wrong, String meant) {
    assertEquals(Optional.of(meant), Suggestions.nearest(wrong, NAMES));
  }

  @ParameterizedTest
  @CsvSource({"capacitance", "x", "V", "'V_GS of the second device'"})
  void suggestsNothingThatIsFarOff(String wrong) {
    assertEquals(Optional.empty(), Suggestions.nearest(wrong, NAMES));
  }

  @Test
  void asksAQuestion() {
    assertEquals(
        Optional.of("did you mean V_OV?"), Suggestions.didYouMean("V_OX", List.of("V_OV")));
  }

  @Test
  void ofEquallyNearNamesTakesTheFirstWhateverTheOrder() {
    assertEquals(Optional.of("M1"), Suggestions.nearest("M9", List.of("M3", "M1", "M2")));
  }

  @Test
  void aHostileNameCostsNothing() {
    String huge = "x".repeat(1_000_000);
    assertEquals(Optional.empty(), Suggestions.nearest(huge, NAMES));
    assertEquals(Optional.empty(), Suggestions.nearest("abc", List.of(huge)));
    assertEquals(Optional.empty(), Suggestions.nearest("", NAMES));
  }
}
