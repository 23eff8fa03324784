package pinchoff.kernel.eval;

import java.util.ArrayList;
import java.util.List;
import jdk.jshell.SourceCodeAnalysis;
import jdk.jshell.SourceCodeAnalysis.CompletionInfo;

/** Cuts a cell into the units that the compiler takes one at a time. */
final class CellSplitter {
  private static final int FIRST_WINDOW = 1000;

  private final SourceCodeAnalysis analysis;

  CellSplitter(SourceCodeAnalysis analysis) {
    this.analysis = analysis;
  }

  /**
   * The units in order. What cannot be cut any further because it is not Java comes as one unit.
   */
  List<CellUnit> split(CellText cell) {
    List<CellUnit> units = new ArrayList<>();
    String code = cell.code();
    int at = 0;
    while (at < code.length()) {
      Window window = windowFrom(code, at);
      String rest = window.text();
      CompletionInfo info = window.info();
      if (isEmpty(rest, info)) {
        break;
      }
      int length = lengthOfFirst(rest, info);
      String text = rest.substring(0, length);
      int leading = leadingNoise(text);
      if (leading < length) {
        String body = text.substring(leading);
        boolean broken =
            !info.completeness().isComplete()
                && info.completeness() != SourceCodeAnalysis.Completeness.EMPTY;
        CellUnit.Kind kind = broken ? CellUnit.Kind.BROKEN : CellUnit.Kind.ALONE;
        String closing =
            info.completeness() == SourceCodeAnalysis.Completeness.COMPLETE_WITH_SEMI ? ";" : "";
        units.add(new CellUnit(cell, at + leading, body, closing, kind));
      }
      at += length;
    }
    return units;
  }

  /** A stretch of code and what the analyser says of its first unit. */
  private record Window(String text, CompletionInfo info) {}

  /**
   * As much of the code as is needed to see where its first unit ends. The analyser reads all that
   * it is given for each unit, which a long cell would make slow.
   */
  private Window windowFrom(String code, int at) {
    for (int size = FIRST_WINDOW; at + size < code.length(); size *= 4) {
      int cut = code.lastIndexOf('\n', at + size);
      if (cut <= at) {
        continue;
      }
      String window = code.substring(at, cut);
      CompletionInfo info = analysis.analyzeCompletion(window);
      boolean nextSeen =
          info.completeness().isComplete() && !JavaText.masked(info.remaining()).isBlank();
      if (nextSeen) {
        return new Window(window, info);
      }
    }
    String rest = code.substring(at);
    return new Window(rest, analysis.analyzeCompletion(rest));
  }

  private static boolean isEmpty(String rest, CompletionInfo info) {
    return info.completeness() == SourceCodeAnalysis.Completeness.EMPTY
        || JavaText.masked(rest).isBlank();
  }

  private static int lengthOfFirst(String rest, CompletionInfo info) {
    String remaining = info.remaining();
    if (!info.completeness().isComplete() || remaining.length() >= rest.length()) {
      return rest.length();
    }
    return rest.length() - remaining.length();
  }

  /** Spaces, comments and lone semicolons before the unit. */
  private static int leadingNoise(String text) {
    String masked = JavaText.masked(text);
    int i = 0;
    while (i < masked.length()
        && (Character.isWhitespace(masked.charAt(i)) || masked.charAt(i) == ';')) {
      i++;
    }
    return i;
  }
}
