package pinchoff.source;

/**
 * A stretch of a text, from a place up to but not including another. Both may be equal: an empty
 * span marks a gap, for example where something is missing.
 *
 * @param start the first place
 * @param end the place after the last
 */
public record SourceSpan(Position start, Position end) implements Comparable<SourceSpan> {

  /** Checks the order of the two ends. */
  public SourceSpan {
    if (end.compareTo(start) < 0) {
      throw new IllegalArgumentException("span from " + start + " back to " + end);
    }
  }

  /** Spans are in the order of their starts, shorter ones first. */
  @Override
  public int compareTo(SourceSpan other) {
    int byStart = start.compareTo(other.start);
    return byStart != 0 ? byStart : end.compareTo(other.end);
  }

  /** The start, as {@code "4:12"}. */
  @Override
  public String toString() {
    return start.toString();
  }
}
