package pinchoff.chart;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Scene;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/**
 * Lays a chart out: margins from the widths of labels, then panels from top to bottom, then names.
 * Tries the places for names in order until one fits.
 */
final class Layout {
  private static final Style STYLE = Style.STANDARD;
  private static final double EDGE = 12;
  private static final double TITLE = 24;
  private static final double AXIS_TITLE = 26;
  private static final double BETWEEN = 10;
  private static final double TICKS = AxisArt.TICK + AxisArt.GAP + 14;
  private static final double ROOM_LEVEL = 42;
  private static final double MOST_NAMES_AT_ENDS = 12;

  /** Names may take this share of the width. */
  private static final double NAMES = 0.3;

  private final Chart chart;
  private final Ranges ranges;
  private final List<TickMarks> left = new ArrayList<>();
  private final List<Optional<TickMarks>> right = new ArrayList<>();

  private Layout(Chart chart) {
    this.chart = chart;
    this.ranges = Ranges.of(chart);
    for (int i = 0; i < chart.panels().size(); i++) {
      Panel panel = chart.panels().get(i);
      double room = Math.min(ROOM_LEVEL, panel.height() / 3.0);
      left.add(TickMarks.of(panel.left(), ranges.left().get(i), panel.height(), room));
      Optional<Range> second = ranges.right().get(i);
      right.add(
          panel
              .right()
              .map(axis -> TickMarks.of(axis, second.orElseThrow(), panel.height(), room)));
    }
  }

  static Scene of(Chart chart) {
    Layout layout = new Layout(chart);
    for (Legend place : layout.places()) {
      Optional<Scene> scene = layout.tried(place);
      if (scene.isPresent()) {
        return scene.get();
      }
    }
    throw new IllegalStateException("names below always fit");
  }

  /** The places for names to try, in order; the last one always fits. */
  private List<Legend> places() {
    return switch (chart.legend()) {
      case NONE -> List.of(Legend.NONE);
      case BELOW -> List.of(Legend.BELOW);
      case RIGHT -> List.of(Legend.RIGHT, Legend.BELOW);
      case AT_ENDS -> List.of(Legend.AT_ENDS, Legend.BELOW);
      case AUTOMATIC ->
          chart.panels().stream().anyMatch(panel -> panel.right().isPresent())
              ? List.of(Legend.BELOW)
              : List.of(Legend.AT_ENDS, Legend.RIGHT, Legend.BELOW);
    };
  }

  private Optional<Scene> tried(Legend place) {
    List<List<Look>> looks = Looks.of(chart, place == Legend.AT_ENDS);
    double names = nameWidth(place, looks);
    double most = NAMES * chart.width();
    boolean tight = chart.legend() == Legend.AUTOMATIC && names > most + 30;
    if (place == Legend.RIGHT && tight) {
      return Optional.empty();
    }
    return new Attempt(place, looks, Math.min(names, most + 30)).scene();
  }

  private double nameWidth(Legend place, List<List<Look>> looks) {
    double widest = 0;
    for (int i = 0; i < looks.size(); i++) {
      for (int k = 0; k < looks.get(i).size(); k++) {
        Item item = chart.panels().get(i).items().get(k);
        if (isNamedLine(item)) {
          widest = Math.max(widest, TextLine.of(item.name()).width(STYLE.text()));
        }
      }
    }
    return switch (place) {
      case AT_ENDS -> widest == 0 ? 0 : widest + EndLabels.LEADER;
      case RIGHT -> widest == 0 ? 0 : widest + 37 + EDGE;
      default -> 0;
    };
  }

  private static boolean isNamedLine(Item item) {
    return (item instanceof Line || item instanceof Dots) && !item.name().isEmpty();
  }

  /** One arrangement. */
  private final class Attempt {
    private final Legend place;
    private final List<List<Look>> looks;
    private final double names;
    private final List<Element> art = new ArrayList<>();
    private final List<Key.Entry> key = new ArrayList<>();
    private final Set<String> named = new HashSet<>();
    private final double plotLeft;
    private final double plotRight;

    Attempt(Legend place, List<List<Look>> looks, double names) {
      this.place = place;
      this.looks = looks;
      this.names = names;
      double numbers = left.stream().mapToDouble(t -> t.widest(STYLE.small())).max().orElse(0);
      double second =
          right.stream()
              .flatMap(Optional::stream)
              .mapToDouble(t -> t.widest(STYLE.small()) + AxisArt.TICK + AxisArt.GAP)
              .max()
              .orElse(0);
      this.plotLeft = Math.ceil(EDGE + numbers + AxisArt.TICK + AxisArt.GAP);
      double margin = Math.max(second, names) + EDGE;
      double lastNumber = 12;
      this.plotRight =
          Math.floor(Math.max(plotLeft + 80, chart.width() - Math.max(margin, EDGE + lastNumber)));
    }

    Optional<Scene> scene() {
      double y = EDGE;
      if (!chart.title().isEmpty()) {
        title(TextLine.of(chart.title()), STYLE.heading(), EDGE, y + STYLE.heading(), Anchor.START);
        y += TITLE;
      }
      double top = y + AXIS_TITLE;
      for (int i = 0; i < chart.panels().size(); i++) {
        y += AXIS_TITLE;
        int height = chart.panels().get(i).height();
        if (!panel(i, new Rect(plotLeft, Math.round(y), plotRight - plotLeft, height))) {
          return Optional.empty();
        }
        y = Math.round(y) + height + BETWEEN;
      }
      y += TICKS - BETWEEN;
      TickMarks marks = across();
      TextLine xTitle = AxisArt.title(chart.x(), marks);
      if (!xTitle.isEmpty()) {
        title(xTitle, STYLE.text(), (plotLeft + plotRight) / 2, y + STYLE.text(), Anchor.MIDDLE);
        y += AXIS_TITLE - 6;
      }
      return key(y, top)
          .map(
              bottom ->
                  new Scene(
                      chart.width(),
                      (int) Math.min(Scene.MAX_SIZE, Math.ceil(bottom + EDGE - 4)),
                      chart.title(),
                      art));
    }

    private TickMarks across() {
      double length = plotRight - plotLeft;
      TickMarks rough = TickMarks.of(chart.x(), ranges.x(), length, 70);
      double widest = rough.widest(STYLE.small());
      return widest + 14 <= 70
          ? rough
          : TickMarks.of(chart.x(), ranges.x(), length, Math.min(length / 2, widest + 24));
    }

    private void title(TextLine text, double size, double x, double baseline, Anchor anchor) {
      double room = anchor == Anchor.MIDDLE ? plotRight - plotLeft : chart.width() - x - EDGE;
      art.add(new Element.Text(text.within(room, size), x, baseline, size, STYLE.ink(), anchor));
    }

    private boolean panel(int index, Rect plot) {
      Panel panel = chart.panels().get(index);
      boolean lowest = index == chart.panels().size() - 1;
      Stage stage =
          Stage.of(
              panel,
              looks.get(index),
              plot,
              ranges.x(),
              ranges.left().get(index),
              ranges.right().get(index),
              chart.x().logarithmic());
      TickMarks across = across();
      verticalTitles(index, plot);
      AxisArt axes = new AxisArt(art, plot);
      art.add(new Element.Clipped(plot, ItemArt.areas(stage)));
      axes.upright(across, stage.x());
      axes.level(left.get(index), stage.left());
      axes.zero(stage.x(), stage.left());
      axes.frame(panel.right().isPresent());
      axes.below(across, stage.x(), lowest);
      axes.left(left.get(index), stage.left());
      right.get(index).ifPresent(marks -> axes.right(marks, stage.right().orElseThrow()));
      art.add(new Element.Clipped(plot.grown(1), ItemArt.curves(stage)));
      art.addAll(ItemArt.markers(stage));
      emptiness(stage);
      return names(stage);
    }

    private void verticalTitles(int index, Rect plot) {
      Panel panel = chart.panels().get(index);
      double baseline = plot.y() - 11;
      TextLine own = AxisArt.title(panel.left(), left.get(index));
      double half = panel.right().isPresent() ? (chart.width() - 3 * EDGE) / 2 : chart.width();
      title(own.within(half, STYLE.text()), STYLE.text(), EDGE, baseline, Anchor.START);
      panel
          .right()
          .ifPresent(
              axis -> {
                TextLine second =
                    AxisArt.title(axis, right.get(index).orElseThrow()).within(half, STYLE.text());
                art.add(
                    new Element.Text(
                        second,
                        chart.width() - EDGE,
                        baseline,
                        STYLE.text(),
                        STYLE.ink(),
                        Anchor.END));
              });
    }

    private void emptiness(Stage stage) {
      boolean seen = stage.actors().stream().anyMatch(Attempt::isSeen);
      if (!seen) {
        String why = stage.actors().isEmpty() ? "no data" : "no points within these axes";
        Rect plot = stage.plot();
        art.add(
            new Element.Text(
                TextLine.plain(why),
                plot.centreX(),
                plot.centreY(),
                STYLE.text(),
                STYLE.quiet(),
                Anchor.MIDDLE));
      }
    }

    private static boolean isSeen(Stage.Actor actor) {
      Item item = actor.item();
      return !actor.trace().isEmpty()
          || item instanceof Marker
          || item instanceof Region
          || (item instanceof Dots dots && dots.points().size() > 0);
    }

    /** Writes the names of a panel's items; false if they do not fit. */
    private boolean names(Stage stage) {
      if (place == Legend.NONE) {
        return true;
      }
      Occupancy occupancy = new Occupancy(stage.plot());
      stage.actors().forEach(actor -> occupancy.add(actor.trace()));
      stage.all(Dots.class).forEach(actor -> occupancy.add(actor, stage));
      List<Stage.Actor> lines = new ArrayList<>();
      for (Stage.Actor actor : stage.actors()) {
        if (isNamedLine(actor.item()) && named.add(actor.item().name())) {
          lines.add(actor);
        }
      }
      if (place == Legend.AT_ENDS) {
        boolean dots = lines.stream().anyMatch(actor -> actor.item() instanceof Dots);
        Optional<List<Element>> ends =
            dots || lines.size() > MOST_NAMES_AT_ENDS
                ? Optional.empty()
                : EndLabels.of(stage, lines, occupancy, names - EndLabels.LEADER);
        if (ends.isEmpty()) {
          return false;
        }
        art.addAll(ends.get());
      } else {
        lines.forEach(actor -> key.add(Key.Entry.of(actor)));
      }
      InnerLabels labels = new InnerLabels(stage, occupancy, art);
      labels.markers();
      new AreaLabels(stage, occupancy, art).place().forEach(a -> key.add(Key.Entry.of(a)));
      labels.curves().forEach(a -> key.add(Key.Entry.of(a)));
      return true;
    }

    /** Draws the list of names; returns where the picture ends, or nothing if it does not fit. */
    private Optional<Double> key(double y, double top) {
      Key list = new Key(key);
      if (list.isEmpty()) {
        return Optional.of(y);
      }
      if (place == Legend.RIGHT) {
        if (list.height() > y - top) {
          return Optional.empty();
        }
        double x = plotRight + EDGE;
        list.drawColumn(x, top - 2, chart.width() - x - EDGE, art);
        return Optional.of(y);
      }
      double width = chart.width() - EDGE - plotLeft;
      list.drawRows(plotLeft, y + 6, width, art);
      return Optional.of(y + 6 + list.height(width));
    }
  }
}
