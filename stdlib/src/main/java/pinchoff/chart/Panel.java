package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * One plotting area: a vertical axis, as a rule on the left, and what is drawn against it.
 *
 * @param left the vertical axis
 * @param right a second vertical axis for the lines that ask for it
 * @param height of the plotting area in CSS pixels, {@value #MIN_HEIGHT} to {@value #MAX_HEIGHT}
 * @param items what is drawn
 */
public record Panel(Axis left, Optional<Axis> right, int height, List<Item> items) {

  /** The least height of a plotting area. */
  public static final int MIN_HEIGHT = 60;

  /** The greatest height of a plotting area. */
  public static final int MAX_HEIGHT = 900;

  /** The largest number of items in a panel. */
  public static final int MAX_ITEMS = 500;

  /** Checks counts and that every line has its axis. */
  public Panel {
    if (height < MIN_HEIGHT || height > MAX_HEIGHT) {
      throw new ChartException(
          "panel height %d px: expected %d to %d".formatted(height, MIN_HEIGHT, MAX_HEIGHT));
    }
    if (items.size() > MAX_ITEMS) {
      throw new ChartException(
          "%d items in one panel: at most %d are allowed".formatted(items.size(), MAX_ITEMS));
    }
    items = List.copyOf(items);
    for (Item item : items) {
      if (item instanceof Line line && line.onRight() && right.isEmpty()) {
        throw new ChartException(
            "line \"%s\" is to be drawn against the right axis, but the panel has none"
                .formatted(line.name()));
      }
    }
  }

  /** An empty panel of usual height. */
  public static Panel of(Axis left) {
    return new Panel(left, Optional.empty(), 340, List.of());
  }

  /** This panel with a second vertical axis. */
  public Panel right(Axis axis) {
    return new Panel(left, Optional.of(axis), height, items);
  }

  /** This panel with another height of its plotting area, in CSS pixels. */
  public Panel height(int pixels) {
    return new Panel(left, right, pixels, items);
  }

  /** This panel with more in it. */
  public Panel with(Item... more) {
    return with(List.of(more));
  }

  /** This panel with more in it. */
  public Panel with(List<? extends Item> more) {
    List<Item> all = new ArrayList<>(items);
    all.addAll(more);
    return new Panel(left, right, height, all);
  }
}
