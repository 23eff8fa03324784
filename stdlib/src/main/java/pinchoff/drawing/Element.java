package pinchoff.drawing;

import java.util.List;
import java.util.Optional;

/** What a scene is made of. Later elements cover earlier ones. */
public sealed interface Element {

  /**
   * A path, filled, stroked or both.
   *
   * @param path where
   * @param fill what its inside is filled with (even-odd rule)
   * @param pen what its line is drawn with, over the filling
   */
  record Shape(Path path, Optional<Colour> fill, Optional<Pen> pen) implements Element {}

  /**
   * A line of text.
   *
   * @param line the text
   * @param x where its anchor stands
   * @param y where its baseline stands
   * @param size text size
   * @param colour ink
   * @param anchor which part of the line stands at (x, y)
   * @param angle rotation about (x, y) in degrees, counter-clockwise
   * @param halo width of the white rim that sets the text off against what it covers; 0 for none
   */
  record Text(
      TextLine line,
      double x,
      double y,
      double size,
      Colour colour,
      Anchor anchor,
      double angle,
      double halo)
      implements Element {

    /** Level text without a rim. */
    public Text(TextLine line, double x, double y, double size, Colour colour, Anchor anchor) {
      this(line, x, y, size, colour, anchor, 0, 0);
    }

    /** This text with a white rim. */
    public Text withHalo(double width) {
      return new Text(line, x, y, size, colour, anchor, angle, width);
    }

    /** This text turned about its anchor. */
    public Text turned(double degrees) {
      return new Text(line, x, y, size, colour, anchor, degrees, halo);
    }

    /** Where the line begins if it is not turned. */
    double left() {
      return x - anchor.share() * line.width(size);
    }
  }

  /**
   * Elements of which only what lies in a rectangle is seen.
   *
   * @param window the rectangle
   * @param elements what is behind it
   */
  record Clipped(Rect window, List<Element> elements) implements Element {

    /** Copies the elements. */
    public Clipped {
      elements = List.copyOf(elements);
    }
  }

  /** Which part of a text stands at its point. */
  enum Anchor {
    /** The text begins there. */
    START(0, "start"),
    /** The text's middle is there. */
    MIDDLE(0.5, "middle"),
    /** The text ends there. */
    END(1, "end");

    private final double share;
    private final String word;

    Anchor(double share, String word) {
      this.share = share;
      this.word = word;
    }

    /** Which share of the text lies before the point. */
    double share() {
      return share;
    }

    /** The word for it in SVG. */
    String word() {
      return word;
    }
  }

  /** A stroked path. */
  static Element stroked(Path path, Pen pen) {
    return new Shape(path, Optional.empty(), Optional.of(pen));
  }

  /** A filled path. */
  static Element filled(Path path, Colour fill) {
    return new Shape(path, Optional.of(fill), Optional.empty());
  }
}
