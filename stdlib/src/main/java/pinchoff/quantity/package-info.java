/**
 * Numbers with units, checked everywhere.
 *
 * <p>{@link pinchoff.quantity.Quantity} is a double in SI plus a {@link
 * pinchoff.quantity.Dimension}; how it is shown is a matter of presentation. {@link
 * pinchoff.quantity.Units} has the factories ({@code mV(650)}, {@code um(2)}) and {@code
 * quantity("387 uA/V^2")} for everything else. An absolute {@link pinchoff.quantity.Temperature} is
 * a type of its own; a difference of temperatures is a quantity in kelvin.
 *
 * <p><b>Verbs</b>, the same over the whole library: {@code of} builds, {@code parse} reads text,
 * {@code with} gives a changed copy, {@code plus minus times per pow sqrt negate abs} calculate,
 * {@code in(unit)} gives a number, {@code to(unit)} the same quantity shown in that unit.
 *
 * <p><b>Contract of all types.</b> Immutable and safe for use by several threads. No method accepts
 * or returns null. NaN and infinity are refused on entry, and a result that overflows is an error.
 * All errors are {@link pinchoff.quantity.QuantityException} and name the values, their units and
 * what was expected. Text is read and written the same way in every language and country.
 *
 * <p><b>Two ways, the same bits.</b> A number with a unit means its shortest decimal form, scaled
 * exactly and rounded once: {@code mV(650)}, {@code V(0.65)} and {@code quantity("650 mV")} are
 * equal, and {@code um(0.18).in("um")} is 0.18.
 *
 * <p><b>Why so few types.</b> A type per dimension (a voltage, a current) would catch a wrong unit
 * at compile time but not for the derived dimensions that hand analysis is made of: the body factor
 * is in √V, a transconductance parameter in A/V², noise in V/√Hz. One type with exact rational
 * exponents treats all alike.
 */
@NullMarked
package pinchoff.quantity;

import org.jspecify.annotations.NullMarked;
