package pinchoff.formula;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** A function that formulas may call. */
public enum Function {
  /** Square root of zero or more. */
  SQRT(1),
  /** Exponential of a pure number. */
  EXP(1),
  /** Natural logarithm of a pure number above zero. */
  LN(1),
  /** Logarithm to base ten of a pure number above zero. */
  LOG10(1),
  /** Without sign. */
  ABS(1),
  /** The smaller of two. */
  MIN(2),
  /** The larger of two. */
  MAX(2),
  /** Two resistances in parallel. */
  PAR(2),
  /** Sine of an angle in radians. */
  SIN(1),
  /** Cosine of an angle in radians. */
  COS(1),
  /** Tangent of an angle in radians. */
  TAN(1),
  /** Angle in radians whose sine is given, −1 to 1. */
  ASIN(1),
  /** Angle in radians whose cosine is given, −1 to 1. */
  ACOS(1),
  /** Angle in radians whose tangent is given. */
  ATAN(1);

  private final int arguments;

  Function(int arguments) {
    this.arguments = arguments;
  }

  /** How it is written. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** How many arguments it takes. */
  public int arguments() {
    return arguments;
  }

  /** The function that is written so. */
  static Optional<Function> of(String word) {
    return Arrays.stream(values()).filter(f -> f.word().equals(word)).findFirst();
  }

  /** All words. */
  static List<String> words() {
    return Arrays.stream(values()).map(Function::word).toList();
  }
}
