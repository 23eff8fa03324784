package pinchoff.kernel.review;

/**
 * Something that a reviewer has to know.
 *
 * @param kind what sort of thing it is
 * @param cell the place of the cell among the code cells, from 1; 0 for the notebook as a whole
 * @param what the value, file or cell that it is about
 * @param message the sentence
 */
public record Finding(Kind kind, int cell, String what, String message) {

  /** Sorts of findings, causes before effects. */
  public enum Kind {
    /** A technology file states something else now. */
    TECHNOLOGY("technology changed"),
    /** A premise has another value now. */
    PREMISE("premise changed"),
    /** A formula, limit or tolerance is another one now. */
    PROMISE("promise changed"),
    /** A value differs by more than its tolerance. */
    MOVED("moved"),
    /** A check came out otherwise. */
    VERDICT("verdict changed"),
    /** A spec or check does not hold now. */
    BROKEN("does not hold"),
    /** A cell failed or did not run. */
    CELL("cell failed"),
    /** A value is not there any more. */
    GONE("gone"),
    /** A value was not there before. */
    ADDED("added"),
    /** One id stands for several values. */
    REPEATED("name used twice"),
    /** The cell prints something else. */
    TEXT("text changed"),
    /** The notebook stores nothing to compare with. */
    NOTHING("nothing stored");

    private final String words;

    Kind(String words) {
      this.words = words;
    }

    /** The kind in words. */
    public String words() {
      return words;
    }
  }

  @Override
  public String toString() {
    return (cell > 0 ? "cell " + cell + ": " : "") + kind.words() + ": " + message;
  }
}
