package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.testing.Close;
import pinchoff.testing.Gen;

/** What must hold for every unit with every prefix in every spelling. */
class UnitLawTest {

  /** Every accepted symbol. */
  static Stream<String> symbols() {
    return UnitSymbols.all().keySet().stream();
  }

  @Test
  void thereAreAsManySymbolsAsTheTablesSay() {
    long expected =
        Stream.of(NamedUnit.values())
            .mapToLong(
                unit ->
                    Stream.of(Prefix.values())
                            .filter(unit::takes)
                            .mapToLong(prefix -> prefix.spellings().size())
                            .sum()
                        * unit.spellings().size())
            .sum();
    assertEquals(expected, symbols().count());
    assertTrue(expected > 150, () -> "only " + expected);
  }

  @ParameterizedTest
  @MethodSource("symbols")
  void symbolReadsAsItsUnitAndPrefix(String symbol) {
    UnitFactor factor = UnitSymbols.all().get(symbol);
    Unit unit = Unit.parse(symbol);
    assertEquals(List.of(factor), unit.factors());
    BigDecimal size = factor.unit().size().scaleByPowerOfTen(factor.prefix().power());
    assertEquals(size.doubleValue(), unit.factor());
    assertEquals(factor.unit().dimension(), unit.dimension());
    assertEquals(unit, Unit.parse(unit.ascii()));
    assertEquals(unit, Unit.parse(unit.symbol()));
    assertTrue(unit.ascii().chars().allMatch(c -> c < 128), unit::ascii);
  }

  @ParameterizedTest
  @MethodSource("symbols")
  void compoundsWithItReadBack(String symbol) {
    for (String pattern :
        List.of("%s^2", "1/%s", "√%s", "%s/V^2", "m*V/%s", "V/√%s", "%s*T_", "(%s)^-3")) {
      Unit unit = Unit.parse(String.format(pattern, symbol).replace("T_", "Hz"));
      assertEquals(unit, Unit.parse(unit.ascii()));
      assertEquals(unit, Unit.parse(unit.symbol()));
      Close.assertRelative(Unit.parse(unit.ascii()).factor(), unit.factor(), 0, unit.ascii());
    }
  }

  @ParameterizedTest
  @MethodSource("symbols")
  void quantitiesInItRoundTrip(String symbol) {
    for (String number : List.of("1", "650", "0.18", "-3.3", "999.96", "1.23456789012345e-5")) {
      Quantity quantity = Quantity.parse(number + " " + symbol);
      double value = Double.parseDouble(number);
      assertEquals(quantity, Quantity.of(value, Unit.parse(symbol)));
      int ulps = Unit.parse(symbol).isDecimal() ? 0 : 1;
      Close.assertUlps(value, quantity.in(symbol), ulps, number + " " + symbol);
      assertEquals(quantity, Quantity.parse(quantity.asciiText()));
      assertEquals(quantity, Quantity.parse(quantity.to(symbol).asciiText()));
      assertEquals(
          quantity.to(symbol).toString(),
          Quantity.parse(number + " " + symbol).to(symbol).toString());
    }
  }

  @Test
  void everyOtherPrefixIsRefusedWithAReason() {
    Map<String, UnitFactor> known = UnitSymbols.all();
    for (NamedUnit unit : NamedUnit.values()) {
      for (Prefix prefix : Prefix.values()) {
        String symbol = prefix.ascii() + unit.ascii();
        if (unit.takes(prefix)) {
          continue;
        }
        assertFalse(known.containsKey(symbol), () -> symbol + " is " + known.get(symbol));
        var thrown = assertThrows(QuantityException.class, () -> Unit.parse(symbol));
        assertTrue(thrown.getMessage().contains("does not take the prefix"), thrown::getMessage);
      }
    }
  }

  @Test
  void oneValueWithDifferentPrefixesIsTheSameToTheBit() {
    Gen.check(
        "same bits",
        3000,
        gen -> {
          NamedUnit unit = gen.pick(List.of(NamedUnit.values()));
          List<Prefix> prefixes = Stream.of(Prefix.values()).filter(unit::takes).toList();
          Prefix first = gen.pick(prefixes);
          Prefix second = gen.pick(prefixes);
          double value = gen.decimal(gen.between(1, 14), -6, 6);
          Quantity one = Quantity.of(value, Unit.parse(first.ascii() + unit.ascii()));
          BigDecimal moved = Decimal.of(value).scaleByPowerOfTen(first.power() - second.power());
          Unit other = Unit.parse(second.ascii() + unit.ascii());
          assertEquals(
              one, Quantity.of(moved.doubleValue(), other), () -> value + " " + first + unit);
          assertEquals(one, Quantity.parse(moved.toPlainString() + " " + other.ascii()));
          Close.assertUlps(
              moved.doubleValue(), one.in(other), other.isDecimal() ? 0 : 1, other.ascii());
        });
  }
}
