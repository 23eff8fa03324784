package pinchoff.technology;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import pinchoff.testing.Golden;

/** The messages of every kind of fault, and the schema. */
class TechnologyGoldenTest {

  /** A change of the demo file: what to replace, and by what. */
  private record Slip(String what, String from, String to) {}

  private static final List<Slip> SLIPS =
      List.of(
          new Slip("unknown key", "\"bodyFactor\": \"0.44", "\"bodyfactor\": \"0.44"),
          new Slip("missing unit", "\"0.08 um/V\"", "\"0.08\""),
          new Slip("bare number", "\"0.08 um/V\"", "0.08"),
          new Slip("wrong dimension", "\"0.08 um/V\"", "\"0.08 1/V\""),
          new Slip("unknown unit", "\"0.08 um/V\"", "\"0.08 um/Volt\""),
          new Slip("wrong sign", "\"-0.46 V\"", "\"0.46 V\""),
          new Slip("wrong mode", "\"mode\": \"depletion\"", "\"mode\": \"depleted\""),
          new Slip("impossible value", "\"0.44 V^0.5\"", "\"-0.44 V^0.5\""),
          new Slip("out of range", "\"slopeFactor\": \"1.23\"", "\"slopeFactor\": \"7\""),
          new Slip("unknown rail", "\"rail\": \"io\"", "\"rail\": \"i0\""),
          new Slip("rails out of order", "\"minimum\": \"1.62 V\"", "\"minimum\": \"1.9 V\""),
          new Slip(
              "size off the grid", "\"minimumWidth\": \"0.22 um\"", "\"minimumWidth\": \"222 nm\""),
          new Slip(
              "corner reversed", "\"thresholdShift\": \"40 mV\"", "\"thresholdShift\": \"-40 mV\""),
          new Slip("temperature without unit", "\"27 degC\"", "\"27\""),
          new Slip("temperature outside its range", "\"27 degC\"", "\"270 degC\""),
          new Slip("difference for a temperature", "\"27 degC\"", "\"27 V\""),
          new Slip("another format", "\"technology-1\"", "\"technology-9\""),
          new Slip(
              "key twice", "\"name\": \"larch180\"", "\"name\": \"larch180\", \"name\": \"x\""),
          new Slip("value of the wrong kind", "\"rails\": {", "\"rails\": [1], \"x\": {"),
          new Slip("comma missing", "\"name\": \"larch180\",", "\"name\": \"larch180\""),
          new Slip("text not ended", "\"name\": \"larch180\",", "\"name\": \"larch180,"),
          new Slip("comment", "\"name\": \"larch180\",", "// a note\n  \"name\": \"larch180\","),
          new Slip("control character", "\"core device\"", "\"core\\u0007device\""));

  @Test
  void everyFaultNamesItsPlaceAndWhatWasExpected() {
    StringBuilder all = new StringBuilder();
    for (Slip slip : SLIPS) {
      String text = Larch.text();
      assertTrue(text.contains(slip.from()), slip.what());
      String changed = text.replace(slip.from(), slip.to());
      TechnologyException refused =
          assertThrows(
              TechnologyException.class, () -> Technology.parse(changed, "t"), slip.what());
      all.append("=== ").append(slip.what()).append('\n').append(refused.getMessage());
      all.append("\n\n");
    }
    Golden.assertMatches("technology/faults.txt", all.toString());
  }

  @Test
  void allFaultsOfAFileAreToldAtOnce() {
    String text =
        Larch.text()
            .replace("\"0.08 um/V\"", "\"0.08\"")
            .replace("\"-0.46 V\"", "\"0.46 V\"")
            .replace("\"1.62 V\"", "\"1.62 A\"");
    TechnologyException refused =
        assertThrows(TechnologyException.class, () -> Technology.parse(text, "t"));
    for (String part : List.of("channelLengthModulation", "wrong sign", "1.62 A")) {
      assertTrue(refused.getMessage().contains(part), refused::getMessage);
    }
  }

  @Test
  void theSchemaIsTheOneOfTheFormat() {
    Golden.assertMatches("technology/technology.schema.json", Technology.schema());
  }
}
