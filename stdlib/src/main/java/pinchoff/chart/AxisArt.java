package pinchoff.chart;

import java.util.List;
import pinchoff.drawing.Colour;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Path;
import pinchoff.drawing.Pen;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/** Draws grid, frame, ticks and titles of axes. */
final class AxisArt {
  /** Length of a tick. */
  static final double TICK = 4;

  /** Distance between a tick and its number. */
  static final double GAP = 4;

  private static final Style STYLE = Style.STANDARD;

  private final List<Element> to;
  private final Rect plot;

  AxisArt(List<Element> to, Rect plot) {
    this.to = to;
    this.plot = plot;
  }

  void upright(TickMarks marks, Scale scale) {
    marks.fine().forEach(value -> upright(scale.at(value), STYLE.fine()));
    marks.labelled().forEach(tick -> upright(scale.at(tick.value()), STYLE.grid()));
  }

  void level(TickMarks marks, Scale scale) {
    marks.fine().forEach(value -> level(scale.at(value), STYLE.fine()));
    marks.labelled().forEach(tick -> level(scale.at(tick.value()), STYLE.grid()));
  }

  /** The line at zero, where zero lies between the ends. */
  void zero(Scale x, Scale y) {
    if (!y.logarithmic() && y.range().low() < 0 && y.range().high() > 0) {
      level(y.at(0), STYLE.zero());
    }
    if (!x.logarithmic() && x.range().low() < 0 && x.range().high() > 0) {
      upright(x.at(0), STYLE.zero());
    }
  }

  private void upright(double x, Colour colour) {
    line(crisp(x), plot.y(), crisp(x), plot.bottom(), colour);
  }

  private void level(double y, Colour colour) {
    line(plot.x(), crisp(y), plot.right(), crisp(y), colour);
  }

  private void line(double x1, double y1, double x2, double y2, Colour colour) {
    to.add(Element.stroked(Path.line(x1, y1, x2, y2), Pen.of(colour, STYLE.hair())));
  }

  void frame(boolean right) {
    line(plot.x(), plot.y(), plot.right(), plot.y(), STYLE.grid());
    line(plot.right(), plot.y(), plot.right(), plot.bottom(), right ? STYLE.frame() : STYLE.grid());
    line(plot.x(), plot.y(), plot.x(), plot.bottom(), STYLE.frame());
    line(plot.x(), plot.bottom(), plot.right(), plot.bottom(), STYLE.frame());
  }

  /** Ticks below; their numbers too unless another panel stands below. */
  void below(TickMarks marks, Scale scale, boolean numbers) {
    for (TickMarks.Tick tick : marks.labelled()) {
      double x = crisp(scale.at(tick.value()));
      line(x, plot.bottom(), x, plot.bottom() + TICK, STYLE.frame());
      if (numbers) {
        number(tick.label(), x, plot.bottom() + TICK + GAP + STYLE.small() * 0.76, Anchor.MIDDLE);
      }
    }
  }

  void left(TickMarks marks, Scale scale) {
    for (TickMarks.Tick tick : marks.labelled()) {
      double y = crisp(scale.at(tick.value()));
      line(plot.x() - TICK, y, plot.x(), y, STYLE.frame());
      number(tick.label(), plot.x() - TICK - GAP, y + STYLE.small() * 0.36, Anchor.END);
    }
  }

  void right(TickMarks marks, Scale scale) {
    for (TickMarks.Tick tick : marks.labelled()) {
      double y = crisp(scale.at(tick.value()));
      line(plot.right(), y, plot.right() + TICK, y, STYLE.frame());
      number(tick.label(), plot.right() + TICK + GAP, y + STYLE.small() * 0.36, Anchor.START);
    }
  }

  private void number(TextLine label, double x, double y, Anchor anchor) {
    to.add(new Element.Text(label, x, y, STYLE.small(), STYLE.quiet(), anchor));
  }

  /** The title of an axis: its label, and its unit in parentheses. */
  static TextLine title(Axis axis, TickMarks marks) {
    return marks.unit().isEmpty()
        ? axis.label()
        : axis.label().plus(" (").plus(marks.unit()).plus(")");
  }

  /** To half a CSS pixel, which is a whole pixel of the image: such lines are sharp. */
  static double crisp(double place) {
    return Math.round(place * 2) / 2.0;
  }
}
