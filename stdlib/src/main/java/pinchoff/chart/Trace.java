package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import pinchoff.drawing.Path;
import pinchoff.drawing.Rect;

/**
 * A curve on the page: its visible pieces, thinned to what the eye can tell apart.
 *
 * @param pieces runs of points, each as x and y in turn
 */
record Trace(List<double[]> pieces) {

  /** How far beyond the plotting area curves are still drawn, so that their ends are cut clean. */
  private static final double OVERHANG = 4;

  static Trace of(Points points, Scale x, Scale y, Rect plot) {
    Collector collector = new Collector(plot.grown(OVERHANG));
    for (int i = 0; i < points.size(); i++) {
      double px = x.at(points.x(i));
      double py = y.at(points.y(i));
      if (Double.isNaN(px + py)) {
        collector.gap();
      } else {
        collector.add(px, py);
      }
    }
    collector.gap();
    return new Trace(collector.pieces);
  }

  boolean isEmpty() {
    return pieces.isEmpty();
  }

  /** The path to stroke; pieces of a single point are left out. */
  Path path() {
    Path.Builder path = Path.builder();
    for (double[] piece : pieces) {
      if (piece.length > 2) {
        path.moveTo(piece[0], piece[1]);
        for (int i = 2; i < piece.length; i += 2) {
          path.lineTo(piece[i], piece[i + 1]);
        }
      }
    }
    return path.build();
  }

  /** Points that stand alone between gaps. */
  List<double[]> singles() {
    return pieces.stream().filter(piece -> piece.length == 2).toList();
  }

  /** Cuts at the window, then thins. */
  private static final class Collector {
    private final Rect window;
    private final List<double[]> pieces = new ArrayList<>();
    private Thinner piece = new Thinner();
    private double lastX = Double.NaN;
    private double lastY = Double.NaN;

    Collector(Rect window) {
      this.window = window;
    }

    void gap() {
      endPiece();
      lastX = Double.NaN;
    }

    private void endPiece() {
      double[] points = piece.points();
      if (points.length > 0) {
        pieces.add(points);
        piece = new Thinner();
      }
    }

    void add(double x, double y) {
      if (Double.isNaN(lastX)) {
        if (window.contains(x, y)) {
          piece.add(x, y);
        }
      } else if (window.contains(x, y) && window.contains(lastX, lastY)) {
        piece.add(x, y);
      } else {
        addCut(x, y);
      }
      lastX = x;
      lastY = y;
    }

    /** A step of which a part lies outside the window. */
    private void addCut(double x, double y) {
      Window.cut(window, lastX, lastY, x, y)
          .ifPresent(
              seen -> {
                if (!window.contains(lastX, lastY)) {
                  endPiece();
                  piece.add(seen[0], seen[1]);
                }
                piece.add(seen[2], seen[3]);
              });
      if (!window.contains(x, y)) {
        endPiece();
      }
    }
  }
}
