package pinchoff.quantity;

import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import pinchoff.source.Suggestions;

/** Every accepted symbol, made from the tables of units and prefixes, and help with the others. */
final class UnitSymbols {
  private static final Map<String, UnitFactor> KNOWN = known();
  private static final Collection<String> ASCII = ascii();

  /** What people write that is no unit here, and what to write instead. */
  private static final Map<String, String> HINTS =
      Map.ofEntries(
          Map.entry("degC", "an absolute temperature is degC(27); a difference is in K"),
          Map.entry("°C", "an absolute temperature is degC(27); a difference is in K"),
          Map.entry("\u2103", "an absolute temperature is degC(27); a difference is in K"),
          Map.entry("dB", "a ratio in dB is for display only; write the plain ratio"),
          Map.entry("min", "write the time in s"),
          Map.entry("h", "write the time in s"),
          Map.entry("mho", "write S"),
          Map.entry("Meg", "mega is M, as in MHz or Mohm"),
          Map.entry("meg", "mega is M, as in MHz or Mohm"),
          Map.entry("micron", "write um"),
          Map.entry("volt", "write V"),
          Map.entry("volts", "write V"),
          Map.entry("amp", "write A"),
          Map.entry("amps", "write A"),
          Map.entry("farad", "write F"));

  private UnitSymbols() {}

  static Optional<UnitFactor> find(String symbol) {
    return Optional.ofNullable(KNOWN.get(symbol));
  }

  /** What the writer of an unknown symbol may have meant. */
  static Optional<String> hint(String symbol) {
    String fixed = HINTS.get(symbol);
    if (fixed != null) {
      return Optional.of(fixed);
    }
    for (Prefix prefix : Prefix.values()) {
      if (prefix != Prefix.NONE && prefix.spellings().contains(symbol)) {
        return Optional.of(symbol + " is a prefix and needs a unit after it");
      }
    }
    Optional<String> refused = refusedPrefix(symbol);
    return refused.isPresent() ? refused : Suggestions.didYouMean(symbol, ASCII);
  }

  private static Optional<String> refusedPrefix(String symbol) {
    for (NamedUnit unit : NamedUnit.values()) {
      for (String name : unit.spellings()) {
        String rest =
            symbol.endsWith(name) ? symbol.substring(0, symbol.length() - name.length()) : "";
        for (Prefix prefix : Prefix.values()) {
          if (!rest.isEmpty() && prefix.spellings().contains(rest)) {
            return Optional.of(unit.ascii() + " does not take the prefix " + rest);
          }
        }
      }
    }
    return Optional.empty();
  }

  /** Every accepted symbol and what it stands for. */
  static Map<String, UnitFactor> all() {
    return KNOWN;
  }

  private static Map<String, UnitFactor> known() {
    Map<String, UnitFactor> known = new LinkedHashMap<>();
    for (NamedUnit unit : NamedUnit.values()) {
      for (Prefix prefix : Prefix.values()) {
        if (unit.takes(prefix)) {
          UnitFactor factor = new UnitFactor(prefix, unit, Dimension.PARTS);
          for (String first : prefix.spellings()) {
            for (String second : unit.spellings()) {
              if (known.put(first + second, factor) != null) {
                throw new IllegalStateException("two units are written " + first + second);
              }
            }
          }
        }
      }
    }
    return Collections.unmodifiableMap(known);
  }

  private static Collection<String> ascii() {
    Collection<String> ascii = new TreeSet<>();
    KNOWN.values().forEach(factor -> ascii.add(factor.ascii()));
    return ascii;
  }
}
