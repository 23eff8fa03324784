/**
 * The limits of the kernel, in one place: how large, how deep, how many and how long.
 *
 * <p>Everything that comes from outside is hostile until checked, and everything that a cell sends
 * out is bounded, so that neither can take the kernel's memory.
 */
@NullMarked
package pinchoff.kernel.limits;

import org.jspecify.annotations.NullMarked;
