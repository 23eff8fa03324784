package pinchoff.technology;

/**
 * A stretch of a file, as offsets. Line and column are worked out only for what is reported, since
 * that takes a walk along the line.
 *
 * @param start the first UTF-16 unit
 * @param end the one after the last
 */
record Place(int start, int end) {

  /** Of what does not come from a file. */
  static final Place NONE = new Place(0, 0);

  /** A part of it, both ends counted from its start and kept within it. */
  Place part(int from, int to) {
    int first = Math.min(end, start + from);
    return new Place(first, Math.max(first, Math.min(end, start + to)));
  }
}
