/**
 * Places in a text and what is wrong there.
 *
 * <p>Everything that this library reads (quantities, formulas, technology files) is held in a
 * {@link pinchoff.source.SourceText}. A reader reports each fault as an {@link
 * pinchoff.source.Issue} with its {@link pinchoff.source.SourceSpan}; the issue is shown in one way
 * only: source name, line and column, the line itself and a caret under the place.
 *
 * <p>Offsets count UTF-16 units from 0, as Java strings do. Lines and columns count from 1, and a
 * column counts code points, so that a character outside the basic plane moves the caret by one.
 * Text from outside is hostile until checked: {@link pinchoff.source.TextLimits} says how long and
 * how deeply nested it may be, and {@link pinchoff.source.Excerpt} quotes it harmlessly.
 *
 * <p>All types are immutable and safe for use by several threads. No method accepts or returns
 * null.
 */
@NullMarked
package pinchoff.source;

import org.jspecify.annotations.NullMarked;
