/**
 * Evaluation of Java cells behind one seam, {@link pinchoff.kernel.eval.CellEvaluator}.
 *
 * <p>The evaluator runs in the kernel's own process, so that values are real objects. Everything
 * that crosses the seam is plain data, so that a child process stays possible. This package is the
 * home of JShell and ASM.
 */
@NullMarked
package pinchoff.kernel.eval;

import org.jspecify.annotations.NullMarked;
