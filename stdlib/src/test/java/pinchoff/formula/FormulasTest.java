package pinchoff.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.quantity.Quantity;
import pinchoff.testing.Gen;

class FormulasTest {

  private static Expression expression(String text) {
    Formulas formulas = Formulas.read("test", "x = " + text);
    assertEquals(List.of(), formulas.issues(), text);
    return ((Statement.Definition) formulas.statements().get(0)).value();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "a + b*c^2|a + b * c^2",
        "(a + b)*c|(a + b) * c",
        "a - (b - c)|a - (b - c)",
        "a/b/c|a / b / c",
        "a/(b*c)|a / (b * c)",
        "-a^2|-a^2",
        "(-a)^2|(-a)^2",
        "a^b^c|a^b^c",
        "(a^b)^c|(a^b)^c",
        "2^-1|2^-1",
        "- -a|--a",
        "a·b − c|a * b - c",
        "sqrt(2*I/(k*W/L))|sqrt(2 * I / (k * W / L))",
        "par(R_1, R_2)|par(R_1, R_2)",
        "max(a, min(b, c))|max(a, min(b, c))",
        "50 mV|50 mV",
        "50mV|50 mV",
        "387 uA/V^2|387 uA/V^2",
        "1 V / R_1|1 V / R_1",
        "1 V/V_X|1 V / V_X",
        "1e-3|1e-3",
        ".5|.5",
        "k'_n*λ|k'_n * λ"
      })
  void isWrittenWithNoMoreParenthesesThanNeeded(String text, String written) {
    Expression read = expression(text);
    assertEquals(written, read.text());
    assertEquals(written, expression(written).text());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "387 uA/V^2|0.000387 A/V^2",
        "5 nV/Hz^0.5|5e-9 V/Hz^0.5",
        "2 kΩ|2000 ohm",
        "3 µm|3e-6 m",
        "10 %|0.1",
        "1 V/V|1"
      })
  void aUnitBelongsToItsNumber(String text, String quantity) {
    Expression.Amount amount = (Expression.Amount) expression(text);
    assertEquals(Quantity.parse(quantity), amount.value());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "x =|1:4|the line ends here: expected a name, a number or (",
        "x = a b|1:5|nothing stands between two factors: expected * between them",
        "x = 3 V_OV|1:5|nothing stands between two factors: expected * between them, or a known unit after the number",
        "x = 2(a)|1:5|nothing stands between two factors: expected * between them",
        "x = (a + b|1:11|the line ends here: expected an operator or )",
        "x = a + * b|1:9|found \"*\": expected a name, a number or (",
        "x = sqrt(a, b)|1:5|sqrt of 2 arguments: expected 1",
        "x = sqr(a)|1:5|there is no function sqr: did you mean sqrt?; a product needs a *",
        "x = 1.2.3|1:5|a number with two decimal points",
        "x == a|1:3|a single = defines a name",
        "a + b = c|1:7|left of = stands a single name: write \"X such that … = …\" to solve an equation for X",
        "x = a = b|1:7|a second = in one line: write one definition to a line, or \"x such that … = …\" to solve for it",
        "x|1:2|the line ends here: expected = after a name, or a comparison: >= <= > <",
        "x such a = b|1:8|found \"a\": expected \"that\" after \"such\"",
        "x [kohm = a|1:12|the line ends here: expected ] after the unit",
        "x = a ? b|1:7|found \"?\": expected an operator or the end of the line",
        "x = 27 degC|1:8|"
      })
  void aFaultHasItsPlace(String text, String place, String message) {
    Formulas formulas = Formulas.read("test", text);
    assertEquals(1, formulas.issues().size(), text);
    assertEquals(place, formulas.issues().get(0).span().start().toString());
    if (message != null) {
      assertEquals(message, formulas.issues().get(0).sentence());
    }
  }

  @Test
  void aFaultInOneLineDoesNotHideTheOthers() {
    Formulas formulas = Formulas.read("test", "a = 1\nb = = 2\n\n// a note\nc = 3 // three\nd = )");
    assertEquals(2, formulas.statements().size());
    assertEquals("three", formulas.statements().get(1).reason());
    assertEquals(
        List.of(2, 6), formulas.issues().stream().map(i -> i.span().start().line()).toList());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "(",
        "-",
        "2^",
        "sqrt(",
        "1/",
        "a+",
        "a*",
        "((((a)))) + ",
        "9",
        "\ud800",
        "[",
        "//"
      })
  void hostileTextIsReadToAnEnd(String piece) {
    for (int times : new int[] {1, 50, 500, 20_000}) {
      Formulas formulas = Formulas.read("test", "x = " + piece.repeat(times));
      assertTrue(formulas.statements().size() <= 1);
      formulas.statements().forEach(s -> assertTrue(s.text().length() > 0));
    }
    assertEquals(1, Formulas.read("test", "x = " + piece.repeat(600_000)).issues().size());
  }

  @Test
  void lambdaAndItsLetterAreOneName() {
    assertEquals(Name.canonical("lambda"), Name.canonical("λ"));
    assertEquals(Name.canonical("k'_n"), Name.canonical("k′_n"));
  }

  @Test
  void anythingWrittenReadsBackToTheSame() {
    Gen.check(
        "round trip",
        2000,
        gen -> {
          String text = random(gen, 5);
          Expression once = expression(text);
          assertEquals(once.text(), expression(once.text()).text(), text);
          assertTrue(!once.relation().latex().isEmpty() && !once.relation().mathMl().isEmpty());
        });
  }

  private static String random(Gen gen, int depth) {
    if (depth == 0 || gen.chance(0.2)) {
      return gen.pick(List.of("a", "V_OV", "3", "0.5", "50 mV", "2 uA/V^2", "W1", "λ"));
    }
    String left = random(gen, depth - 1);
    String right = random(gen, depth - 1);
    return switch (gen.between(0, 5)) {
      case 0 -> "(" + left + ")" + gen.pick(List.of(" + ", " - ")) + right;
      case 1 -> left + gen.pick(List.of("*", " / ")) + "(" + right + ")";
      case 2 -> "-(" + left + ")";
      case 3 -> "(" + left + ")^(" + right + ")";
      case 4 -> gen.pick(List.of("sqrt", "exp", "abs")) + "(" + left + ")";
      default -> gen.pick(List.of("max", "par")) + "(" + left + ", " + right + ")";
    };
  }
}
