package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.testing.Gen;

class DecimalTest {

  @ParameterizedTest
  @CsvSource({
    "0.1, 0.1",
    "0.18, 0.18",
    "1e23, 1e23",
    "2e-3, 2e-3",
    "123456789012345678, 123456789012345680",
    "4.9e-324, 4.94065645841247e-324",
    "1.7976931348623157e308, 1.7976931348623157e308",
    "-0.3, -0.3",
    "0, 0"
  })
  void isTheDecimalThatWasMeant(double value, BigDecimal meant) {
    assertEquals(0, meant.compareTo(Decimal.of(value)), () -> Decimal.of(value).toString());
  }

  @Test
  void everyDoubleReadsBackFromAtMost17Digits() {
    Gen.check(
        "shortest",
        5000,
        gen -> {
          double value = gen.anyFinite();
          BigDecimal decimal = Decimal.of(value);
          assertEquals(value, decimal.doubleValue());
          assertTrue(decimal.precision() <= 17, decimal::toString);
        });
  }

  /** The fast way must agree with exact decimal arithmetic, rounded once. */
  @Test
  void scalingIsThatOfTheDecimalRoundedOnce() {
    Gen.check(
        "scale",
        20_000,
        gen -> {
          double value =
              gen.chance(0.5) ? gen.decimal(gen.between(1, 17), -12, 12) : gen.signed(-20, 20);
          int power = gen.between(-30, 30);
          double exact = Decimal.of(value).scaleByPowerOfTen(power).doubleValue();
          assertEquals(exact, Decimal.scale(value, power), () -> value + " e" + power);
        });
  }

  @ParameterizedTest
  @ValueSource(
      doubles = {
        9007199254740991.0,
        9007199254740994.0,
        1e15,
        1e16,
        1e22,
        3e23,
        Double.MIN_VALUE,
        1e-310,
        1.5e300
      })
  void scalingAtTheEndsOfTheFastWay(double value) {
    for (int power = -25; power <= 8; power++) {
      assertEquals(
          Decimal.of(value).scaleByPowerOfTen(power).doubleValue(), Decimal.scale(value, power));
    }
  }

  @ParameterizedTest
  @CsvSource({
    "0.002, 0.002",
    "1e21, 1e21",
    "0.1, 0.1",
    "1234567, 1.234567e6",
    "NaN, NaN",
    "Infinity, Infinity"
  })
  void textIsTheShortest(double value, String text) {
    assertEquals(text, Decimal.text(value));
  }
}
