/**
 * Derivations: ordered steps of formulas with live numbers, checks with their margins, and how much
 * each result depends on each input.
 *
 * <p>A {@link pinchoff.derive.Derivation} reads its text once. With the inputs known, a plan is
 * made of it: names resolved, dimensions checked, formulas compiled to doubles. A run of the plan
 * gives each step its outcome; other inputs need only another run. A step with a fault never hides
 * the others: those that do not need it still have their values.
 */
@NullMarked
package pinchoff.derive;

import org.jspecify.annotations.NullMarked;
