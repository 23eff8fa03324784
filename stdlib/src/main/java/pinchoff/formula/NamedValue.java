package pinchoff.formula;

import pinchoff.quantity.Quantity;

/**
 * A quantity under a name that formulas may use.
 *
 * @param name in trade notation, for example {@code V_DS1}
 * @param value its value; a temperature counts in kelvins
 * @param origin where it comes from, for the reader: {@code "premise"}, {@code "bias of core-n"}
 */
public record NamedValue(String name, Quantity value, String origin) {}
