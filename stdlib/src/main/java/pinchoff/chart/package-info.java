/**
 * Data charts: what is plotted, apart from how it is drawn.
 *
 * <p>A {@link pinchoff.chart.Chart} is one or more {@link pinchoff.chart.Panel}s, one above the
 * other, over a common horizontal {@link pinchoff.chart.Axis}. A panel holds {@link
 * pinchoff.chart.Item}s: {@link pinchoff.chart.Line}s (curves, as a rule a family of them), {@link
 * pinchoff.chart.Locus} (a boundary or a set of points with a property, dashed), {@link
 * pinchoff.chart.Guide}s (a constant across the panel), {@link pinchoff.chart.Region}s (filled
 * areas), {@link pinchoff.chart.Marker}s (single points with a name) and {@link
 * pinchoff.chart.Dots} (measured points). All are immutable; the verbs are {@code of} and {@code
 * with}.
 *
 * <pre>{@code
 * Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
 *     .titled("Output curves of M1")
 *     .with(Line.of("V_GS = 0.8 V", voltages, currents))
 *     .with(Locus.of("edge of saturation", edgeVoltages, edgeCurrents))
 *     .with(Marker.of("bias point", V(1), uA(20)))
 * }</pre>
 *
 * <p>Data are plain numbers in SI units; the axis knows their dimension and chooses a prefix that
 * suits the range. NaN is a gap in a curve. Infinity is refused. On a logarithmic axis values that
 * are not positive are gaps too, and the text alternative counts them.
 *
 * <p>A chart is laid out into a {@link pinchoff.drawing.Scene}, which is painted as PNG or written
 * as SVG; so this package comes after {@code drawing} and knows neither pixels nor files. Names may
 * hold anything: they are shown, never interpreted.
 */
@NullMarked
package pinchoff.chart;

import org.jspecify.annotations.NullMarked;
