package pinchoff.chart;

import java.util.Arrays;

/**
 * Thins a run of points on the page without changing what is seen.
 *
 * <p>First, of all points in a row that fall into the same narrow column only the first, the
 * lowest, the highest and the last are kept. Then those are left out that lie on the straight line
 * between their neighbours (Douglas and Peucker, "Algorithms for the reduction of the number of
 * points required to represent a digitized line or its caricature", Cartographica 10, 1973).
 */
final class Thinner {
  /** Width of a column in CSS pixels: half a pixel of the image. */
  private static final double COLUMN = 0.25;

  /** How far a point may lie from the line that replaces it, in CSS pixels. */
  private static final double TOLERANCE = 0.04;

  /** Lines are thinned this many points at a time, which bounds the work on noise. */
  private static final int STRETCH = 1000;

  private double[] kept = new double[64];
  private int count;

  private double column = Double.NaN;
  private final double[] extremes = new double[8]; // first, lowest, highest, last
  private boolean lowestFirst;
  private int inColumn;

  void add(double x, double y) {
    double here = Math.floor(x / COLUMN);
    if (inColumn == 0 || here != column) {
      endColumn();
      column = here;
      for (int i = 0; i < 8; i += 2) {
        extremes[i] = x;
        extremes[i + 1] = y;
      }
      inColumn = 1;
      return;
    }
    inColumn++;
    set(3, x, y);
    if (y < extremes[3]) {
      set(1, x, y);
      lowestFirst = false;
    }
    if (y > extremes[5]) {
      set(2, x, y);
      lowestFirst = true;
    }
  }

  private void set(int which, double x, double y) {
    extremes[2 * which] = x;
    extremes[2 * which + 1] = y;
  }

  private void endColumn() {
    if (inColumn > 0) {
      keep(0);
      keep(lowestFirst ? 1 : 2);
      keep(lowestFirst ? 2 : 1);
      keep(3);
    }
    inColumn = 0;
  }

  private void keep(int which) {
    double x = extremes[2 * which];
    double y = extremes[2 * which + 1];
    if (count >= 2 && kept[count - 2] == x && kept[count - 1] == y) {
      return;
    }
    if (count == kept.length) {
      kept = Arrays.copyOf(kept, 2 * count);
    }
    kept[count++] = x;
    kept[count++] = y;
  }

  /** The thinned points as x and y in turn. */
  double[] points() {
    endColumn();
    int n = count / 2;
    if (n < 3) {
      return Arrays.copyOf(kept, count);
    }
    boolean[] needed = new boolean[n];
    for (int from = 0; from < n - 1; from += STRETCH) {
      straighten(from, Math.min(n - 1, from + STRETCH), needed);
    }
    double[] thin = new double[count];
    int size = 0;
    for (int i = 0; i < n; i++) {
      if (needed[i]) {
        thin[size++] = kept[2 * i];
        thin[size++] = kept[2 * i + 1];
      }
    }
    return Arrays.copyOf(thin, size);
  }

  /** Marks the points that are needed between two, and these. */
  private void straighten(int from, int to, boolean[] needed) {
    needed[from] = true;
    needed[to] = true;
    double farthest = TOLERANCE;
    int split = -1;
    for (int i = from + 1; i < to; i++) {
      double distance = distance(i, from, to);
      if (distance > farthest) {
        farthest = distance;
        split = i;
      }
    }
    if (split >= 0) {
      straighten(from, split, needed);
      straighten(split, to, needed);
    }
  }

  /** How far a point lies from the stretch between two others. */
  private double distance(int i, int from, int to) {
    double ax = kept[2 * from];
    double ay = kept[2 * from + 1];
    double dx = kept[2 * to] - ax;
    double dy = kept[2 * to + 1] - ay;
    double px = kept[2 * i] - ax;
    double py = kept[2 * i + 1] - ay;
    double squared = dx * dx + dy * dy;
    double along = squared == 0 ? 0 : Math.max(0, Math.min(1, (px * dx + py * dy) / squared));
    double ex = px - along * dx;
    double ey = py - along * dy;
    return Math.sqrt(ex * ex + ey * ey);
  }
}
