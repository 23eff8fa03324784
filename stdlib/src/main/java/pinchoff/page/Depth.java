package pinchoff.page;

/** Refuses trees that are nested deeper than any reader of the result would follow. */
final class Depth {
  private Depth() {}

  static int deeper(int depth) {
    if (depth >= Relation.MAX_DEPTH) {
      throw new IllegalArgumentException(
          "a relation is nested deeper than " + Relation.MAX_DEPTH + " levels");
    }
    return depth + 1;
  }
}
