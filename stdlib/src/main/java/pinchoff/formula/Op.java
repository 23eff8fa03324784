package pinchoff.formula;

import pinchoff.source.Excerpt;

/** One operation on doubles with its partial derivatives. One-sided at a kink. */
enum Op {
  CONSTANT,
  INPUT,
  NEGATE,
  PLUS,
  MINUS,
  TIMES,
  OVER,
  POWER,
  SQUARE,
  SQRT,
  EXP,
  LN,
  LOG10,
  ABS,
  MIN,
  MAX,
  PAR,
  SIN,
  COS,
  TAN,
  ASIN,
  ACOS,
  ATAN;

  private static final double LN10 = StrictMath.log(10);

  static Op of(Function function) {
    return valueOf(function.name());
  }

  static Op of(Operator operator) {
    return valueOf(operator.name());
  }

  boolean isBinary() {
    return switch (this) {
      case PLUS, MINUS, TIMES, OVER, POWER, MIN, MAX, PAR -> true;
      default -> false;
    };
  }

  double value(double a, double b) {
    return switch (this) {
      case NEGATE -> -a;
      case PLUS -> a + b;
      case MINUS -> a - b;
      case TIMES -> a * b;
      case OVER -> a / b;
      case POWER -> StrictMath.pow(a, b);
      case SQUARE -> a * a;
      case SQRT -> Math.sqrt(a);
      case EXP -> StrictMath.exp(a);
      case LN -> StrictMath.log(a);
      case LOG10 -> StrictMath.log10(a);
      case ABS -> Math.abs(a);
      case MIN -> Math.min(a, b);
      case MAX -> Math.max(a, b);
      case PAR -> a * b / (a + b);
      case SIN -> StrictMath.sin(a);
      case COS -> StrictMath.cos(a);
      case TAN -> StrictMath.tan(a);
      case ASIN -> StrictMath.asin(a);
      case ACOS -> StrictMath.acos(a);
      case ATAN -> StrictMath.atan(a);
      case CONSTANT, INPUT -> Double.NaN;
    };
  }

  /** Derivative to the left operand, given operands and value. */
  double byLeft(double a, double b, double value) {
    return switch (this) {
      case NEGATE -> -1;
      case PLUS, MINUS -> 1;
      case TIMES -> b;
      case OVER -> 1 / b;
      case POWER -> b == 0 ? 0 : b * StrictMath.pow(a, b - 1);
      case SQUARE -> 2 * a;
      case SQRT -> 0.5 / value;
      case EXP -> value;
      case LN -> 1 / a;
      case LOG10 -> 1 / (a * LN10);
      case ABS -> a < 0 ? -1 : 1;
      case MIN -> a <= b ? 1 : 0;
      case MAX -> a >= b ? 1 : 0;
      case PAR -> (b / (a + b)) * (b / (a + b));
      case SIN -> StrictMath.cos(a);
      case COS -> -StrictMath.sin(a);
      case TAN -> 1 + value * value;
      case ASIN -> 1 / Math.sqrt(1 - a * a);
      case ACOS -> -1 / Math.sqrt(1 - a * a);
      case ATAN -> 1 / (1 + a * a);
      case CONSTANT, INPUT -> 0;
    };
  }

  /** Derivative to the right operand, given operands and value. */
  double byRight(double a, double b, double value) {
    return switch (this) {
      case PLUS -> 1;
      case MINUS -> -1;
      case TIMES -> a;
      case OVER -> -value / b;
      case POWER -> a > 0 ? value * StrictMath.log(a) : 0;
      case MIN -> a <= b ? 0 : 1;
      case MAX -> a >= b ? 0 : 1;
      case PAR -> (a / (a + b)) * (a / (a + b));
      default -> 0;
    };
  }

  /** An operand for a message: its formula, its value and that with its unit. */
  record Operand(String text, double value, String shown) {

    /** Formula and value; a literal stands for itself. */
    String named() {
      return Excerpt.clip(text, 60) + (text.equals(shown) ? "" : " = " + shown);
    }
  }

  /** Why this has no finite result. */
  String fault(Expression origin, Operand a, Operand b) {
    String what = Excerpt.clip(origin.text(), 60);
    return switch (this) {
      case OVER ->
          b.value() == 0 ? "division by zero: " + b.named() : what + ": the quotient is too large";
      case SQRT -> "root of a negative value: " + a.named() + "; expected 0 or more";
      case LN, LOG10 -> "logarithm of " + a.named() + ": expected more than 0";
      case ASIN, ACOS -> word() + " of " + a.named() + ": expected −1 to 1";
      case POWER ->
          a.value() < 0
              ? "negative base with a broken exponent: " + a.named() + "; expected 0 or more"
              : a.value() == 0
                  ? "zero to a negative power: " + a.named()
                  : what + ": the power is too large";
      case PAR -> what + ": the two resistances add up to zero";
      default -> what + ": the result is not finite";
    };
  }

  private String word() {
    return name().toLowerCase(java.util.Locale.ROOT);
  }
}
