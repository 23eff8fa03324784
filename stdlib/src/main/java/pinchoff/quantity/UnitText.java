package pinchoff.quantity;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/** The ways to write a unit. All that is written consists of symbols of the unit table. */
@SuppressWarnings("ImmutableEnumChecker") // the functions hold no state
enum UnitText {
  /** With {@code ^}, {@code *} and ASCII symbols. */
  ASCII("*", UnitFactor::ascii) {
    @Override
    String power(String symbol, int parts) {
      return symbol + "^" + Exponent.text(parts);
    }
  },
  /** With superscripts, √, µ and Ω. */
  PRETTY("·", UnitFactor::symbol) {
    @Override
    String power(String symbol, int parts) {
      if (parts * 2 == Dimension.PARTS) {
        return "√" + symbol;
      }
      return parts % Dimension.PARTS == 0
          ? symbol + Exponent.superscript(parts)
          : symbol + "^" + Exponent.text(parts);
    }
  },
  /** As {@link #PRETTY}, with the superscripts of HTML. */
  HTML("·", UnitFactor::symbol) {
    @Override
    String power(String symbol, int parts) {
      return parts * 2 == Dimension.PARTS
          ? "√" + symbol
          : symbol + "<sup>" + Exponent.text(parts) + "</sup>";
    }
  },
  /** For the math mode of LaTeX, inside an upright group. */
  LATEX("\\cdot ", factor -> latexSymbol(factor.symbol())) {
    @Override
    String power(String symbol, int parts) {
      return parts * 2 == Dimension.PARTS
          ? "\\sqrt{" + symbol + "}"
          : symbol + "^{" + Exponent.text(parts) + "}";
    }
  };

  private final String dot;
  private final Function<UnitFactor, String> symbol;

  UnitText(String dot, Function<UnitFactor, String> symbol) {
    this.dot = dot;
    this.symbol = symbol;
  }

  private static String latexSymbol(String symbol) {
    return symbol
        .replace("µ", "\\mu ")
        .replace("Ω", "\\Omega ")
        .replace("%", "\\%")
        .replace("°", "^{\\circ}");
  }

  /** A symbol to a positive power other than 1. */
  abstract String power(String symbol, int parts);

  String of(List<UnitFactor> factors) {
    List<String> above = new ArrayList<>();
    List<String> below = new ArrayList<>();
    for (UnitFactor factor : factors) {
      int parts = Math.abs(factor.parts());
      String name = symbol.apply(factor);
      (factor.parts() > 0 ? above : below)
          .add(parts == Dimension.PARTS ? name : power(name, parts));
    }
    if (below.isEmpty()) {
      return String.join(dot, above);
    }
    String divisor = String.join(dot, below);
    return (above.isEmpty() ? "1" : String.join(dot, above))
        + "/"
        + (below.size() == 1 ? divisor : "(" + divisor + ")");
  }
}
