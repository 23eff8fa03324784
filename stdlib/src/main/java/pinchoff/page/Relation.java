package pinchoff.page;

import java.util.Collections;
import java.util.List;
import pinchoff.quantity.Quantity;

/**
 * A formula to be typeset: a small tree that knows how things stand, not what they are worth.
 *
 * <p>Set as MathML, as LaTeX and in one line of text with no more parentheses than needed.
 */
public sealed interface Relation {

  /** The deepest nesting that is set; a deeper one is refused. */
  int MAX_DEPTH = 100;

  /** A symbol. */
  record Name(Symbol symbol) implements Relation {}

  /** A pure number, digits as they are to be shown. */
  record Digits(String text) implements Relation {

    /** Checks that it is a number without sign. */
    public Digits {
      if (!text.matches("\\d{1,40}(\\.\\d{1,40})?")) {
        throw new IllegalArgumentException(
            "a number in a relation: expected digits with or without a decimal point, found \""
                + text
                + "\"");
      }
    }
  }

  /**
   * A quantity with its unit.
   *
   * @param quantity what to show
   * @param digits significant digits
   */
  record Amount(Quantity quantity, int digits) implements Relation {}

  /** Terms to add; a {@link Minus} among them is subtracted. */
  record Sum(List<Relation> terms) implements Relation {

    /** Copies the terms. */
    public Sum {
      terms = atLeastTwo("a sum", terms);
    }
  }

  /** The negative of something. */
  record Minus(Relation operand) implements Relation {}

  /** Factors to multiply. */
  record Product(List<Relation> factors) implements Relation {

    /** Copies the factors. */
    public Product {
      factors = atLeastTwo("a product", factors);
    }
  }

  /** One thing over another. */
  record Fraction(Relation numerator, Relation denominator) implements Relation {}

  /** A base with an exponent. */
  record Power(Relation base, Relation exponent) implements Relation {}

  /**
   * A root.
   *
   * @param degree 2 for a square root, 3 for a cube root
   * @param radicand what stands under it
   */
  record Root(int degree, Relation radicand) implements Relation {

    /** Checks the degree. */
    public Root {
      if (degree < 2) {
        throw new IllegalArgumentException("a root of degree " + degree + ": expected 2 or more");
      }
    }
  }

  /** A function of arguments, for example {@code ln} or {@code max}; {@code abs} is set as bars. */
  record Call(String function, List<Relation> arguments) implements Relation {

    /** Copies the arguments. */
    public Call {
      arguments = List.copyOf(arguments);
    }

    boolean isAbsolute() {
      return function.equals("abs") && arguments.size() == 1;
    }
  }

  /** Impedances in parallel, set with the sign ∥. */
  record Parallel(List<Relation> branches) implements Relation {

    /** Copies the branches. */
    public Parallel {
      branches = atLeastTwo("a parallel connection", branches);
    }
  }

  /**
   * Two or more sides with a sign between each two.
   *
   * @param sides what is compared, from left to right
   * @param signs one less than sides
   */
  record Comparison(List<Relation> sides, List<Sign> signs) implements Relation {

    /** Checks the numbers of sides and signs. */
    public Comparison {
      sides = atLeastTwo("a comparison", sides);
      signs = List.copyOf(signs);
      if (signs.size() != sides.size() - 1) {
        throw new IllegalArgumentException(
            "a comparison of "
                + sides.size()
                + " sides needs "
                + (sides.size() - 1)
                + " signs, found "
                + signs.size());
      }
    }
  }

  /** The sign between two sides. */
  enum Sign {
    /** Both are equal. */
    EQUAL("=", "="),
    /** Both are about equal. */
    ABOUT("≈", "\\approx"),
    /** The left one is less. */
    LESS("<", "<"),
    /** The left one is less or equal. */
    AT_MOST("≤", "\\le"),
    /** The left one is greater. */
    GREATER(">", ">"),
    /** The left one is greater or equal. */
    AT_LEAST("≥", "\\ge");

    private final String text;
    private final String latex;

    Sign(String text, String latex) {
      this.text = text;
      this.latex = latex;
    }

    /** The sign as a character. */
    public String text() {
      return text;
    }

    String latex() {
      return latex;
    }
  }

  /** The symbol written in trade notation, see {@link Symbol#of}. */
  static Relation symbol(String notation) {
    return new Name(Symbol.of(notation));
  }

  /** A whole number. */
  static Relation number(long number) {
    Relation digits = new Digits(Long.toString(number).replace("-", ""));
    return number < 0 ? new Minus(digits) : digits;
  }

  /** A quantity with four significant digits. */
  static Relation amount(Quantity quantity) {
    return new Amount(quantity, Entry.DIGITS);
  }

  /** The sum of the terms. */
  static Relation sum(Relation... terms) {
    return new Sum(List.of(terms));
  }

  /** The left side minus the right one. */
  static Relation difference(Relation left, Relation right) {
    return new Sum(List.of(left, new Minus(right)));
  }

  /** The product of the factors. */
  static Relation product(Relation... factors) {
    return new Product(List.of(factors));
  }

  /** One thing over another. */
  static Relation fraction(Relation numerator, Relation denominator) {
    return new Fraction(numerator, denominator);
  }

  /** A power with a whole exponent. */
  static Relation power(Relation base, int exponent) {
    return new Power(base, number(exponent));
  }

  /** A square root. */
  static Relation root(Relation radicand) {
    return new Root(2, radicand);
  }

  /** A function of arguments. */
  static Relation call(String function, Relation... arguments) {
    return new Call(function, List.of(arguments));
  }

  /** Two or more sides that are equal. */
  static Relation equal(Relation... sides) {
    return new Comparison(
        List.of(sides), Collections.nCopies(Math.max(0, sides.length - 1), Sign.EQUAL));
  }

  /** Two sides with a sign between them. */
  static Relation compare(Relation left, Sign sign, Relation right) {
    return new Comparison(List.of(left, right), List.of(sign));
  }

  /** The formula in one line of text, with no more parentheses than needed. */
  default String text() {
    return RelationText.of(this);
  }

  /** The formula as LaTeX, without the dollar signs around it. */
  default String latex() {
    return RelationLatex.of(this);
  }

  /** The formula as a MathML element. */
  default String mathMl() {
    return RelationMathMl.of(this);
  }

  private static List<Relation> atLeastTwo(String what, List<Relation> parts) {
    if (parts.size() < 2) {
      throw new IllegalArgumentException(what + " needs at least two parts, found " + parts.size());
    }
    return List.copyOf(parts);
  }
}
