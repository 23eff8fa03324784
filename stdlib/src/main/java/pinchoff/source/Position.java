package pinchoff.source;

/**
 * One place in a text.
 *
 * @param offset UTF-16 units from the start of the text, from 0
 * @param line line, from 1
 * @param column code points from the start of the line, from 1
 */
public record Position(int offset, int line, int column) implements Comparable<Position> {

  /** Checks that all three are in range. */
  public Position {
    if (offset < 0 || line < 1 || column < 1) {
      throw new IllegalArgumentException(
          "position offset "
              + offset
              + ", line "
              + line
              + ", column "
              + column
              + ": expected 0 or more, 1 or more, 1 or more");
    }
  }

  @Override
  public int compareTo(Position other) {
    return Integer.compare(offset, other.offset);
  }

  /** Line and column as {@code "4:12"}. */
  @Override
  public String toString() {
    return line + ":" + column;
  }
}
