/**
 * A small language for the formulas of hand analysis, and what is done with it: reading, checking
 * of dimensions, evaluation with exact derivatives, and typesetting.
 *
 * <p>One statement stands on a line:
 *
 * <pre>
 * V_OV        = sqrt(2*I_REF/(k_n1*W1/L1))       // the text after the slashes is the reason
 * R_B [kohm]  = (V_DD - V_GS)/I_REF              // a unit in brackets chooses the display
 * V_DS1 &gt;= V_OV + 50 mV                          // a comparison is a check
 * V_X such that I_X*R + V_X = V_DD, V_X &gt;= 0 V   // solved for; conditions select among the roots
 * </pre>
 *
 * <p>Names are written as the trade writes them: {@code V_OV}, {@code k'_n}, {@code λ} or {@code
 * lambda}. Operators are {@code + - * / ^} and parentheses; there is no product without a sign, so
 * {@code 50 mV} is always a number with its unit. A unit goes on over {@code /} and {@code *} where
 * no space stands beside them ({@code 387 uA/V^2}); a space ends it ({@code 1 V / R_1}).
 *
 * <p>Reading, checking and evaluating are separate, each with its own type: {@link
 * pinchoff.formula.Formulas} is what was read, {@link pinchoff.formula.Dimensions} finds what an
 * expression measures, {@link pinchoff.formula.Code} computes it. Each reports all issues at once,
 * with their places. Text is hostile until read: its length and depth are limited.
 */
@NullMarked
package pinchoff.formula;

import org.jspecify.annotations.NullMarked;
