package pinchoff.chart;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import pinchoff.drawing.Colour;
import pinchoff.drawing.Element;
import pinchoff.drawing.Path;
import pinchoff.drawing.Pen;
import pinchoff.drawing.Style;

/** Draws the items of a panel. */
final class ItemArt {
  /** Radius of a marker. */
  static final double MARKER = 4;

  /** Radius of a dot. */
  static final double DOT = 3;

  private static final Style STYLE = Style.STANDARD;
  private static final double AREA_OPACITY = 0.22;

  private ItemArt() {}

  /** Areas, which lie behind the grid. */
  static List<Element> areas(Stage stage) {
    List<Element> art = new ArrayList<>();
    for (Stage.Actor actor : stage.all(Region.class)) {
      double[] corners = corners((Region) actor.item(), stage);
      if (corners.length >= 6) {
        art.add(Element.filled(closed(corners), area(actor.look().colour())));
      }
    }
    return art;
  }

  static Colour area(Colour colour) {
    return colour.withOpacity(AREA_OPACITY);
  }

  /** The visible part of a region on the page, as x and y in turn. */
  static double[] corners(Region region, Stage stage) {
    Points outline = region.outline();
    double[] corners = new double[2 * outline.size()];
    for (int i = 0; i < outline.size(); i++) {
      // What is not positive lies infinitely far down a logarithmic axis: at its end.
      corners[2 * i] = orEnd(stage.x().at(outline.x(i)), stage.plot().x());
      corners[2 * i + 1] = orEnd(stage.left().at(outline.y(i)), stage.plot().bottom());
    }
    return Window.cut(stage.plot(), corners);
  }

  private static double orEnd(double place, double end) {
    return Double.isNaN(place) ? end : place;
  }

  private static Path closed(double[] corners) {
    Path.Builder path = Path.builder().moveTo(corners[0], corners[1]);
    for (int i = 2; i < corners.length; i += 2) {
      path.lineTo(corners[i], corners[i + 1]);
    }
    return path.close().build();
  }

  /** Guides, loci, lines and dots, in this order. */
  static List<Element> curves(Stage stage) {
    List<Element> art = new ArrayList<>();
    stage.all(Guide.class).forEach(actor -> curve(actor, STYLE.thin(), art));
    stage.all(Line.class).forEach(actor -> curve(actor, STYLE.line(), art));
    stage.all(Locus.class).forEach(actor -> curve(actor, STYLE.thin(), art));
    stage.all(Dots.class).forEach(actor -> dots(actor, stage, art));
    return art;
  }

  private static void curve(Stage.Actor actor, double width, List<Element> art) {
    Path path = actor.trace().path();
    Colour colour = actor.look().colour();
    if (!path.isEmpty()) {
      art.add(Element.stroked(path, new Pen(colour, width, actor.look().dash())));
    }
    for (double[] single : actor.trace().singles()) {
      art.add(Element.filled(Path.circle(single[0], single[1], width), colour));
    }
  }

  /** Dots at the same pixel are drawn once. */
  private static void dots(Stage.Actor actor, Stage stage, List<Element> art) {
    Points points = ((Dots) actor.item()).points();
    Set<Long> seen = new HashSet<>();
    Pen pen = Pen.of(actor.look().colour(), STYLE.thin());
    for (int i = 0; i < points.size(); i++) {
      double x = stage.x().at(points.x(i));
      double y = stage.left().at(points.y(i));
      if (stage.plot().contains(x, y) && seen.add(Math.round(2 * x) << 32 | Math.round(2 * y))) {
        art.add(Element.stroked(Path.circle(x, y, DOT), pen));
      }
    }
  }

  /** Markers, which lie on top. */
  static List<Element> markers(Stage stage) {
    List<Element> art = new ArrayList<>();
    for (Stage.Actor actor : stage.all(Marker.class)) {
      Marker marker = (Marker) actor.item();
      double x = stage.x().at(marker.x().si());
      double y = stage.left().at(marker.y().si());
      if (stage.plot().contains(x, y)) {
        art.add(
            new Element.Shape(
                Path.circle(x, y, MARKER),
                Optional.of(STYLE.accent()),
                Optional.of(Pen.of(Colour.WHITE, 1.5))));
      }
    }
    return art;
  }
}
