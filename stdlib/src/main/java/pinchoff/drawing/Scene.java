package pinchoff.drawing;

import java.util.List;
import pinchoff.page.Picture;

/**
 * A picture as data, on white.
 *
 * @param width in CSS pixels
 * @param height in CSS pixels
 * @param title what it is called, in a few words; may be empty
 * @param elements what is to be seen, from back to front
 */
public record Scene(int width, int height, String title, List<Element> elements) {

  /** The largest width and height. */
  public static final int MAX_SIZE = 4000;

  /** Checks the size and copies the elements. */
  public Scene {
    if (width < 1 || height < 1 || width > MAX_SIZE || height > MAX_SIZE) {
      throw new IllegalArgumentException(
          "picture of %d × %d px: expected 1 to %d px each way".formatted(width, height, MAX_SIZE));
    }
    elements = List.copyOf(elements);
  }

  /**
   * The picture as a PNG file with twice as many pixels as CSS pixels each way.
   *
   * @throws IllegalStateException if it has characters for which this machine has no font
   */
  public byte[] png() {
    return PngFile.of(Painter.paint(this));
  }

  /**
   * The picture as an SVG document with real text.
   *
   * @param alternative what it shows, in words
   */
  public String svg(String alternative) {
    return SvgWriter.write(this, alternative);
  }

  /**
   * The picture as PNG; as SVG on a machine that cannot paint it, since it lacks the fonts for some
   * of its characters.
   *
   * @param alternative what it shows, in words
   */
  public Picture picture(String alternative) {
    return Painter.canPaint(this)
        ? Picture.png(png(), width, height, alternative)
        : vector(alternative);
  }

  /**
   * The picture as SVG.
   *
   * @param alternative what it shows, in words
   */
  public Picture vector(String alternative) {
    return Picture.svg(svg(alternative), width, height, alternative);
  }
}
