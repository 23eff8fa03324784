package pinchoff.kernel.eval;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Advice on mistakes that those make who design circuits more often than they write Java. */
final class Hints {
  private static final Pattern NUMBER_WITH_UNIT =
      Pattern.compile(
          "(?<![\\w.])(\\d+(?:\\.\\d+)?)\\s*([munpkM\u00b5\u03bc]?[VAWFHSs\u03a9]|[munpkM]?ohm|[mkMG]?Hz)\\b");
  private static final Pattern UNKNOWN =
      Pattern.compile("cannot find symbol: (class|variable|method) (\\w+).*", Pattern.DOTALL);
  private static final Pattern BAD_OPERANDS =
      Pattern.compile(
          "bad operand types? for (?:binary|unary) operator '(.{1,3})'.*", Pattern.DOTALL);

  private Hints() {}

  /** A sentence that helps, if one is known. */
  static Optional<String> on(CompileProblem problem) {
    String line = JavaText.masked(problem.unit().cell().code());
    CellText.Place place = problem.place();
    line = line.lines().skip(place.line() - 1L).findFirst().orElse("");
    return onUnitsAndPowers(problem, line).or(() -> onNames(problem)).or(() -> onSyntax(problem));
  }

  private static Optional<String> onUnitsAndPowers(CompileProblem problem, String line) {
    Matcher unit = NUMBER_WITH_UNIT.matcher(line);
    if (unit.find()) {
      return Optional.of(
          "a quantity is written as a call, "
              + unit.group(2)
              + "("
              + unit.group(1)
              + "), or as text, \""
              + unit.group(1)
              + " "
              + unit.group(2)
              + "\"");
    }
    Matcher operands = BAD_OPERANDS.matcher(problem.message());
    if (!operands.matches()) {
      return Optional.empty();
    }
    return switch (operands.group(1)) {
      case "+" -> Optional.of("quantities are added with a.plus(b)");
      case "-" -> Optional.of("quantities are subtracted with a.minus(b)");
      case "*" -> Optional.of("quantities are multiplied with a.times(b)");
      case "/" -> Optional.of("quantities are divided with a.per(b)");
      case "^" ->
          Optional.of("^ is no power in Java: use Math.pow(a, b), or a.pow(b) of a quantity");
      case "<", ">", "<=", ">=" -> Optional.of("quantities are compared with a.compareTo(b)");
      default -> Optional.empty();
    };
  }

  private static Optional<String> onNames(CompileProblem problem) {
    Matcher unknown = UNKNOWN.matcher(problem.message());
    if (!unknown.matches()) {
      return Optional.empty();
    }
    String name = unknown.group(2);
    return switch (unknown.group(1)) {
      case "class" -> Optional.of("if " + name + " is a type of a library, import it first");
      case "variable" ->
          Optional.of(
              name.matches("\\p{Lu}\\w*\\p{Ll}\\w*")
                  ? "if " + name + " is a type of a library, import it first"
                  : "is it declared in a cell that has run? A text needs quotes: \"" + name + "\"");
      default -> Optional.empty();
    };
  }

  private static Optional<String> onSyntax(CompileProblem problem) {
    String message = problem.message();
    if (message.startsWith("';' expected")) {
      return Optional.of("each statement but the last of a cell ends with a semicolon");
    }
    if (problem.code().endsWith("unclosed.char.lit")) {
      return Optional.of("a text is written in double quotes");
    }
    return Optional.empty();
  }
}
