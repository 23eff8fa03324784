package pinchoff.source;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import pinchoff.testing.Gen;

class IssueTest {

  @Test
  void showsNamePlaceLineAndCarets() {
    SourceText source = SourceText.of("mirror", "a = 1\nb = x_y*2");
    Issue issue =
        Issue.error(source.span(10, 13), "unknown name x_y").withSuggestion("did you mean x_z?");
    assertEquals(
        """
        mirror:2:5: error: unknown name x_y; did you mean x_z?
          b = x_y*2
              ^^^\
        """,
        issue.render(source));
  }

  @Test
  void aCaretStandsUnderTheRightCharacterAfterTabsAndPairs() {
    SourceText source = SourceText.of("t", "\t\uD835\uDC49 = ?");
    assertEquals(
        "t:1:6: warning: odd\n   \uD835\uDC49 = ?\n       ^",
        Issue.warning(source.span(6, 7), "odd").render(source));
  }

  @Test
  void marksTheEndOfTheTextAndSpansOverLines() {
    SourceText source = SourceText.of("t", "ab\ncd");
    assertEquals(
        "t:2:3: error: x\n  cd\n    ^", Issue.error(source.span(5, 5), "x").render(source));
    assertEquals("t:1:2: error: x\n  ab\n   ^", Issue.error(source.span(1, 4), "x").render(source));
    SourceText empty = SourceText.of("t", "");
    assertEquals("t:1:1: error: x\n  \n  ^", Issue.error(empty.span(0, 0), "x").render(empty));
  }

  @Test
  void aLineOfAMegabyteIsShownAsAWindow() {
    SourceText source = SourceText.of("t", "x".repeat(500_000) + "?" + "y".repeat(500_000));
    String shown = Issue.error(source.span(500_000, 500_001), "odd").render(source);
    String[] lines = shown.split("\n");
    assertTrue(lines[1].length() < 120, lines[1]);
    assertEquals('?', lines[1].charAt(lines[2].indexOf('^')));
    assertTrue(lines[1].startsWith("  …") && lines[1].endsWith("…"), lines[1]);
  }

  @Test
  void hostileTextIsMadeHarmless() {
    String hostile = "\u001B[2J\u0007\u202Eevil\u200B\uD800\u2028\u0000";
    SourceText source = SourceText.of(hostile, hostile);
    String shown = Issue.error(source.span(3, 4), hostile).withSuggestion(hostile).render(source);
    assertHarmless(shown);
    assertTrue(shown.contains("evil"), shown);
  }

  @Test
  void anyTextIsMadeHarmless() {
    Gen.check(
        "harmless",
        300,
        gen -> {
          SourceText source = SourceText.of(gen.anyText(20), gen.anyText(300));
          int start = gen.between(0, source.text().length());
          int end = gen.between(start, source.text().length());
          assertHarmless(Issue.error(source.span(start, end), gen.anyText(50)).render(source));
          assertHarmless(Excerpt.quote(source.text()));
        });
  }

  private static void assertHarmless(String shown) {
    shown
        .codePoints()
        .filter(c -> c != '\n')
        .forEach(
            c -> {
              int type = Character.getType(c);
              assertFalse(
                  type == Character.CONTROL
                      || type == Character.FORMAT
                      || type == Character.SURROGATE
                      || type == Character.LINE_SEPARATOR,
                  () -> "U+" + Integer.toHexString(c) + " in " + shown);
            });
    assertTrue(shown.length() < 5000, () -> "length " + shown.length());
    assertTrue(shown.lines().count() <= 3, shown);
  }

  @Test
  void issuesAreShownInTheOrderOfTheirPlaces() {
    SourceText source = SourceText.of("t", "abc");
    Issue late = Issue.error(source.span(2, 3), "late");
    Issue early = Issue.error(source.span(0, 1), "early");
    assertEquals(
        early.render(source) + "\n\n" + late.render(source),
        Issue.renderAll(List.of(late, early), source));
  }

  @Test
  void quotesAreCut() {
    assertEquals("\"abc…\"", Excerpt.quote("abcdef", 3));
    assertEquals("\"abc\"", Excerpt.quote("abc", 3));
    assertEquals("\uD835\uDC49…", Excerpt.clip("\uD835\uDC49\uD835\uDC49", 1));
  }
}
