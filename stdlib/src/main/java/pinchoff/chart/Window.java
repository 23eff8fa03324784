package pinchoff.chart;

import java.util.Optional;
import pinchoff.drawing.Rect;

/** Cuts lines and areas at the edges of a rectangle, in full precision. */
final class Window {
  private Window() {}

  /**
   * The part of a line that lies inside (Liang and Barsky, "A New Concept and Method for Line
   * Clipping", ACM Transactions on Graphics 3, 1984).
   *
   * @return both ends as x, y, x, y
   */
  static Optional<double[]> cut(Rect window, double x1, double y1, double x2, double y2) {
    double dx = x2 - x1;
    double dy = y2 - y1;
    double[] towards = {-dx, dx, -dy, dy};
    double[] room = {x1 - window.x(), window.right() - x1, y1 - window.y(), window.bottom() - y1};
    double in = 0;
    double out = 1;
    for (int side = 0; side < 4; side++) {
      if (towards[side] == 0) {
        if (room[side] < 0) {
          return Optional.empty();
        }
      } else {
        double at = room[side] / towards[side];
        if (towards[side] < 0) {
          in = Math.max(in, at);
        } else {
          out = Math.min(out, at);
        }
      }
    }
    if (!(in <= out)) {
      return Optional.empty();
    }
    return Optional.of(
        new double[] {
          within(x1 + in * dx, window.x(), window.right()),
          within(y1 + in * dy, window.y(), window.bottom()),
          within(x1 + out * dx, window.x(), window.right()),
          within(y1 + out * dy, window.y(), window.bottom())
        });
  }

  /** Steps of enormous length lose digits: the result is held inside all the same. */
  private static double within(double value, double low, double high) {
    return Math.max(low, Math.min(high, value));
  }

  /**
   * The part of an area that lies inside (Sutherland and Hodgman, "Reentrant Polygon Clipping",
   * Communications of the ACM 17, 1974).
   *
   * @param corners x and y in turn
   */
  static double[] cut(Rect window, double[] corners) {
    double[] left = side(corners, 0, window.x(), 1);
    double[] right = side(left, 0, window.right(), -1);
    double[] top = side(right, 1, window.y(), 1);
    return side(top, 1, window.bottom(), -1);
  }

  /** Keeps what lies on one side of a level or upright line. */
  private static double[] side(double[] corners, int axis, double edge, int inward) {
    double[] kept = new double[2 * corners.length + 4];
    int n = 0;
    int count = corners.length / 2;
    for (int i = 0; i < count; i++) {
      int before = (i + count - 1) % count;
      double here = (corners[2 * i + axis] - edge) * inward;
      double there = (corners[2 * before + axis] - edge) * inward;
      if (here >= 0 != there >= 0) {
        double share = there / (there - here);
        double across = corners[2 * before + 1 - axis];
        across += share * (corners[2 * i + 1 - axis] - across);
        kept[n + axis] = edge;
        kept[n + 1 - axis] = across;
        n += 2;
      }
      if (here >= 0) {
        kept[n] = corners[2 * i];
        kept[n + 1] = corners[2 * i + 1];
        n += 2;
      }
    }
    return java.util.Arrays.copyOf(kept, n);
  }
}
