package pinchoff.page;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Tolerance;

/**
 * One canonical value: what a rerun compares, apart from how it is shown.
 *
 * @param id tells it from every other value of its page, and stays the same from run to run
 * @param name what people call it
 * @param kind what it is to the reader
 * @param content what it is worth
 * @param relation the formula that it comes from, as text, if there is one
 * @param tolerance how far a rerun may differ, if it is not the reviewer's default
 * @param limits what it must keep to, if anything
 * @param verdict how the check of its limits, or the check that it stands for, came out
 * @param sensitivities derivative to each named input, in SI units
 */
public record Value(
    String id,
    String name,
    Kind kind,
    Content content,
    Optional<String> relation,
    Optional<Tolerance> tolerance,
    Optional<Limits> limits,
    Optional<Verdict> verdict,
    Map<String, Quantity> sensitivities) {

  private static final int MAX_ID = 200;

  /** What a value is to the reader. */
  public enum Kind {
    /** A computed figure. */
    FIGURE,
    /** A named result that must not move. */
    CLAIM,
    /** A named result with limits. */
    SPEC,
    /** A check of an assumption, for example of a region. */
    VERDICT,
    /** A warning. */
    CAUTION,
    /** An input that stands in a technology file or in a cell. */
    PARAMETER
  }

  /** What a value is worth. */
  public sealed interface Content {
    /** A quantity. */
    record Amount(Quantity quantity) implements Content {}

    /** A text. */
    record Text(String text) implements Content {}

    /** Yes or no. */
    record Truth(boolean holds) implements Content {}
  }

  /** Checks the id and copies the sensitivities. */
  public Value {
    if (id.isBlank() || id.length() > MAX_ID || !id.equals(Escape.visible(id).strip())) {
      throw new IllegalArgumentException(
          "value id \""
              + Escape.visible(id)
              + "\": expected 1 to "
              + MAX_ID
              + " visible characters without space at the ends");
    }
    sensitivities = Collections.unmodifiableMap(new LinkedHashMap<>(sensitivities));
  }

  /** A value of this kind that is a quantity. */
  public static Value of(Kind kind, String id, String name, Quantity quantity) {
    return bare(kind, id, name, new Content.Amount(quantity));
  }

  /** A value of this kind that is a text. */
  public static Value of(Kind kind, String id, String name, String text) {
    return bare(kind, id, name, new Content.Text(text));
  }

  /** A computed figure. */
  public static Value figure(String id, String name, Quantity quantity) {
    return of(Kind.FIGURE, id, name, quantity);
  }

  /** A finding in words, for example the region of a device. */
  public static Value figure(String id, String name, String text) {
    return of(Kind.FIGURE, id, name, text);
  }

  /** A named result that must not move. */
  public static Value claim(String id, String name, Quantity quantity) {
    return of(Kind.CLAIM, id, name, quantity);
  }

  /** A named result with limits, and how it keeps to them. */
  public static Value spec(
      String id, String name, Quantity quantity, Limits limits, Verdict verdict) {
    return of(Kind.SPEC, id, name, quantity).limited(limits).judged(verdict);
  }

  /** The outcome of a check. Its content is whether it holds. */
  public static Value verdict(String id, String name, Verdict verdict) {
    Content holds = new Content.Truth(verdict.standing() == Standing.HOLDS);
    return bare(Kind.VERDICT, id, name, holds).judged(verdict);
  }

  /** A warning. */
  public static Value caution(String id, String name, String text) {
    return of(Kind.CAUTION, id, name, text);
  }

  private static Value bare(Kind kind, String id, String name, Content content) {
    return new Value(
        id,
        name,
        kind,
        content,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Map.of());
  }

  /** The same value with the formula that it comes from. */
  public Value from(String formula) {
    return new Value(
        id, name, kind, content, Optional.of(formula), tolerance, limits, verdict, sensitivities);
  }

  /** The same value with the tolerance of a rerun. */
  public Value within(Tolerance allowed) {
    return new Value(
        id, name, kind, content, relation, Optional.of(allowed), limits, verdict, sensitivities);
  }

  /** The same value with limits. */
  public Value limited(Limits bounds) {
    return new Value(
        id, name, kind, content, relation, tolerance, Optional.of(bounds), verdict, sensitivities);
  }

  /** The same value with a verdict. */
  public Value judged(Verdict outcome) {
    return new Value(
        id, name, kind, content, relation, tolerance, limits, Optional.of(outcome), sensitivities);
  }

  /**
   * The same value with one more sensitivity.
   *
   * @param input the name of the input
   * @param derivative change of this value for a change of the input, in the quotient of their
   *     dimensions
   */
  public Value sensitiveTo(String input, Quantity derivative) {
    Map<String, Quantity> all = new LinkedHashMap<>(sensitivities);
    all.put(input, derivative);
    return new Value(id, name, kind, content, relation, tolerance, limits, verdict, all);
  }

  /** The same value under a longer id, for a page that becomes part of another. */
  public Value under(String prefix) {
    return new Value(
        prefix + id, name, kind, content, relation, tolerance, limits, verdict, sensitivities);
  }
}
