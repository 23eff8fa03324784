package pinchoff.source;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import pinchoff.testing.Gen;

class SourceTextTest {

  @ParameterizedTest
  @CsvSource({
    "0, 1, 1", "1, 1, 2", "2, 1, 3", "3, 2, 1", "4, 2, 2", "6, 3, 1", "8, 4, 1", "9, 4, 2"
  })
  void linesEndWithEitherOrBothCharacters(int offset, int line, int column) {
    SourceText source = SourceText.of("t", "ab\nc\r\nd\re");
    assertEquals(new Position(offset, line, column), source.position(offset));
  }

  @Test
  void givesLinesWithoutTheirEnds() {
    SourceText source = SourceText.of("t", "ab\nc\r\n\re");
    assertEquals(4, source.lines());
    assertEquals("ab", source.line(1));
    assertEquals("c", source.line(2));
    assertEquals("", source.line(3));
    assertEquals("e", source.line(4));
    assertEquals("", SourceText.of("t", "").line(1));
    assertThrows(IndexOutOfBoundsException.class, () -> source.line(5));
  }

  @Test
  void columnsCountCodePoints() {
    SourceText source = SourceText.of("t", "\uD835\uDC49x");
    assertEquals(2, source.position(2).column());
    assertEquals(3, source.position(3).column());
  }

  @Test
  void refusesPlacesOutsideTheText() {
    SourceText source = SourceText.of("t", "ab");
    assertThrows(IndexOutOfBoundsException.class, () -> source.position(3));
    assertThrows(IndexOutOfBoundsException.class, () -> source.position(-1));
    assertThrows(IllegalArgumentException.class, () -> source.span(2, 1));
    assertThrows(IllegalArgumentException.class, () -> new Position(0, 0, 1));
  }

  @Test
  void everyOffsetOfAnyTextHasAPlaceThatLeadsBack() {
    Gen.check(
        "offset to place",
        200,
        gen -> {
          SourceText source = SourceText.of("t", gen.text("ab\n\r\uD835\uDC49é", 40));
          for (int offset = 0; offset < source.text().length(); offset++) {
            Position place = source.position(offset);
            String line = source.line(place.line());
            assertTrue(place.column() <= line.length() + 2, place::toString);
            if (place.column() <= line.codePointCount(0, line.length())) {
              int index = line.offsetByCodePoints(0, place.column() - 1);
              assertEquals(line.codePointAt(index), codePointAround(source.text(), offset));
            }
          }
        });
  }

  /** The code point that the offset is in: between the halves of a pair, a column ends late. */
  private static int codePointAround(String text, int offset) {
    boolean inside =
        offset > 0
            && Character.isLowSurrogate(text.charAt(offset))
            && Character.isHighSurrogate(text.charAt(offset - 1));
    return inside ? text.codePointAt(offset + 1) : text.codePointAt(offset);
  }
}
