package pinchoff.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import pinchoff.drawing.Element;
import pinchoff.drawing.Element.Anchor;
import pinchoff.drawing.Rect;
import pinchoff.drawing.Style;
import pinchoff.drawing.TextLine;

/**
 * Puts names of regions inside them, where they are widest and nothing is covered.
 *
 * <p>The plotting area is divided into cells of the shape of the name, a quarter of its width and
 * height. The cell that is farthest from what is not free, counted in steps of cells in all eight
 * directions, is the middle of the largest free rectangle of that shape.
 */
final class AreaLabels {
  private static final Style STYLE = Style.STANDARD;
  private static final double ROW = 17;
  private static final int PARTS = 4;

  private final Stage stage;
  private final Occupancy occupancy;
  private final List<Element> art;

  AreaLabels(Stage stage, Occupancy occupancy, List<Element> art) {
    this.stage = stage;
    this.occupancy = occupancy;
    this.art = art;
  }

  /** Names all regions; returns those for which there is no free place. */
  List<Stage.Actor> place() {
    List<Stage.Actor> left = new ArrayList<>();
    for (Stage.Actor actor : stage.all(Region.class)) {
      double[] corners = ItemArt.corners((Region) actor.item(), stage);
      if (!actor.item().name().isEmpty() && corners.length >= 6 && !placed(actor, corners)) {
        left.add(actor);
      }
    }
    return left;
  }

  private boolean placed(Stage.Actor actor, double[] corners) {
    TextLine name = TextLine.of(actor.item().name());
    double width = name.width(STYLE.text()) + 8;
    return widest(corners, width)
        .map(
            middle -> {
              occupancy.add(new Rect(middle[0] - width / 2, middle[1] - ROW / 2, width, ROW));
              double baseline = middle[1] + STYLE.text() * 0.36;
              art.add(
                  new Element.Text(
                      name, middle[0], baseline, STYLE.text(), STYLE.ink(), Anchor.MIDDLE));
              return true;
            })
        .isPresent();
  }

  private Optional<double[]> widest(double[] corners, double width) {
    Rect plot = stage.plot();
    double cellWidth = width / PARTS;
    double cellHeight = ROW / PARTS;
    int columns = (int) (plot.width() / cellWidth);
    int rows = (int) (plot.height() / cellHeight);
    // A border of cells that are not free surrounds the area.
    int[][] free = new int[rows + 2][columns + 2];
    for (int row = 1; row <= rows; row++) {
      double y = plot.y() + (row - 0.5) * cellHeight;
      double[] crossings = crossings(corners, y);
      for (int column = 1; column <= columns; column++) {
        double x = plot.x() + (column - 0.5) * cellWidth;
        Rect cell = new Rect(x - cellWidth / 2, y - cellHeight / 2, cellWidth, cellHeight);
        free[row][column] = isInside(crossings, x) && occupancy.taken(cell) == 0 ? 1 : 0;
      }
    }
    int[] best = farthest(free);
    return best[2] <= PARTS / 2
        ? Optional.empty()
        : Optional.of(
            new double[] {
              plot.x() + (best[1] - 0.5) * cellWidth, plot.y() + (best[0] - 0.5) * cellHeight
            });
  }

  /** Row and column of the cell with the greatest distance from what is not free, and that. */
  private static int[] farthest(int[][] free) {
    int[] best = {0, 0, 0};
    int rows = free.length - 1;
    int columns = free[0].length - 1;
    int most = rows + columns;
    for (int row = 1; row < rows; row++) {
      for (int column = 1; column < columns; column++) {
        if (free[row][column] > 0) {
          int[] above = free[row - 1];
          int nearest = Math.min(above[column - 1], Math.min(above[column], above[column + 1]));
          free[row][column] = Math.min(most, Math.min(nearest, free[row][column - 1]) + 1);
        }
      }
    }
    for (int row = rows - 1; row > 0; row--) {
      for (int column = columns - 1; column > 0; column--) {
        int[] below = free[row + 1];
        int nearest = Math.min(below[column - 1], Math.min(below[column], below[column + 1]));
        int here = Math.min(free[row][column], Math.min(nearest, free[row][column + 1]) + 1);
        free[row][column] = here;
        if (here > best[2]) {
          best = new int[] {row, column, here};
        }
      }
    }
    return best;
  }

  /** Where a level line crosses an outline. */
  private static double[] crossings(double[] corners, double y) {
    double[] crossings = new double[corners.length / 2];
    int n = 0;
    double lastX = corners[corners.length - 2];
    double lastY = corners[corners.length - 1];
    for (int i = 0; i < corners.length; i += 2) {
      double x = corners[i];
      double here = corners[i + 1];
      if (here > y != lastY > y) {
        crossings[n++] = lastX + (y - lastY) / (here - lastY) * (x - lastX);
      }
      lastX = x;
      lastY = here;
    }
    return Arrays.copyOf(crossings, n);
  }

  private static boolean isInside(double[] crossings, double x) {
    boolean inside = false;
    for (double crossing : crossings) {
      inside ^= crossing < x;
    }
    return inside;
  }
}
