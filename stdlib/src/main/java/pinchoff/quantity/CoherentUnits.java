package pinchoff.quantity;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Names and coherent SI units of dimensions, as the trade writes them. */
final class CoherentUnits {

  private record Known(Unit unit, String name) {}

  /** Coherent unit and name; a dash for those that have none. */
  private static final String[][] TABLE = {
    {"1", "pure number"},
    {"m", "length"},
    {"m^2", "area"},
    {"kg", "mass"},
    {"s", "time"},
    {"A", "current"},
    {"K", "temperature difference"},
    {"Hz", "frequency"},
    {"V", "voltage"},
    {"ohm", "resistance"},
    {"S", "conductance"},
    {"F", "capacitance"},
    {"H", "inductance"},
    {"C", "charge"},
    {"W", "power"},
    {"J", "energy"},
    {"A/V^2", "transconductance parameter"},
    {"V^0.5", "root of a voltage"},
    {"V^2", "voltage squared"},
    {"1/V", "reciprocal voltage"},
    {"m/V", "length per voltage"},
    {"V*m", "voltage times length"},
    {"V/m", "electric field"},
    {"m^2/(V*s)", "mobility"},
    {"m/s", "velocity"},
    {"F/m^2", "capacitance per area"},
    {"F/m", "capacitance per length"},
    {"C/m^2", "charge per area"},
    {"A/m", "current per length"},
    {"A/m^2", "current per area"},
    {"ohm*m", "resistivity"},
    {"V/K", "voltage per temperature"},
    {"A/K", "current per temperature"},
    {"1/K", "temperature coefficient"},
    {"V/s", "slew rate"},
    {"V/Hz^0.5", "voltage noise density"},
    {"A/Hz^0.5", "current noise density"},
    {"V^2/Hz", "voltage noise power density"},
    {"A^2/Hz", "current noise power density"},
    {"1/m^3", "number density"},
    {"Hz^0.5", "root of a frequency"},
    {"C^2", "charge squared"},
  };

  /** Named units to try with one further factor, and those further factors. */
  private static final String[] FIRST = {"A", "V", "F", "C", "W", "J", "S", "ohm", "H", "Hz"};

  private static final String[] SECOND = {"V", "A", "m", "s", "K", "Hz"};

  private static final Map<Dimension, Known> KNOWN = known();

  private CoherentUnits() {}

  static Optional<String> nameOf(Dimension dimension) {
    return Optional.ofNullable(KNOWN.get(dimension)).map(Known::name);
  }

  static String describe(Dimension dimension) {
    Known known = KNOWN.get(dimension);
    if (known == null) {
      return "a quantity in " + dimension;
    }
    String article = "aeiou".indexOf(known.name.charAt(0)) >= 0 ? "an " : "a ";
    return article + known.name + (dimension.isNone() ? "" : " (" + known.unit.ascii() + ")");
  }

  /** The coherent unit, in its most readable form. */
  static Unit of(Dimension dimension) {
    Known known = KNOWN.get(dimension);
    return known != null ? known.unit : product(dimension);
  }

  private static Unit product(Dimension dimension) {
    for (String first : FIRST) {
      for (String second : SECOND) {
        Dimension rest = dimension.per(unit(first).dimension());
        int[] parts = rest.parts();
        int[] base = unit(second).dimension().parts();
        int exponent = exponent(parts, base);
        if (exponent != 0) {
          return Unit.of(List.of(factor(first, Dimension.PARTS), factor(second, exponent)));
        }
      }
    }
    int[] parts = dimension.parts();
    int mass = parts[1];
    // kg = V·A·s³/m²: volts and amperes say more to a designer than kilograms.
    return Unit.of(
        List.of(
            factor("V", mass),
            factor("A", parts[3] + mass),
            factor("m", parts[0] - 2 * mass),
            factor("s", parts[2] + 3 * mass),
            factor("K", parts[4])));
  }

  /** The exponent in sixtieths that makes one dimension of another, or 0. */
  private static int exponent(int[] wanted, int[] base) {
    int exponent = 0;
    for (int i = 0; i < base.length; i++) {
      if (base[i] != 0) {
        int here = wanted[i] * Dimension.PARTS / base[i];
        if (here == 0
            || (exponent != 0 && exponent != here)
            || here * base[i] != wanted[i] * Dimension.PARTS) {
          return 0;
        }
        exponent = here;
      } else if (wanted[i] != 0) {
        return 0;
      }
    }
    return exponent;
  }

  private static UnitFactor factor(String symbol, int parts) {
    UnitFactor one = UnitSymbols.find(symbol).orElseThrow();
    return new UnitFactor(one.prefix(), one.unit(), parts);
  }

  private static Unit unit(String symbol) {
    return Unit.of(List.of(factor(symbol, Dimension.PARTS)));
  }

  private static Map<Dimension, Known> known() {
    Map<Dimension, Known> known = new LinkedHashMap<>();
    for (String[] row : TABLE) {
      Unit unit = Unit.parse(row[0]);
      known.putIfAbsent(unit.dimension(), new Known(unit, row[1]));
    }
    return known;
  }
}
