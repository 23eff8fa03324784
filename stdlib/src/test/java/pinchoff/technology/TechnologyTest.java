package pinchoff.technology;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.degC;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.quantity;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import pinchoff.device.Device;
import pinchoff.device.DeviceParameters;
import pinchoff.device.Polarity;
import pinchoff.display.MimeBundle;

class TechnologyTest {
  private final Technology larch = Larch.technology();

  @Test
  void everythingStatedIsThere() {
    assertEquals("larch180", larch.name());
    assertEquals(degC(27), larch.nominalTemperature());
    assertEquals(V(1.98), larch.rail("core").maximum().orElseThrow());
    assertEquals(
        List.of("core-n", "core-p", "low-n", "depletion-n", "thick-n", "thick-p"),
        larch.devices().stream().map(Device::name).toList());
    DeviceParameters n = larch.device("core-n").parameters();
    assertEquals(Polarity.N, n.polarity());
    assertEquals(V(0.45), n.zeroBiasThreshold());
    assertEquals(quantity("290 uA/V^2"), n.processTransconductance());
    assertEquals(quantity("0.44 V^0.5"), n.bodyFactor());
    assertEquals(quantity("0.08 um/V"), n.channelLengthModulation());
    assertEquals("saturation", n.thresholdFrom().orElseThrow().region());
    assertEquals(V(-0.46), larch.device("core-p").parameters().zeroBiasThreshold());
    assertEquals(quantity("1 kohm"), larch.resistor("poly-high").sheetResistance());
    assertEquals(quantity("1 fF/um^2"), larch.capacitor("plate").density());
    assertEquals(Optional.of(larch.contentHash()), larch.device("core-n").source().contentHash());
  }

  /**
   * C_ox = ε_ox/t_ox, k' = μ C_ox, γ and 2φ_F from doping: the file's own cautions compare them.
   */
  @Test
  void theDemoProcessAgreesWithItself() {
    assertEquals(List.of(), larch.cautions());
  }

  @Test
  void disagreementIsACaution() {
    Technology odd =
        larch.with(
            "devices.core-n.squareLaw.processTransconductance", quantity("400 uA/V^2"), "guess");
    assertTrue(
        odd.cautions().stream().anyMatch(c -> c.startsWith("core-n: k′ = 400 µA/V²")),
        () -> odd.cautions().toString());
  }

  @Test
  void cornersMoveThresholdsAndTransconductance() {
    DeviceParameters slow = larch.device("core-n", Corner.SLOW).parameters();
    DeviceParameters fast = larch.device("core-p", Corner.FAST).parameters();
    assertEquals(mV(490), slow.zeroBiasThreshold());
    assertEquals(quantity("290 uA/V^2").times(0.88), slow.processTransconductance());
    assertEquals("-415 mV", fast.zeroBiasThreshold().toString());
  }

  @Test
  void anUnknownNameIsRefusedWithTheNearest() {
    assertEquals(
        "technology larch180 has no device \"core_n\": did you mean core-n?",
        assertThrows(TechnologyException.class, () -> larch.device("core_n")).getMessage());
    assertEquals(
        "technology larch180 has no rail \"analog\": expected core, io",
        assertThrows(TechnologyException.class, () -> larch.rail("analog")).getMessage());
  }

  @Test
  void writingAndReadingGivesTheSame(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("copy.tech.json");
    larch.write(file);
    Technology again = Technology.read(file);
    assertEquals(larch, again);
    assertEquals(larch.contentHash(), again.contentHash());
    assertEquals(larch.text(), again.text());
    try (var left = Files.list(folder)) {
      assertEquals(List.of(file), left.toList(), "a temporary file is left");
    }
  }

  @Test
  void theHashIgnoresLayoutAndSpelling() {
    String text = Larch.text();
    Technology compact = Technology.parse(text.replaceAll("\\n\\s*", " "), "x");
    Technology spelled = Technology.parse(text.replace("\"0.08 um/V\"", "\"80 nm/V\""), "x");
    assertEquals(larch.contentHash(), compact.contentHash());
    assertEquals(larch.contentHash(), spelled.contentHash());
  }

  @Test
  void theHashChangesWithEveryValue() {
    String text = Larch.text();
    for (Map.Entry<String, String> change :
        Map.of(
                "\"0.08 um/V\"", "\"0.081 um/V\"",
                "\"1 kohm\"", "\"1.000001 kohm\"",
                "invented, typical of the class", "measured",
                "\"27 degC\"", "\"26 degC\"",
                "core device", "core")
            .entrySet()) {
      assertTrue(text.contains(change.getKey()), change.getKey());
      Technology changed = Technology.parse(text.replace(change.getKey(), change.getValue()), "x");
      assertNotEquals(larch.contentHash(), changed.contentHash(), change.getKey());
    }
  }

  @Test
  void comparisonListsWhatDiffers() {
    Technology other =
        larch.with("devices.core-n.squareLaw.zeroBiasThreshold", V(0.468), "new extraction");
    String text = larch.compare(other).display().plainText();
    assertTrue(text.contains("450 mV"), text);
    assertTrue(text.contains("468 mV"), text);
    assertTrue(text.contains("4 %"), text);
    assertEquals(0, larch.compare(larch).differences().size());
  }

  @Test
  void showsItselfWithoutLosingAValue() {
    MimeBundle bundle = larch.display();
    for (String shown : List.of("290", "µA/V²", "−460", "V_TH0", "poly-high", "larch180")) {
      String text = bundle.plainText().replace('-', '−');
      assertTrue(text.contains(shown.replace('-', '−')), shown + " in " + text);
    }
    assertTrue(bundle.textOf(MimeBundle.HTML).orElseThrow().contains("<table"), "no table");
  }

  @Test
  void aFileThatCannotBeReadIsOneSentence(@TempDir Path folder) throws IOException {
    Files.writeString(folder.resolve("larch180.tech.json"), "{}");
    String missing = refusal(folder.resolve("larch18.tech.json"));
    assertTrue(
        missing.endsWith("there is no such file; did you mean larch180.tech.json?"), missing);
    assertTrue(refusal(folder).contains("this is a directory"), "directory");
    Path latin = folder.resolve("latin.tech.json");
    Files.write(latin, "{\"name\": \"Lärche\"}".getBytes(StandardCharsets.ISO_8859_1));
    assertTrue(refusal(latin).contains("is not UTF-8"), refusal(latin));
    assertTrue(
        assertThrows(TechnologyException.class, () -> Technology.read(" "))
            .getMessage()
            .contains("expected the path of a file"));
  }

  private static String refusal(Path path) {
    return assertThrows(TechnologyException.class, () -> Technology.read(path)).getMessage();
  }
}
