package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.testing.ReferenceTable;

/** Sizes and dimensions of units and prefixes against the SI's own tables. */
class UnitReferenceTest {
  private static final String[] BASES = {"m", "kg", "s", "A", "K"};

  static Stream<ReferenceTable.Row> units() {
    return ReferenceTable.rows("units");
  }

  static Stream<ReferenceTable.Row> prefixes() {
    return ReferenceTable.rows("prefixes");
  }

  @ParameterizedTest
  @MethodSource("units")
  void unitHasItsSizeAndDimension(ReferenceTable.Row row) {
    Unit unit = Unit.parse(row.text("unit"));
    assertEquals(row.number("size"), unit.factor());
    int[] expected =
        Stream.of(BASES).mapToInt(base -> (int) (row.number(base) * Dimension.PARTS)).toArray();
    assertArrayEquals(expected, unit.dimension().parts());
  }

  @ParameterizedTest
  @MethodSource("prefixes")
  void prefixHasItsPower(ReferenceTable.Row row) {
    Prefix prefix =
        Stream.of(Prefix.values())
            .filter(p -> p.ascii().equals(row.text("prefix")))
            .findFirst()
            .orElseThrow();
    assertEquals((int) row.number("power"), prefix.power());
  }

  @Test
  void everyPrefixIsInTheTable() {
    long named = Prefix.values().length - 1L;
    assertEquals(named, prefixes().count());
  }
}
