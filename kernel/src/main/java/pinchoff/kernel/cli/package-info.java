/** The command line. The only package that prints on the process's streams and ends the process. */
@NullMarked
package pinchoff.kernel.cli;

import org.jspecify.annotations.NullMarked;
