package pinchoff.drawing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The at most 256 colours of an image.
 *
 * <p>A picture of few inks has few colours; the rest are shades on the edges of lines. The most
 * frequent colours are kept as they are, each rare shade becomes the nearest of them: a difference
 * of a few steps in single pixels, which nobody sees.
 */
final class ColourTable {
  private static final int MOST = 256;

  private final int[] colours;
  private final Map<Integer, Byte> indices;

  private ColourTable(int[] colours, Map<Integer, Byte> indices) {
    this.colours = colours;
    this.indices = indices;
  }

  static ColourTable of(int[] pixels) {
    List<Map.Entry<Integer, Integer>> byFrequency = new ArrayList<>(counts(pixels).entrySet());
    byFrequency.sort(
        Comparator.comparingInt((Map.Entry<Integer, Integer> e) -> -e.getValue())
            .thenComparing(Map.Entry::getKey));
    int size = Math.min(MOST, byFrequency.size());
    int[] colours = new int[size];
    Map<Integer, Byte> indices = new HashMap<>();
    for (int i = 0; i < byFrequency.size(); i++) {
      int colour = byFrequency.get(i).getKey();
      if (i < size) {
        colours[i] = colour;
      }
      indices.put(colour, (byte) (i < size ? i : nearest(colours, colour)));
    }
    return new ColourTable(colours, indices);
  }

  private static Map<Integer, Integer> counts(int[] pixels) {
    Map<Integer, Integer> counts = new HashMap<>();
    int from = 0;
    for (int i = 1; i <= pixels.length; i++) {
      if (i == pixels.length || pixels[i] != pixels[from]) {
        counts.merge(pixels[from], i - from, Integer::sum);
        from = i;
      }
    }
    return counts;
  }

  private static int nearest(int[] colours, int colour) {
    int best = 0;
    int bestDistance = Integer.MAX_VALUE;
    for (int i = 0; i < colours.length; i++) {
      int red = (colours[i] >> 16) - (colour >> 16);
      int green = (colours[i] >> 8 & 0xFF) - (colour >> 8 & 0xFF);
      int blue = (colours[i] & 0xFF) - (colour & 0xFF);
      int distance = 3 * red * red + 4 * green * green + 2 * blue * blue;
      if (distance < bestDistance) {
        bestDistance = distance;
        best = i;
      }
    }
    return best;
  }

  /** Where a colour of the image, or its nearest, stands in the table. */
  byte index(int colour) {
    return indices.getOrDefault(colour, (byte) 0);
  }

  /** Red, green and blue of each colour. */
  byte[] bytes() {
    byte[] bytes = new byte[3 * colours.length];
    for (int i = 0; i < colours.length; i++) {
      bytes[3 * i] = (byte) (colours[i] >> 16);
      bytes[3 * i + 1] = (byte) (colours[i] >> 8);
      bytes[3 * i + 2] = (byte) colours[i];
    }
    return bytes;
  }
}
