package pinchoff.display;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MimeBundleTest {

  @Test
  void keepsTheOrderOfItsForms() {
    MimeBundle bundle =
        MimeBundle.builder("plain").with(MimeBundle.HTML, "<b>x</b>").with("text/csv", "a").build();
    assertEquals(
        List.of(MimeBundle.TEXT, MimeBundle.HTML, "text/csv"), List.copyOf(bundle.data().keySet()));
    assertEquals("plain", bundle.plainText());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "text", "text/html; charset=utf-8", "a/b/c", "text/ html"})
  void refusesWhatIsNoMimeType(String type) {
    assertThrows(
        IllegalArgumentException.class, () -> MimeBundle.builder("").with(type, "content"));
  }

  @Test
  void aPictureKnowsItsSizeOnThePage() {
    MimeBundle bundle = MimeBundle.builder("p").withPng(new byte[] {1, 2, 3}, 640, 400).build();
    assertEquals("AQID", bundle.data().get(MimeBundle.PNG));
    assertEquals(Map.of("width", 640, "height", 400), bundle.metadata().get(MimeBundle.PNG));
  }

  @Test
  void treesAreCopiedAndCheckedForWhatJsonCannotSay() {
    List<Object> list = new ArrayList<>(List.of(1));
    MimeBundle bundle =
        MimeBundle.builder("").withJson("application/json", Map.of("list", list)).build();
    list.add(2);
    assertEquals(Map.of("list", List.of(1)), bundle.data().get("application/json"));
    for (Object bad : List.of(Double.NaN, Double.POSITIVE_INFINITY, new Object())) {
      var tree = Map.of("x", bad);
      assertThrows(
          IllegalArgumentException.class,
          () -> MimeBundle.builder("").withJson("application/json", tree));
    }
    assertThrows(
        IllegalArgumentException.class,
        () -> MimeBundle.builder("").withJson(MimeBundle.HTML, Map.of()));
  }

  @Test
  void refusesATreeThatIsTooDeep() {
    Map<String, Object> deep = new LinkedHashMap<>();
    for (int i = 0; i < 200; i++) {
      deep = Map.of("x", deep);
    }
    Map<String, Object> tree = deep;
    var thrown =
        assertThrows(
            IllegalArgumentException.class,
            () -> MimeBundle.builder("").withJson("application/json", tree));
    assertTrue(thrown.getMessage().contains("deeper"), thrown.getMessage());
  }
}
