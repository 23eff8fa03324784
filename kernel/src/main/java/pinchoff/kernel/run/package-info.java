/** Runs a notebook's cells in a kernel process through the protocol, as any front end would. */
@NullMarked
package pinchoff.kernel.run;

import org.jspecify.annotations.NullMarked;
