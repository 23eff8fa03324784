package pinchoff.technology;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.display.MimeBundle;
import pinchoff.testing.Gen;

/** Text from outside that means harm, or was damaged. */
class TechnologyHostileTest {

  static Stream<Arguments> texts() {
    return Stream.of(
        Arguments.of("nothing", ""),
        Arguments.of("blank", " \n "),
        Arguments.of("not an object", "[1, 2]"),
        Arguments.of("deep", "{\"a\":".repeat(100_000)),
        Arguments.of("deep arrays", "[".repeat(100_000)),
        Arguments.of("long number", "{\"format\": " + "9".repeat(1_000_000) + "}"),
        Arguments.of("long text", "{\"name\": \"" + "x".repeat(1_000_000) + "\"}"),
        Arguments.of("long key", "{\"" + "x".repeat(1_000_000) + "\": 1}"),
        Arguments.of("lone surrogate", "{\"name\": \"\\ud800\"}"),
        Arguments.of("lone surrogate as is", "{\"name\": \"\ud800\"}"),
        Arguments.of("byte order mark", "\ufeff{}"),
        Arguments.of("NaN", "{\"nominalTemperature\": NaN}"),
        Arguments.of("too large", " ".repeat(5_000_000)),
        Arguments.of("rest after the end", "{} {}"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("texts")
  void isRefusedWithAShortMessage(String name, String text) {
    TechnologyException refused =
        assertThrows(TechnologyException.class, () -> Technology.parse(text, "hostile"));
    assertTrue(refused.getMessage().length() < 20_000, () -> name + ": a message too long");
  }

  @Test
  void markupInNamesIsShownAsText() {
    String evil = "<script>alert(1)</script> =HYPERLINK(1)";
    Technology shown =
        Technology.parse(
            Larch.text().replace("unsilicided p poly", evil).replace("core device", evil), evil);
    String html = shown.display().textOf(MimeBundle.HTML).orElseThrow();
    assertFalse(html.contains("<script"), html);
    assertTrue(html.contains("&lt;script&gt;"), html);
  }

  @Test
  void damageIsAlwaysATechnologyException() {
    String whole = Larch.text();
    Gen.check(
        "damaged file",
        300,
        gen -> {
          StringBuilder text = new StringBuilder(whole);
          for (int i = gen.between(1, 4); i > 0; i--) {
            int at = gen.between(0, text.length() - 2);
            if (gen.chance(0.4)) {
              text.deleteCharAt(at);
            } else if (gen.chance(0.5)) {
              text.setCharAt(at, "{}[]\":,\\x0-\u0000".charAt(gen.between(0, 11)));
            } else {
              text.delete(at, Math.min(text.length(), at + gen.between(1, 400)));
            }
          }
          try {
            Technology.parse(text.toString(), "damaged").display();
          } catch (TechnologyException refused) {
            assertFalse(refused.getMessage().isBlank());
          }
        });
  }
}
