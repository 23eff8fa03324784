package pinchoff.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;

class ProgressTest {
  private final List<String> shown = new ArrayList<>();
  private final List<String> ids = new ArrayList<>();
  private long now;

  private final Host host =
      new Host() {
        @Override
        public void publish(MimeBundle bundle) {
          throw new AssertionError("a progress has an id");
        }

        @Override
        public void publish(String displayId, MimeBundle bundle) {
          ids.add(displayId);
          shown.add(bundle.plainText());
        }

        @Override
        public void update(String displayId, MimeBundle bundle) {
          assertEquals(ids.get(0), displayId);
          shown.add(bundle.plainText());
        }
      };

  private Progress progress(String name, long total) {
    return Progress.of(name, total, host, () -> now);
  }

  @Test
  void updatesOneDisplayAtMostTenTimesASecond() {
    try (Progress p = progress("corners", 1000)) {
      for (int i = 0; i < 1000; i++) {
        now += 1_000_000;
        p.step();
      }
    }
    assertEquals(1, ids.size());
    assertTrue(shown.size() <= 12, () -> shown.size() + " updates in one second");
    assertTrue(shown.size() >= 10, () -> shown.size() + " updates in one second");
  }

  @Test
  void saysTheTimeThatIsLeftWhileItRunsAndNoTimeInTheEnd() {
    try (Progress p = progress("corners", 40)) {
      now += 10_000_000_000L;
      p.step(10);
      assertEquals("corners: 10 of 40 (25 %), 30 s left", shown.get(shown.size() - 1));
      now += 1_000_000_000L;
      p.step(30);
    }
    assertEquals("corners: 40 of 40 (100 %)", shown.get(shown.size() - 1));
  }

  @Test
  void aPartHasALineOfItsOwnWhileItRuns() {
    try (Progress all = progress("corners", 2)) {
      try (Progress part = all.part("slow", 10)) {
        now += 200_000_000;
        part.step(5);
        assertTrue(shown.get(shown.size() - 1).startsWith("corners: 0 of 2 (0 %)\nslow: 5 of 10"));
      }
      assertFalse(shown.get(shown.size() - 1).contains("slow"));
    }
    assertEquals(1, ids.size());
  }

  @Test
  void aCancelledCalculationStaysAtWhatWasDone() {
    Progress p = progress("samples", 100);
    now += 1_000_000_000;
    p.step(12);
    p.close();
    assertEquals("samples: 12 of 100 (12 %)", shown.get(shown.size() - 1));
  }

  @Test
  void aNameIsShownHarmlessly() {
    List<String> html = new ArrayList<>();
    Host looking =
        new Host() {
          @Override
          public void publish(MimeBundle bundle) {
            html.add(bundle.textOf(MimeBundle.HTML).orElseThrow());
          }
        };
    Progress.of("<script>alert(1)</script>", 3, looking, () -> 0).close();
    assertFalse(html.get(0).contains("<script"), html.get(0));
  }

  @Test
  void refusesNoStepsAndNegativeOnes() {
    assertThrows(IllegalArgumentException.class, () -> Progress.of("x", 0));
    try (Progress p = progress("x", 3)) {
      assertThrows(IllegalArgumentException.class, () -> p.step(-1));
    }
  }
}
