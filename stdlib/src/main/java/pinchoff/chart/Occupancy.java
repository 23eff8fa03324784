package pinchoff.chart;

import pinchoff.drawing.Rect;

/** Which parts of the plotting area are taken by curves and labels, on a fine grid. */
final class Occupancy {
  private static final double CELL = 3;
  private static final double STEP = 2;

  private final Rect plot;
  private final int columns;
  private final int rows;
  private final byte[] taken;

  Occupancy(Rect plot) {
    this.plot = plot;
    this.columns = (int) Math.ceil(plot.width() / CELL);
    this.rows = (int) Math.ceil(plot.height() / CELL);
    this.taken = new byte[columns * rows];
  }

  void add(Trace trace) {
    for (double[] piece : trace.pieces()) {
      for (int i = 0; i < piece.length; i += 2) {
        int next = Math.min(i + 2, piece.length - 2);
        addLine(piece[i], piece[i + 1], piece[next], piece[next + 1]);
      }
    }
  }

  /** Takes the places of dots. */
  void add(Stage.Actor dots, Stage stage) {
    Points points = ((Dots) dots.item()).points();
    for (int i = 0; i < points.size(); i++) {
      addPoint(stage.x().at(points.x(i)), stage.left().at(points.y(i)));
    }
  }

  private void addLine(double x1, double y1, double x2, double y2) {
    double length = Math.max(Math.abs(x2 - x1), Math.abs(y2 - y1));
    int steps = (int) Math.ceil(length / STEP);
    for (int i = 0; i <= steps; i++) {
      double share = steps == 0 ? 0 : (double) i / steps;
      addPoint(x1 + share * (x2 - x1), y1 + share * (y2 - y1));
    }
  }

  private void addPoint(double x, double y) {
    int column = (int) Math.floor((x - plot.x()) / CELL);
    int row = (int) Math.floor((y - plot.y()) / CELL);
    if (column >= 0 && column < columns && row >= 0 && row < rows) {
      taken[row * columns + column] = 1;
    }
  }

  /** Takes a whole rectangle, such as that of a label. */
  void add(Rect area) {
    for (int row = first(area.y() - plot.y()); row <= last(area.bottom() - plot.y(), rows); row++) {
      for (int column = first(area.x() - plot.x());
          column <= last(area.right() - plot.x(), columns);
          column++) {
        taken[row * columns + column] = 1;
      }
    }
  }

  /** How much of an area is taken, from 0 to 1; 1 if it does not lie in the plotting area. */
  double taken(Rect area) {
    if (!plot.contains(area)) {
      return 1;
    }
    int hits = 0;
    int all = 0;
    for (int row = first(area.y() - plot.y()); row <= last(area.bottom() - plot.y(), rows); row++) {
      for (int column = first(area.x() - plot.x());
          column <= last(area.right() - plot.x(), columns);
          column++) {
        hits += taken[row * columns + column];
        all++;
      }
    }
    return all == 0 ? 1 : (double) hits / all;
  }

  private static int first(double offset) {
    return Math.max(0, (int) Math.floor(offset / CELL));
  }

  private static int last(double offset, int count) {
    return Math.min(count - 1, (int) Math.floor(offset / CELL));
  }
}
