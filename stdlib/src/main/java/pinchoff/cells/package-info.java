/**
 * The names that a session preloads, so that cells read like notes: what to say of a bias, and what
 * to ask of the notebook. The list of imports is the resource {@code
 * META-INF/pinchoff/session-imports}.
 */
@NullMarked
package pinchoff.cells;

import org.jspecify.annotations.NullMarked;
