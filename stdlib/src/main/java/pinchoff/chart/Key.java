package pinchoff.chart;

import java.util.List;
import java.util.Optional;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Path;
import pinchoff.drawing.Pen;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/** The list of names with a sample of each line, outside the plotting areas. */
final class Key {
  /** Height of a row. */
  static final double ROW = 19;

  private static final double SAMPLE = 30;
  private static final double GAP = 7;
  private static final double BETWEEN = 20;
  private static final Style STYLE = Style.STANDARD;

  private final List<Entry> entries;

  /** One row of the list. */
  record Entry(TextLine name, Item item, Look look) {
    static Entry of(Stage.Actor actor) {
      TextLine name = TextLine.of(actor.item().name());
      boolean onRight = actor.item() instanceof Line line && line.onRight();
      return new Entry(onRight ? name.plus(" (right axis)") : name, actor.item(), actor.look());
    }

    double width() {
      return SAMPLE + GAP + name.width(STYLE.text());
    }
  }

  Key(List<Entry> entries) {
    this.entries = entries;
  }

  boolean isEmpty() {
    return entries.isEmpty();
  }

  double width() {
    return entries.stream().mapToDouble(Entry::width).max().orElse(0);
  }

  /** The height of one column. */
  double height() {
    return entries.size() * ROW;
  }

  /** The height of the list in as many columns as fit. */
  double height(double width) {
    return Math.ceil((double) entries.size() / columns(width)) * ROW;
  }

  private int columns(double width) {
    int fitting = (int) ((width + BETWEEN) / (width() + BETWEEN));
    return Math.max(1, Math.min(entries.size(), fitting));
  }

  /** Draws one column. */
  void drawColumn(double x, double y, double width, List<Element> art) {
    for (int i = 0; i < entries.size(); i++) {
      entry(entries.get(i), x, y + i * ROW, width, art);
    }
  }

  /** Draws as many columns as fit, row by row. */
  void drawRows(double x, double y, double width, List<Element> art) {
    int columns = columns(width);
    double step = Math.min(width(), width) + BETWEEN;
    for (int i = 0; i < entries.size(); i++) {
      entry(
          entries.get(i),
          x + (i % columns) * step,
          y + Math.floorDiv(i, columns) * ROW,
          Math.min(width(), width),
          art);
    }
  }

  private static void entry(Entry entry, double x, double y, double width, List<Element> art) {
    double middle = y + ROW / 2;
    sample(entry, x, middle, art);
    TextLine name = entry.name.within(width - SAMPLE - GAP + 0.01, STYLE.text());
    art.add(
        new Element.Text(
            name,
            x + SAMPLE + GAP,
            middle + STYLE.text() * 0.36,
            STYLE.text(),
            STYLE.ink(),
            Anchor.START));
  }

  private static void sample(Entry entry, double x, double middle, List<Element> art) {
    Look look = entry.look;
    if (entry.item instanceof Region) {
      Rect swatch = new Rect(x + SAMPLE - 18, middle - 6, 18, 12);
      art.add(
          new Element.Shape(
              Path.rectangle(swatch),
              Optional.of(ItemArt.area(look.colour())),
              Optional.of(Pen.of(look.colour(), 0.9))));
    } else if (entry.item instanceof Dots) {
      Path circle = Path.circle(x + SAMPLE / 2, middle, ItemArt.DOT);
      art.add(Element.stroked(circle, Pen.of(look.colour(), STYLE.thin())));
    } else {
      double width = entry.item instanceof Line ? STYLE.line() : STYLE.thin();
      Path line = Path.line(x, middle, x + SAMPLE, middle);
      art.add(Element.stroked(line, new Pen(look.colour(), width, look.dash())));
    }
  }
}
