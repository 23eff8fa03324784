/**
 * What a notebook promises: named inputs that a rerun can set, named results that a rerun compares,
 * results with limits, and what all of it rests on.
 */
@NullMarked
package pinchoff.claims;

import org.jspecify.annotations.NullMarked;
