package pinchoff.quantity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The unit in which the trade shows a dimension, and how its leading factor takes prefixes: a
 * capacitance per area is shown in fF/µm² or pF/µm², never in mF/m².
 */
record DisplayUnits(Unit base, boolean prefixed) {
  private static final int THOUSAND = 3;

  private static final Map<Dimension, DisplayUnits> TRADE = new HashMap<>();

  static {
    for (String text : List.of("F/um^2", "F/um", "V*um", "A/um", "A/um^2", "C/um^2", "m^2")) {
      add(text, true);
    }
    for (String text :
        List.of("kg", "um/V", "cm^2/(V*s)", "cm/s", "V/um", "1/cm^3", "ohm*m", "1/V", "1/K")) {
      add(text, false);
    }
  }

  private static void add(String text, boolean prefixed) {
    Unit unit = Unit.parse(text);
    TRADE.put(unit.dimension(), new DisplayUnits(unit, prefixed));
  }

  static DisplayUnits of(Dimension dimension) {
    DisplayUnits trade = TRADE.get(dimension);
    if (trade != null) {
      return trade;
    }
    Unit unit = CoherentUnits.of(dimension);
    boolean prefixed =
        !unit.factors().isEmpty() && unit.factors().get(0).parts() == Dimension.PARTS;
    return new DisplayUnits(unit, prefixed);
  }

  /**
   * The unit with the prefix that leaves one to three digits before the decimal mark; without
   * prefix where none does.
   *
   * @param exponent the power of ten of the leading digit of the value in SI
   */
  Unit forExponent(int exponent) {
    if (!prefixed) {
      return base;
    }
    UnitFactor lead = base.factors().get(0);
    int times = lead.parts() / Dimension.PARTS;
    int rest = base.decimalPower() - times * lead.prefix().power();
    Prefix best = Prefix.NONE;
    int left = Integer.MAX_VALUE;
    for (Prefix prefix : Prefix.values()) {
      int here = exponent - rest - prefix.power() * times;
      if (prefix != Prefix.CENTI && lead.unit().takes(prefix) && here >= 0 && here < left) {
        best = prefix;
        left = here;
      }
    }
    return left < THOUSAND * times ? withLead(best) : base;
  }

  /** True if the unit is the base with some prefix, so that it need not be remembered. */
  boolean covers(Unit unit) {
    if (unit.equals(base)) {
      return true;
    }
    if (!prefixed || unit.factors().isEmpty()) {
      return false;
    }
    Prefix prefix = unit.factors().get(0).prefix();
    return prefix != Prefix.CENTI && withLead(prefix).equals(unit);
  }

  private Unit withLead(Prefix prefix) {
    List<UnitFactor> factors = new ArrayList<>(base.factors());
    UnitFactor lead = factors.get(0);
    factors.set(0, lead.withPrefix(prefix));
    return Unit.of(factors);
  }
}
