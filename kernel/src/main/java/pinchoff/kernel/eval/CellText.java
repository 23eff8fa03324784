package pinchoff.kernel.eval;

import java.util.List;

/**
 * The source of one cell, able to name places in it.
 *
 * @param label how the reader knows it, for example "cell 3"
 * @param code its Java source
 */
record CellText(String label, String code) {

  static CellText of(Cell cell) {
    return new CellText("cell " + cell.number(), cell.code());
  }

  /** The place of an offset; offsets outside the text count as its nearest end. */
  Place placeAt(int offset) {
    int at = Math.max(0, Math.min(offset, code.length()));
    int lineStart = code.lastIndexOf('\n', at - 1) + 1;
    int lineEnd = code.indexOf('\n', at);
    int line = 1 + (int) code.substring(0, lineStart).chars().filter(c -> c == '\n').count();
    String text = code.substring(lineStart, lineEnd < 0 ? code.length() : lineEnd).stripTrailing();
    return new Place(label, line, at - lineStart + 1, text);
  }

  /** A place in a cell: line and column count from 1. */
  record Place(String label, int line, int column, String sourceLine) {

    /** For example "cell 3, line 2, column 5". */
    String inWords() {
      return label + ", line " + line + ", column " + column;
    }

    Place withColumn(int newColumn) {
      return new Place(label, line, newColumn, sourceLine);
    }

    /** The source line and under it a caret, both indented. */
    List<String> underlined() {
      StringBuilder caret = new StringBuilder("    ");
      for (int i = 0; i < column - 1; i++) {
        boolean tab = i < sourceLine.length() && sourceLine.charAt(i) == '\t';
        caret.append(tab ? '\t' : ' ');
      }
      return List.of("    " + sourceLine, caret + "^");
    }
  }
}
