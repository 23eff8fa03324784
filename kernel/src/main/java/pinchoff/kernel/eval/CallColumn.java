package pinchoff.kernel.eval;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/**
 * Guesses the column of a failure. A stack frame knows its line only; but the next inner frame, or
 * the exception's own name, often names what that line was doing.
 */
final class CallColumn {
  private CallColumn() {}

  /** The place with the column of the one call on its line that leads inwards, if there is one. */
  static CellText.Place refine(
      CellText.Place place, @Nullable StackTraceElement inner, Throwable thrown) {
    String line = JavaText.masked(place.sourceLine());
    String wanted;
    if (inner == null) {
      wanted =
          "\\bthrow\\b.*|\\bnew\\s+" + Pattern.quote(thrown.getClass().getSimpleName()) + "\\b";
      if (thrown instanceof ArithmeticException) {
        wanted = "[/%]";
      }
    } else if (inner.getMethodName().equals("<init>")) {
      String type = inner.getClassName();
      wanted =
          "\\bnew\\s+(?:\\w+\\.)*"
              + Pattern.quote(
                  type.substring(1 + Math.max(type.lastIndexOf('.'), type.lastIndexOf('$'))))
              + "\\b";
    } else {
      wanted = "\\b" + Pattern.quote(inner.getMethodName()) + "\\s*\\(";
    }
    Matcher matcher = Pattern.compile(wanted).matcher(line);
    if (!matcher.find()) {
      return place;
    }
    int column = matcher.start() + 1;
    return matcher.find() ? place : place.withColumn(column);
  }
}
