package pinchoff.kernel.eval;

/**
 * A piece of a cell that is evaluated at once: a declaration, a statement or an expression.
 *
 * @param cell the cell that it comes from
 * @param start where it starts in the cell
 * @param text its source
 * @param closing what the compiler wants after it and its author may leave out: a semicolon or
 *     nothing
 * @param kind what it is
 */
record CellUnit(CellText cell, int start, String text, String closing, Kind kind) {

  /** What a unit is, as far as its text alone tells. */
  enum Kind {
    /** A statement that declares nothing, so that neighbours can be compiled with it. */
    PLAIN,
    /** Declarations, imports, expressions: evaluated alone. */
    ALONE,
    /** Not Java as it stands. */
    BROKEN
  }

  int end() {
    return start + text.length();
  }

  /** What the compiler gets; the closing stands on a line of its own, behind any comment. */
  String compilable() {
    return closing.isEmpty() ? text : text + "\n" + closing;
  }

  /** Whether the author wants to see its value: it does not end in a semicolon. */
  boolean showsValue() {
    return JavaText.lastOf(text) != ';';
  }

  CellText.Place placeAt(int offsetInUnit) {
    return cell.placeAt(start + Math.max(0, Math.min(offsetInUnit, text.length())));
  }

  CellUnit as(Kind newKind) {
    return new CellUnit(cell, start, text, closing, newKind);
  }
}
