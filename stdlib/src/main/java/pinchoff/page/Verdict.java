package pinchoff.page;

import java.util.Optional;
import pinchoff.quantity.Quantity;

/**
 * The outcome of a check: its standing, the words for it, and by how much.
 *
 * @param standing how the check came out
 * @param words what to say, for example "holds" or "in saturation"
 * @param margin signed distance to the boundary: positive is room to spare, negative is what is
 *     missing
 */
public record Verdict(Standing standing, String words, Optional<Quantity> margin) {

  /**
   * Checks that standing and margin do not contradict each other.
   *
   * @throws IllegalArgumentException if something holds with a negative margin or fails with a
   *     positive one
   */
  public Verdict {
    double distance = margin.map(Quantity::si).orElse(0.0);
    boolean contradiction =
        (standing == Standing.HOLDS && distance < 0)
            || (standing == Standing.FAILS && distance > 0);
    if (contradiction) {
      throw new IllegalArgumentException(
          "a verdict that "
              + standing.word()
              + " cannot have a margin of "
              + margin.orElseThrow()
              + ": positive is room to spare, negative is what is missing");
    }
  }

  /** A verdict without a margin, in the standing's own words. */
  public static Verdict of(Standing standing) {
    return new Verdict(standing, standing.word(), Optional.empty());
  }

  /** A plain yes or no. */
  public static Verdict of(boolean holds) {
    return of(holds ? Standing.HOLDS : Standing.FAILS);
  }

  /**
   * Decides by the sign of a margin.
   *
   * @param margin signed distance to the boundary, positive if the check holds
   * @param band distances up to this count as "on the edge"; zero or more, of the same dimension
   */
  public static Verdict of(Quantity margin, Quantity band) {
    if (margin.abs().compareTo(band) <= 0) {
      return of(Standing.EDGE).by(margin);
    }
    return of(margin.si() > 0 ? Standing.HOLDS : Standing.FAILS).by(margin);
  }

  /** The check holds. */
  public static Verdict holds() {
    return of(Standing.HOLDS);
  }

  /** The check holds with this margin, zero or positive. */
  public static Verdict holds(Quantity margin) {
    return holds().by(margin);
  }

  /** The check comes out on its boundary. */
  public static Verdict edge() {
    return of(Standing.EDGE);
  }

  /** The check fails. */
  public static Verdict fails() {
    return of(Standing.FAILS);
  }

  /** The check fails with this margin, zero or negative. */
  public static Verdict fails(Quantity margin) {
    return fails().by(margin);
  }

  /** The check could not be decided. */
  public static Verdict unknown() {
    return of(Standing.UNKNOWN);
  }

  /** The same verdict with a margin. */
  public Verdict by(Quantity distance) {
    return new Verdict(standing, words, Optional.of(distance));
  }

  /** The same verdict in other words, for example "in saturation" instead of "holds". */
  public Verdict saying(String other) {
    return new Verdict(standing, other, margin);
  }

  /** The sign, the words and the margin: "✓ holds by 312 mV". */
  public String text() {
    return Escape.visible(standing.sign() + " " + statement());
  }

  @Override
  public String toString() {
    return text();
  }

  /** The words and the margin. The words say which side it is, so the margin has no sign. */
  String statement() {
    if (standing == Standing.EDGE) {
      return words;
    }
    return margin.map(m -> words + " by " + m.abs()).orElse(words);
  }
}
