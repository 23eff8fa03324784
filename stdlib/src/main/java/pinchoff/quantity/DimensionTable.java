package pinchoff.quantity;

/**
 * Finds the one instance of a dimension, without allocation and without locks once it exists.
 *
 * <p>An open-addressed table of fixed size. Slots are read without synchronization: a dimension has
 * only final fields, so a reader sees either nothing or all of it. When the table is half full,
 * further dimensions are made afresh each time; they are equal, only slower.
 */
final class DimensionTable {
  private static final int SIZE = 1 << 12;

  private final Dimension[] slots = new Dimension[SIZE];
  private int count;

  Dimension get(long packed) {
    for (int i = hash(packed) & (SIZE - 1); ; i = (i + 1) & (SIZE - 1)) {
      Dimension found = slots[i];
      if (found == null) {
        return add(new Dimension(packed).requireAllowed());
      }
      if (found.packed() == packed) {
        return found;
      }
    }
  }

  private synchronized Dimension add(Dimension dimension) {
    int i = hash(dimension.packed()) & (SIZE - 1);
    while (slots[i] != null) {
      if (slots[i].packed() == dimension.packed()) {
        return slots[i];
      }
      i = (i + 1) & (SIZE - 1);
    }
    if (count < SIZE / 2) {
      slots[i] = dimension;
      count++;
    }
    return dimension;
  }

  static int hash(long packed) {
    long mixed = packed * 0x9E3779B97F4A7C15L;
    return (int) (mixed >>> 32);
  }
}
