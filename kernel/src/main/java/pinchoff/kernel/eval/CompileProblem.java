package pinchoff.kernel.eval;

import java.util.Locale;
import java.util.regex.Pattern;
import jdk.jshell.Diag;

/**
 * What the compiler says about a unit.
 *
 * @param error whether it is an error and not a warning
 * @param code the compiler's name for this kind of problem
 * @param message the text for the reader
 * @param unit the unit
 * @param offset where in the unit
 */
record CompileProblem(boolean error, String code, String message, CellUnit unit, int offset) {
  /** A cell is compiled in a class without a name, which says nothing to the reader. */
  private static final Pattern NO_LOCATION =
      Pattern.compile("^\\s*location: class\\s*(REPL\\S*)?$");

  private static final Pattern COMPILER_CLASS = Pattern.compile("\\bREPL\\.\\$JShell\\$\\w+\\.");

  static CompileProblem of(Diag diag, CellUnit unit, int shift) {
    long position = diag.getPosition();
    if (position == Diag.NOPOS || position < diag.getStartPosition()) {
      position = Math.max(0, diag.getStartPosition());
    }
    String message = cleaned(diag.getMessage(Locale.ROOT));
    return new CompileProblem(
        diag.isError(), diag.getCode(), message, unit, (int) position + shift);
  }

  CellText.Place place() {
    return unit.placeAt(offset);
  }

  private static String cleaned(String message) {
    StringBuilder kept = new StringBuilder();
    for (String line : message.lines().toList()) {
      if (NO_LOCATION.matcher(line).matches()) {
        continue;
      }
      String text = COMPILER_CLASS.matcher(line).replaceAll("").strip();
      String separator = kept.isEmpty() ? "" : text.startsWith("symbol:") ? ": " : "\n";
      kept.append(separator).append(text.replaceFirst("^symbol: +", ""));
    }
    return kept.toString();
  }
}
