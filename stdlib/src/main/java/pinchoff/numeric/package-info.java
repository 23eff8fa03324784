/**
 * Numerics on doubles: roots and the named functions of device equations.
 *
 * <p>No units here: callers hand over SI numbers. Transcendental functions are those of {@link
 * java.lang.StrictMath}, whose results are the same on every machine. A search that fails says what
 * it was given and how far it came; no method returns NaN.
 */
@NullMarked
package pinchoff.numeric;

import org.jspecify.annotations.NullMarked;
