/**
 * Pictures as plain data, and the two forms in which they leave: PNG and SVG.
 *
 * <p>A {@link pinchoff.drawing.Scene} is a flat picture of {@link pinchoff.drawing.Element}s:
 * filled and stroked paths, typeset text, clipped groups. Whoever draws something (a chart, a
 * schematic, a headroom ladder) lays it out into a scene once; the scene is then painted to pixels
 * or written as vectors, so both forms always have the same layout. {@link pinchoff.drawing.Style}
 * is the one place for inks, line widths and text sizes, and {@link pinchoff.drawing.Palette} has
 * the line colours.
 *
 * <h2>Why there is no chart library underneath</h2>
 *
 * <p>Charts were first tried on a general chart library. Of what a chart needs here it gave axes on
 * plain linear scales and polylines; subscripts in titles, true logarithmic ticks, dashes on dense
 * curves, labels that keep clear of curves, panels on one axis and a vector form with real text all
 * had to be painted around it or undone. The same picture as a scene is a third of the bytes as PNG
 * and a thirtieth as SVG, and needs no second layout for the vector form. So the path filler of the
 * platform's 2D library is used directly, and nothing else.
 *
 * <h2>Why glyphs are shipped</h2>
 *
 * <p>{@link pinchoff.drawing.Typeface} carries outlines and widths of one sans-serif typeface as a
 * resource. Text is painted as filled paths. Thus a picture is the same on every machine, text can
 * be measured without starting a font system (which alone takes longer than a chart), and a machine
 * without any font paints charts like any other. Only characters outside the typeface, such as
 * ideographs, ask the machine for a font; where it has none, {@link pinchoff.drawing.Scene#picture}
 * answers with the vector form and says so.
 *
 * <p>This package is the home of {@code java.awt}, which is always used headless. Everything is
 * immutable and may be used from any thread; lengths are in CSS pixels, angles in degrees
 * counter-clockwise, y grows downwards.
 */
@NullMarked
package pinchoff.drawing;

import org.jspecify.annotations.NullMarked;
