package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;
import pinchoff.testing.Close;
import pinchoff.testing.Gen;
import pinchoff.testing.Laws;

class QuantityLawTest {
  private static final int RUNS = 2000;

  private final Laws<Quantity> exact = Laws.exact();
  private final Laws<Quantity> near =
      new Laws<>(
          (a, b) -> a.dimension().equals(b.dimension()) && Close.relative(a.si(), b.si(), 1e-12));

  private static Quantity any(Gen gen) {
    return Quantity.ofSi(gen.signed(-18, 9), DimensionTest.any(gen));
  }

  private static Quantity positive(Gen gen, Dimension dimension) {
    return Quantity.ofSi(gen.magnitude(-9, 9), dimension);
  }

  @Test
  void sumsAreThoseOfNumbers() {
    Gen.check(
        "sums",
        RUNS,
        gen -> {
          Dimension dimension = DimensionTest.any(gen);
          Quantity a = positive(gen, dimension);
          Quantity b = positive(gen, dimension);
          Quantity c = positive(gen, dimension);
          Quantity zero = Quantity.ofSi(0, dimension);
          exact.commutes(Quantity::plus, a, b);
          near.associates(Quantity::plus, a, b, c);
          exact.identity(Quantity::plus, zero, a);
          assertEquals(a.minus(b), a.plus(b.negate()));
          assertEquals(zero, a.minus(a));
          exact.involution(Quantity::negate, a);
          exact.idempotent(Quantity::abs, a.negate());
          near.distributes(Quantity::times, Quantity::plus, any(gen), b, c);
        });
  }

  @Test
  void productsAreThoseOfNumbersAndDimensions() {
    Gen.check(
        "products",
        RUNS,
        gen -> {
          Quantity a = any(gen);
          Quantity b = any(gen);
          Quantity c = any(gen);
          exact.commutes(Quantity::times, a, b);
          near.associates(Quantity::times, a, b, c);
          exact.identity(Quantity::times, Units.ratio(1), a);
          near.undoes(Quantity::times, Quantity::per, a, b);
          assertEquals(a.si() * b.si(), a.times(b).si());
          assertEquals(a.dimension().times(b.dimension()), a.times(b).dimension());
          assertEquals(1.0, a.per(a).ratio());
          double factor = gen.signed(-3, 3);
          assertEquals(a.times(Units.ratio(factor)), a.times(factor));
          assertEquals(a.per(Units.ratio(factor)), a.per(factor));
        });
  }

  @Test
  void powersAreRepeatedProducts() {
    Gen.check(
        "powers",
        RUNS,
        gen -> {
          Quantity a =
              positive(
                  gen,
                  gen.pick(
                      List.of(
                          Dimension.VOLTAGE,
                          Dimension.ROOT_VOLTAGE,
                          Dimension.CAPACITANCE,
                          Dimension.TRANSCONDUCTANCE_PARAMETER)));
          assertEquals(a, a.pow(1));
          assertEquals(a.times(a), a.pow(2));
          near.involution(q -> q.pow(-1), a);
          assertTrue(near.same().test(a.times(a).times(a), a.pow(3)));
          assertTrue(near.same().test(a, a.pow(2).sqrt()));
          assertTrue(near.same().test(a, a.sqrt().pow(2)));
          assertTrue(near.same().test(a.pow(3, 2), a.times(a.sqrt())));
          assertTrue(near.same().test(a.pow(-1, 2), a.sqrt().pow(-1)));
          assertEquals(a.sqrt(), a.pow(2, 4));
          assertEquals(Units.ratio(1), a.pow(0));
        });
  }

  @Test
  void orderAgreesWithTheValuesAndWithEquality() {
    Gen.check(
        "order",
        RUNS,
        gen -> {
          Dimension dimension = DimensionTest.any(gen);
          Quantity a = Quantity.ofSi(gen.between(-3, 3), dimension);
          Quantity b = Quantity.ofSi(gen.between(-3, 3), dimension);
          assertEquals(Double.compare(a.si(), b.si()), a.compareTo(b));
          assertEquals(a.equals(b), a.compareTo(b) == 0);
          assertEquals(a.min(b), b.min(a));
          assertEquals(a.plus(b), a.min(b).plus(a.max(b)));
        });
  }

  @Test
  void differentDimensionsNeverAddNorCompareNorConvert() {
    Gen.check(
        "mismatch",
        RUNS,
        gen -> {
          Quantity a = any(gen);
          Quantity b = any(gen);
          if (a.dimension().equals(b.dimension())) {
            return;
          }
          assertThrows(QuantityException.class, () -> a.plus(b));
          assertThrows(QuantityException.class, () -> a.minus(b));
          assertThrows(QuantityException.class, () -> a.compareTo(b));
          assertThrows(QuantityException.class, () -> a.in(b.dimension().toString()));
          var thrown =
              assertThrows(QuantityException.class, () -> a.requireDimension("x", b.dimension()));
          assertTrue(thrown.getMessage().contains(a.toString()), thrown::getMessage);
        });
  }

  @Test
  void noResultIsEverNanOrInfinite() {
    Gen.check(
        "finite",
        RUNS,
        gen -> {
          Quantity a = Quantity.ofSi(gen.anyFinite(), Dimension.VOLTAGE);
          Quantity b = Quantity.ofSi(gen.chance(0.1) ? 0 : gen.anyFinite(), Dimension.VOLTAGE);
          assertFinite(() -> a.plus(b));
          assertFinite(() -> a.minus(b));
          assertFinite(() -> a.times(b));
          assertFinite(() -> a.per(b));
          assertFinite(() -> a.times(b.si()));
          assertFinite(() -> a.per(b.si()));
          assertFinite(() -> a.pow(gen.between(-4, 4)));
          assertFinite(() -> a.sqrt());
          assertFinite(() -> a.pow(gen.between(-4, 4), 3));
        });
  }

  private static void assertFinite(Supplier<Quantity> operation) {
    try {
      Quantity result = operation.get();
      assertTrue(Double.isFinite(result.si()), result::toString);
    } catch (QuantityException refused) {
      assertTrue(refused.getMessage().contains("V"), refused::getMessage);
    }
  }

  @Test
  void asciiTextReadsBackToTheBit() {
    Gen.check(
        "ascii text",
        5000,
        gen -> {
          Quantity quantity =
              Quantity.ofSi(
                  gen.chance(0.3) ? gen.anyFinite() : gen.signed(-20, 12), DimensionTest.any(gen));
          String text = quantity.asciiText();
          assertEquals(quantity, Quantity.parse(text), text);
          assertTrue(text.chars().allMatch(c -> c < 128), text);
          assertEquals(quantity.dimension(), Quantity.parse(quantity.toString()).dimension());
        });
  }

  @Test
  void asciiTextInAnyUnitReadsBackToTheBit() {
    Gen.check(
        "ascii text in a unit",
        3000,
        gen -> {
          UnitFactor factor = gen.pick(List.copyOf(UnitSymbols.all().values()));
          Unit unit = Unit.parse(factor.ascii());
          Quantity quantity = Quantity.ofSi(gen.signed(-15, 6), unit.dimension()).to(unit);
          assertEquals(quantity, Quantity.parse(quantity.asciiText()), quantity::asciiText);
        });
  }
}
