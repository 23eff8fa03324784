package pinchoff.source;

/**
 * A line of a source with carets under a span. A long line is shown as a window around the start of
 * the span.
 */
final class CaretLine {
  private static final int BEFORE = 60;
  private static final int WIDTH = 100;
  private static final String INDENT = "  ";

  private CaretLine() {}

  static String of(SourceText source, SourceSpan span) {
    int[] line = source.line(span.start().line()).codePoints().limit(limit(span)).toArray();
    int column = Math.min(span.start().column() - 1, line.length);
    int from = column > BEFORE + 1 ? column - BEFORE : 0;
    int to = Math.min(line.length, from + WIDTH);
    StringBuilder shown = new StringBuilder(INDENT);
    StringBuilder carets = new StringBuilder(INDENT);
    if (from > 0) {
      shown.append('…');
      carets.append(' ');
    }
    for (int i = from; i < to; i++) {
      shown.appendCodePoint(Excerpt.harmless(line[i]));
    }
    if (to < line.length) {
      shown.append('…');
    }
    carets.append(" ".repeat(column - from)).append("^".repeat(carets(span, column, to)));
    return shown + "\n" + carets;
  }

  /** Code points of the line that can matter, so that a line of a megabyte is not copied. */
  private static long limit(SourceSpan span) {
    return (long) span.start().column() + WIDTH;
  }

  private static int carets(SourceSpan span, int column, int to) {
    boolean oneLine = span.start().line() == span.end().line();
    int wanted = oneLine ? span.end().column() - span.start().column() : to - column;
    return Math.max(1, Math.min(wanted, to - column));
  }
}
