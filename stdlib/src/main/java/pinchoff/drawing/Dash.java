package pinchoff.drawing;

import java.util.Arrays;
import java.util.List;

/** How a line is broken: what tells lines apart without colour. */
@SuppressWarnings("ImmutableEnumChecker") // the list cannot be changed
public enum Dash {
  /** Unbroken. */
  SOLID(),
  /** Long strokes with short gaps. */
  LONG(12, 3.5),
  /** Dots and strokes in turn. */
  DOT_STROKE(9, 3, 2, 3),
  /** Short strokes; loci are drawn so. */
  SHORT(5, 3.5),
  /** Two dots between strokes. */
  TWO_DOTS(10, 3, 2, 3, 2, 3),
  /** Dots. */
  DOTS(2, 2.6);

  private final List<Double> pattern;

  Dash(double... lengths) {
    pattern = Arrays.stream(lengths).boxed().toList();
  }

  /** Lengths of strokes and gaps in turn, in CSS pixels; empty for an unbroken line. */
  public List<Double> pattern() {
    return pattern;
  }
}
