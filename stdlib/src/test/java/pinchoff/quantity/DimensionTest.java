package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.testing.Gen;
import pinchoff.testing.Laws;

class DimensionTest {

  static Dimension any(Gen gen) {
    Dimension base =
        gen.pick(
            List.of(
                Dimension.LENGTH,
                Dimension.VOLTAGE,
                Dimension.CURRENT,
                Dimension.TIME,
                Dimension.CAPACITANCE,
                Dimension.TEMPERATURE,
                Dimension.ROOT_VOLTAGE,
                Dimension.VOLTAGE_NOISE,
                Dimension.MOBILITY));
    return base.pow(gen.between(-3, 3), gen.pick(List.of(1, 2, 3, 5)));
  }

  @Test
  void dimensionsFormAnAbelianGroup() {
    Laws<Dimension> laws = Laws.exact();
    Gen.check(
        "group",
        500,
        gen -> {
          Dimension a = any(gen);
          Dimension b = any(gen);
          Dimension c = any(gen);
          laws.commutes(Dimension::times, a, b);
          laws.associates(Dimension::times, a, b, c);
          laws.identity(Dimension::times, Dimension.NONE, a);
          laws.undoes(Dimension::times, Dimension::per, a, b);
          assertTrue(a.per(a).isNone());
          assertEquals(a.hashCode(), a.times(b).per(b).hashCode());
        });
  }

  @Test
  void powersAndRootsFollowTheExponents() {
    Gen.check(
        "powers",
        500,
        gen -> {
          Dimension a = any(gen);
          int n = gen.between(1, 3);
          int m = gen.between(1, 2);
          assertEquals(a.pow(n), a.pow(n, 1));
          assertEquals(a.pow(n).times(a.pow(m)), a.pow(n + m));
          assertEquals(a.pow(2).sqrt(), a);
          assertEquals(a.pow(n).pow(1, n), a);
          assertEquals(a.pow(-n), Dimension.NONE.per(a.pow(n)));
          assertEquals(a.pow(2, -2), a.pow(-1));
        });
  }

  @Test
  void equalDimensionsAreOneInstance() {
    assertSame(Dimension.VOLTAGE, Dimension.CURRENT.times(Dimension.RESISTANCE));
    assertSame(Dimension.TIME, Dimension.RESISTANCE.times(Dimension.CAPACITANCE));
  }

  @Test
  void differentDimensionsAreDifferentUpToTheAllowedEnds() {
    for (int[] parts : new int[][] {{34, 0}, {-34, 0}, {0, 34}, {0, -34}}) {
      Dimension end = Dimension.LENGTH.pow(parts[0]).times(Dimension.CURRENT.pow(parts[1]));
      assertEquals(parts[0] * Dimension.PARTS, end.parts()[0]);
      assertEquals(parts[1] * Dimension.PARTS, end.parts()[3]);
      assertEquals(0, end.parts()[1] + end.parts()[2] + end.parts()[4]);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"m^35", "m^-35", "kg^18", "s^69", "A^-35", "K^18"})
  void refusesExponentsBeyondTheEnds(String unit) {
    String base = unit.substring(0, unit.indexOf('^'));
    int exponent = Integer.parseInt(unit.substring(unit.indexOf('^') + 1));
    Dimension dimension = Unit.parse(base).dimension();
    var thrown = assertThrows(QuantityException.class, () -> dimension.pow(exponent));
    assertTrue(
        thrown.getMessage().contains("exponent " + exponent + " of " + base), thrown::getMessage);
  }

  @Test
  void aProductThatLeavesTheEndsIsRefusedAndNotMistakenForAnother() {
    Dimension end = Dimension.LENGTH.pow(34);
    assertThrows(QuantityException.class, () -> end.times(Dimension.LENGTH));
    assertThrows(QuantityException.class, () -> end.times(end));
    Dimension volts = Dimension.VOLTAGE.pow(17);
    assertThrows(QuantityException.class, () -> volts.times(Dimension.VOLTAGE));
    assertThrows(QuantityException.class, () -> Dimension.NONE.per(volts).per(volts));
  }

  @Test
  void refusesExponentsThatAreNoSixtieths() {
    var thrown = assertThrows(QuantityException.class, () -> Dimension.VOLTAGE.pow(1, 7));
    assertEquals(
        "V to the power 1/7: expected exponents that are multiples of 1/60", thrown.getMessage());
    assertThrows(QuantityException.class, () -> Dimension.VOLTAGE.pow(1, 0));
    assertThrows(QuantityException.class, () -> Dimension.VOLTAGE.pow(Integer.MAX_VALUE));
    assertThrows(QuantityException.class, () -> Dimension.VOLTAGE.pow(Integer.MIN_VALUE, -1));
  }

  @Test
  void moreDimensionsThanTheTableHoldsStayEqual() {
    Gen.check(
        "table",
        20,
        gen -> {
          for (int i = 0; i < 1000; i++) {
            Dimension a = Dimension.LENGTH.pow(gen.between(-600, 600), 60);
            Dimension b = Dimension.TIME.pow(gen.between(-600, 600), 60);
            Dimension product = a.times(b);
            assertEquals(product, b.times(a));
            assertEquals(a, product.per(b));
            assertEquals(product.hashCode(), b.times(a).hashCode());
          }
        });
  }

  @ParameterizedTest
  @CsvSource({
    "V/V, 1",
    "A/V^2, A/V^2",
    "S/V, A/V^2",
    "V^0.5, V^0.5",
    "1/V, 1/V",
    "V/Hz^0.5, V/Hz^0.5",
    "V*s^0.5, V/Hz^0.5",
    "cm^2/V/s, m^2/(V*s)",
    "fF/um^2, F/m^2",
    "mV*um, V*m",
    "1/cm^3, 1/m^3",
    "J/K, J/K",
    "V*A, W",
    "V*C, J",
    "1/s, Hz",
    "A^2/V^3, A^2/V^3",
    "A/V^1.3, A/V^1.3",
    "A^(1/3), A^(1/3)",
    "V/m^2, V/m^2",
    "W/Hz, J",
    "F/V, F/V",
    "A/Hz, C",
    "V^2/K, V^2/K"
  })
  void isShownAsTheTradeWritesIt(String unit, String shown) {
    Dimension dimension = Unit.parse(unit).dimension();
    assertEquals(shown, dimension.toString());
    assertEquals(dimension, Unit.parse(dimension.toString()).dimension());
  }

  @Test
  void everyTextReadsBack() {
    Gen.check(
        "dimension text",
        2000,
        gen -> {
          Dimension dimension = any(gen).times(any(gen)).times(any(gen));
          Unit unit = Unit.parse(dimension.toString());
          assertEquals(dimension, unit.dimension());
          assertEquals(1.0, unit.factor(), dimension::toString);
        });
  }

  @Test
  void hasANameForMessages() {
    assertEquals(Optional.of("voltage"), Dimension.VOLTAGE.name());
    assertEquals("a voltage (V)", Dimension.VOLTAGE.description());
    assertEquals("an energy (J)", Dimension.ENERGY.description());
    assertEquals("a pure number", Dimension.NONE.description());
    assertEquals("a quantity in A/V^3", Unit.parse("A/V^3").dimension().description());
    assertEquals(Optional.empty(), Unit.parse("A/V^3").dimension().name());
  }

  @Test
  void isNotEqualToOtherThings() {
    assertNotEquals(Dimension.VOLTAGE, Dimension.CURRENT);
    assertNotEquals(Dimension.VOLTAGE, (Object) "V");
  }
}
