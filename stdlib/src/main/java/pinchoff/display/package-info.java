/**
 * What a notebook kernel needs to know of this library, and all that it needs to know.
 *
 * <p>{@link pinchoff.display.Displayable} is how a result shows itself, {@link
 * pinchoff.display.MimeBundle} is what it shows, and {@link pinchoff.display.Host} is what the code
 * of a cell may ask of the place where it runs. Outside a notebook the default host prints plain
 * text, so that the same code runs in any program.
 *
 * <p>Everything here is plain data (strings, numbers, lists, maps), so that it can cross to another
 * process. No method accepts or returns null.
 */
@NullMarked
package pinchoff.display;

import org.jspecify.annotations.NullMarked;
