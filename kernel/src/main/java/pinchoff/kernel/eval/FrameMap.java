package pinchoff.kernel.eval;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import jdk.jshell.SourceCodeAnalysis.SnippetWrapper;

/** Leads from the stack frames of compiled cells back to the lines that their authors wrote. */
final class FrameMap {
  private static final String PACKAGE = "REPL.";

  private final Map<String, ClassLines> byClass = new ConcurrentHashMap<>();

  /** Whether a class was compiled from a cell. */
  static boolean isOfCell(String className) {
    return className.startsWith(PACKAGE);
  }

  /**
   * Notes where the lines of a class come from.
   *
   * @param wrapper what the compiler made of the unit; to be asked for when the class is loaded,
   *     because a later redefinition changes it
   * @param unit the unit
   * @param shift how far the compiled text starts before the unit's own text
   */
  void record(SnippetWrapper wrapper, CellUnit unit, int shift) {
    byClass.put(wrapper.fullClassName(), ClassLines.of(wrapper, unit, shift));
  }

  /** The unit that a class was compiled from. */
  Optional<CellUnit> unitOf(String className) {
    return find(className).map(ClassLines::unit);
  }

  /** The place in a cell that a frame stands for; the column is that of the line's first sign. */
  Optional<CellText.Place> placeOf(StackTraceElement frame) {
    return find(frame.getClassName()).map(lines -> lines.placeOf(frame.getLineNumber()));
  }

  private Optional<ClassLines> find(String className) {
    String name = className;
    while (isOfCell(name)) {
      ClassLines lines = byClass.get(name);
      if (lines != null) {
        return Optional.of(lines);
      }
      name = name.substring(0, Math.max(0, name.lastIndexOf('$')));
    }
    return Optional.empty();
  }

  /** Lines of a compiled class to offsets in its unit. */
  private record ClassLines(CellUnit unit, TreeMap<Integer, Integer> offsets) {

    static ClassLines of(SnippetWrapper wrapper, CellUnit unit, int shift) {
      int[] starts = lineStarts(wrapper.wrapped());
      String source = wrapper.source();
      TreeMap<Integer, Integer> offsets = new TreeMap<>();
      int start = 0;
      while (start < source.length()) {
        int sign = start;
        while (sign < source.length() && Character.isWhitespace(source.charAt(sign))) {
          sign++;
        }
        int end = source.indexOf('\n', sign);
        end = end < 0 ? source.length() : end;
        int at = firstMapped(wrapper, sign, end);
        if (at >= 0) {
          int position = wrapper.sourceToWrappedPosition(at);
          offsets.putIfAbsent(lineAt(starts, position), sign + shift);
        }
        start = end + 1;
      }
      return new ClassLines(unit, offsets);
    }

    /** Offsets at which the lines of a text start. */
    private static int[] lineStarts(String text) {
      return IntStream.concat(
              IntStream.of(0),
              IntStream.range(0, text.length()).filter(i -> text.charAt(i) == '\n').map(i -> i + 1))
          .toArray();
    }

    private static int lineAt(int[] starts, int position) {
      int found = Arrays.binarySearch(starts, position);
      return found >= 0 ? found + 1 : -found - 1;
    }

    /**
     * Declarations are taken apart: the first offset of a line that the compiled text still has.
     */
    private static int firstMapped(SnippetWrapper wrapper, int from, int to) {
      for (int i = from; i < to; i++) {
        int there = wrapper.sourceToWrappedPosition(i);
        if (there >= 0 && wrapper.wrappedToSourcePosition(there) == i) {
          return i;
        }
      }
      return -1;
    }

    CellText.Place placeOf(int line) {
      Map.Entry<Integer, Integer> nearest = offsets.floorEntry(line);
      if (nearest == null) {
        nearest = offsets.firstEntry();
      }
      return unit.placeAt(nearest == null ? 0 : nearest.getValue());
    }
  }
}
