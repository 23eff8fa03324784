package pinchoff.page;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Base64;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;

/** A picture of known size with a text that stands in for it. */
public final class Picture implements Displayable {
  private static final byte[] PNG_SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10};
  private static final int MAX_SIZE = 10_000;

  private final String type;
  private final byte[] bytes;
  private final int width;
  private final int height;
  private final String alternative;

  private Picture(String type, byte[] bytes, int width, int height, String alternative) {
    if (width < 1 || height < 1 || width > MAX_SIZE || height > MAX_SIZE) {
      throw new IllegalArgumentException(
          "a picture of " + width + " × " + height + " CSS pixels: expected 1 to " + MAX_SIZE);
    }
    if (alternative.isBlank()) {
      throw new IllegalArgumentException("a picture needs an alternative text, found none");
    }
    this.type = type;
    this.bytes = bytes;
    this.width = width;
    this.height = height;
    this.alternative = alternative;
  }

  /**
   * A PNG picture, as a rule with twice as many pixels as CSS pixels each way.
   *
   * @param png the bytes of the file
   * @param width width on the page in CSS pixels
   * @param height height on the page in CSS pixels
   * @param alternative what it shows, in words
   */
  public static Picture png(byte[] png, int width, int height, String alternative) {
    if (!Arrays.equals(png, 0, Math.min(8, png.length), PNG_SIGNATURE, 0, 8)) {
      throw new IllegalArgumentException("a PNG picture: expected the PNG signature at its start");
    }
    return new Picture(MimeBundle.PNG, png.clone(), width, height, alternative);
  }

  /**
   * A vector picture.
   *
   * @param svg an SVG document
   * @param width width on the page in CSS pixels
   * @param height height on the page in CSS pixels
   * @param alternative what it shows, in words
   */
  public static Picture svg(String svg, int width, int height, String alternative) {
    if (!svg.startsWith("<svg") && !svg.startsWith("<?xml")) {
      throw new IllegalArgumentException("an SVG picture: expected <svg at its start");
    }
    byte[] bytes = svg.getBytes(StandardCharsets.UTF_8);
    return new Picture(MimeBundle.SVG, bytes, width, height, alternative);
  }

  /** {@code image/png} or {@code image/svg+xml}. */
  public String type() {
    return type;
  }

  /** The bytes of the file. */
  public byte[] bytes() {
    return bytes.clone();
  }

  /** Width on the page in CSS pixels. */
  public int width() {
    return width;
  }

  /** Height on the page in CSS pixels. */
  public int height() {
    return height;
  }

  /** What it shows, in words. */
  public String alternative() {
    return alternative;
  }

  /** The picture by itself, as a front end shows a picture. */
  @Override
  public MimeBundle display() {
    return Page.of(new PictureBlock(this)).display();
  }

  String svgText() {
    return new String(bytes, StandardCharsets.UTF_8);
  }

  String dataUri() {
    return "data:" + type + ";base64," + Base64.getEncoder().encodeToString(bytes);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Picture p
        && type.equals(p.type)
        && width == p.width
        && height == p.height
        && alternative.equals(p.alternative)
        && Arrays.equals(bytes, p.bytes);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(bytes);
  }

  @Override
  public String toString() {
    return "Picture[" + alternative + "]";
  }
}
