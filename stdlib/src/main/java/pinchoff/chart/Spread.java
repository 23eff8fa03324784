package pinchoff.chart;

import java.util.Arrays;

/**
 * Moves places on a line apart, as little as possible in the sense of least squares (isotonic
 * regression by pooling neighbours that violate the order).
 */
final class Spread {
  private Spread() {}

  /**
   * Places with a least distance.
   *
   * @param wanted where they should be, ascending
   * @param distance between neighbours
   * @param low the lowest place
   * @param high the highest place; exceeded if there is no room
   */
  static double[] of(double[] wanted, double distance, double low, double high) {
    int n = wanted.length;
    double[] mean = new double[n];
    int[] size = new int[n];
    int blocks = 0;
    for (int i = 0; i < n; i++) {
      mean[blocks] = wanted[i] - i * distance;
      size[blocks] = 1;
      blocks++;
      while (blocks > 1 && mean[blocks - 2] > mean[blocks - 1]) {
        int both = size[blocks - 2] + size[blocks - 1];
        mean[blocks - 2] =
            (mean[blocks - 2] * size[blocks - 2] + mean[blocks - 1] * size[blocks - 1]) / both;
        size[blocks - 2] = both;
        blocks--;
      }
    }
    double[] places = new double[n];
    double top = Math.max(low, high - (n - 1) * distance);
    int at = 0;
    for (int block = 0; block < blocks; block++) {
      int end = at + size[block];
      Arrays.fill(places, at, end, Math.max(low, Math.min(top, mean[block])));
      at = end;
    }
    for (int i = 0; i < n; i++) {
      places[i] += i * distance;
    }
    return places;
  }
}
