package pinchoff.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import pinchoff.testing.Close;

class UnitTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "uA/V^2|uA/V^2|µA/V²|1e-6",
        "µA/V²|uA/V^2|µA/V²|1e-6",
        "μA / V^2|uA/V^2|µA/V²|1e-6",
        "V^0.5|V^0.5|√V|1",
        "√V|V^0.5|√V|1",
        "√(V)|V^0.5|√V|1",
        "sqrt(V)|V^0.5|√V|1",
        "V^(1/2)|V^0.5|√V|1",
        "nV/√Hz|nV/Hz^0.5|nV/√Hz|1e-9",
        "nV/sqrt(Hz)|nV/Hz^0.5|nV/√Hz|1e-9",
        "nV/Hz^0.5|nV/Hz^0.5|nV/√Hz|1e-9",
        "V^2/Hz|V^2/Hz|V²/Hz|1",
        "cm^2/V/s|cm^2/(V*s)|cm²/(V·s)|1e-4",
        "cm^2/(V*s)|cm^2/(V*s)|cm²/(V·s)|1e-4",
        "cm²/(V·s)|cm^2/(V*s)|cm²/(V·s)|1e-4",
        "1/V|1/V|1/V|1",
        "V^-1|1/V|1/V|1",
        "V⁻¹|1/V|1/V|1",
        "1/(V*s)|1/(V*s)|1/(V·s)|1",
        "mV*um|mV*um|mV·µm|1e-9",
        "mV·µm|mV*um|mV·µm|1e-9",
        "V^2*F|V^2*F|V²·F|1",
        "kohm|kohm|kΩ|1000",
        "kOhm|kohm|kΩ|1000",
        "kΩ|kohm|kΩ|1000",
        "k\u2126|kohm|kΩ|1000",
        "mV/dec|mV/dec|mV/dec|0.001",
        "ohm/sq|ohm/sq|Ω/sq|1",
        "Ω/□|ohm/sq|Ω/sq|1",
        "%|%|%|0.01",
        "ppm/K|ppm/K|ppm/K|1e-6",
        "%*um|%*um|%·µm|1e-8",
        "V*V|V^2|V²|1",
        "V/V|1||1",
        "1|1||1",
        "um/m|um/m|µm/m|1e-6",
        "A/V^1.3|A/V^1.3|A/V^1.3|1",
        "V^(1/3)|V^(1/3)|V^(1/3)|1",
        "V^(-3/2)|1/V^1.5|1/V^1.5|1",
        "(V/um)^2|V^2/um^2|V²/µm²|1e12",
        "((V))|V|V|1",
        "V^+2|V^2|V²|1",
        "A/V*m|A*m/V|A·m/V|1",
        "mm|mm|mm|0.001",
        "m|m|m|1",
        "ms|ms|ms|0.001",
        "fF|fF|fF|1e-15",
        "mK|mK|mK|0.001",
        "kHz|kHz|kHz|1000",
        "S|S|S|1",
        "s|s|s|1",
        "deg|deg|°|0.017453292519943295",
        "  V  |V|V|1"
      })
  void readsWhatTheTradeWrites(String text, String ascii, String symbol, double factor) {
    Unit unit = Unit.parse(text);
    assertEquals(ascii, unit.ascii());
    assertEquals(symbol == null ? "" : symbol, unit.symbol());
    assertEquals(factor, unit.factor());
    assertEquals(unit, Unit.parse(unit.ascii()));
    if (symbol != null) {
      assertEquals(unit, Unit.parse(unit.symbol()));
    }
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "|1|expected a unit such as mV",
        "X|1|unknown unit \"X\"",
        "mv|1|did you mean mV?",
        "KOhm|1|did you mean kohm?",
        "hz|1|did you mean Hz?",
        "Vold|1|unknown unit \"Vold\"",
        "uf|1|did you mean uF?",
        "kF|1|F does not take the prefix k",
        "Ms|1|s does not take the prefix M",
        "kK|1|K does not take the prefix k",
        "cV|1|V does not take the prefix c",
        "m%|1|% does not take the prefix m",
        "k|1|k is a prefix and needs a unit",
        "u|1|u is a prefix and needs a unit",
        "µ|1|µ is a prefix and needs a unit",
        "f|1|f is a prefix and needs a unit",
        "min|1|write the time in s",
        "h|1|write the time in s",
        "mV/degC|4|a difference is in K",
        "°C|1|degC(27)",
        "dB|1|plain ratio",
        "Meg|1|mega is M",
        "mho|1|write S",
        "mV um|4|unexpected \"u\"",
        "V2|2|V^2",
        "2V|1|a number inside a unit",
        "10/V|1|a number inside a unit",
        "1.5/V|1|a number inside a unit",
        "V^1/2|5|V^(1/2)",
        "V^|3|such as 2, -1, 0.5 or (1/3)",
        "V^x|3|such as 2, -1, 0.5 or (1/3)",
        "V^1.|3|such as 2, -1, 0.5 or (1/3)",
        "V^.5|3|such as 2, -1, 0.5 or (1/3)",
        "V^(1/3|7|expected ) after the exponent",
        "V^(1/0)|3|denominator 0",
        "V^(1/7)|3|multiple of 1/60",
        "V^0.123|3|multiple of 1/60",
        "V^1234567|3|such as 2, -1, 0.5 or (1/3)",
        "V^999999|1|at most 99",
        "V^50|1|in a dimension",
        "m^⁻|3|such as 2",
        "m⁻|2|one or two digits",
        "m¹²³|2|one or two digits",
        "(V|3|expected )",
        "V)|2|unexpected \")\"",
        "()|2|unexpected \")\"",
        "V//s|3|unexpected \"/\"",
        "V*|3|expected a unit",
        "*V|1|unexpected \"*\"",
        "V**2|3|unexpected \"*\"",
        "√|2|expected a unit",
        "√V^2|3|(√V)^2",
        "√V²|3|(√V)^2",
        "√√V|2|unexpected \"√\"",
        "sqrt(V|7|expected )",
        "sqrt V|1|unknown unit \"sqrt\"",
        "(V^(1/60))^0.5|1|multiple of 1/60",
        "V;|2|unexpected \";\"",
        "V/s^2/|7|expected a unit"
      })
  void pointsAtWhatItCannotRead(String text, int column, String message) {
    String given = text == null ? "" : text;
    var thrown = assertThrows(QuantityException.class, () -> Unit.parse(given));
    var issue = thrown.issue().orElseThrow();
    assertTrue(issue.sentence().contains(message), issue::sentence);
    assertEquals(column, issue.span().start().column(), thrown.getMessage());
    assertTrue(
        thrown.getMessage().startsWith("unit:1:" + column + ": error: "), thrown::getMessage);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"am", "Gm", "Mm", "GF", "MA", "Ts", "dV", "hV", "PHz", "kdec", "mppm", "cs"})
  void refusesPrefixesThatMakeNoSense(String text) {
    assertThrows(QuantityException.class, () -> Unit.parse(text));
  }

  @Test
  void showsHtmlAndLatex() {
    assertEquals("µA/V<sup>2</sup>", Unit.parse("uA/V^2").html());
    assertEquals("nV/√Hz", Unit.parse("nV/√Hz").html());
    assertEquals("A/V<sup>1.3</sup>", Unit.parse("A/V^1.3").html());
    assertEquals("\\mathrm{\\mu A/V^{2}}", Unit.parse("uA/V^2").latex());
    assertEquals("\\mathrm{cm^{2}/(V\\cdot s)}", Unit.parse("cm^2/V/s").latex());
    assertEquals("\\mathrm{k\\Omega }", Unit.parse("kohm").latex());
    assertEquals("\\mathrm{\\sqrt{V}}", Unit.parse("√V").latex());
    assertEquals("\\mathrm{\\%}", Unit.parse("%").latex());
    assertEquals("", Unit.ONE.latex());
    assertEquals("", Unit.ONE.html());
  }

  @Test
  void equalityIsThatOfTheFactors() {
    assertEquals(Unit.parse("uA"), Unit.parse("µA"));
    assertEquals(Unit.parse("uA").hashCode(), Unit.parse("µA").hashCode());
    assertNotEquals(Unit.parse("J"), Unit.parse("V*C"));
    assertEquals(Unit.ONE, Unit.parse("V/V"));
    assertNotEquals(Unit.parse("V"), (Object) "V");
  }

  @Test
  void sizesThatAreNoPowersOfTenAreKeptToManyDigits() {
    assertEquals(Math.sqrt(1e-3), Unit.parse("mV^0.5").factor());
    assertEquals(1.602176634e-19, Unit.parse("eV").factor());
    Close.assertUlps(1 / 1.602176634e-19, Unit.parse("1/eV").factor(), 1, "1/eV");
    Close.assertUlps(Math.sqrt(1.602176634e-19), Unit.parse("eV^0.5").factor(), 1, "√eV");
    assertEquals(0.1, Unit.parse("mV^(1/3)").factor());
  }
}
