/**
 * Runs a notebook's cells in a kernel process through the protocol, as any front end would.
 *
 * <p>{@link pinchoff.kernel.run.NotebookRunner} starts a fresh kernel in the notebook's folder,
 * runs the code cells in order and gives a {@link pinchoff.kernel.run.NotebookRun}: the notebook
 * with its new outputs, and how each cell ended. It stops at the first cell that fails unless told
 * to go on; cells that were not reached have no outputs then. Nothing that differs from run to run,
 * such as a time, is stored, so that an unchanged notebook gives an unchanged file.
 *
 * <p>{@link pinchoff.kernel.run.RunKernel} is what a runner needs of a kernel; tests put one in
 * memory in its place.
 */
@NullMarked
package pinchoff.kernel.run;

import org.jspecify.annotations.NullMarked;
