package pinchoff.source;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class TextLimitsTest {
  private final TextLimits limits = new TextLimits(5, 2);

  @Test
  void acceptsUpToTheLimitAndPointsBeyondIt() {
    assertTrue(limits.checkLength(SourceText.of("t", "12345")).isEmpty());
    Issue issue = limits.checkLength(SourceText.of("t", "1234567")).orElseThrow();
    assertEquals("text of 7 characters: expected at most 5", issue.message());
    assertEquals(5, issue.span().start().offset());
  }

  @Test
  void acceptsUpToTheDepth() {
    SourceSpan span = SourceText.of("t", "((").span(1, 2);
    assertTrue(limits.checkDepth(2, span).isEmpty());
    assertEquals(
        "nested more than 2 levels deep", limits.checkDepth(3, span).orElseThrow().message());
  }

  @Test
  void refusesLimitsThatAllowNothing() {
    assertThrows(IllegalArgumentException.class, () -> new TextLimits(0, 1));
    assertThrows(IllegalArgumentException.class, () -> new TextLimits(1, 0));
  }
}
