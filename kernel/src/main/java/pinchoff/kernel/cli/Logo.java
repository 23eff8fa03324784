package pinchoff.kernel.cli;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Polygon;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import javax.imageio.ImageIO;

/**
 * The kernel's picture: a transistor's gate above its channel, which narrows from the source to the
 * point where it is pinched off before the drain. On a grid of 64 by 64.
 */
final class Logo {
  private static final int GRID = 64;

  private static final List<Shape> SHAPES =
      List.of(
          Shape.of("#173f5f", 0, 0, 64, 0, 64, 64, 0, 64),
          Shape.of("#f2f5f7", 14, 12, 50, 12, 50, 20, 14, 20),
          Shape.of("#8fb8d0", 14, 23, 50, 23, 50, 26, 14, 26),
          Shape.of("#f2f5f7", 4, 29, 16, 29, 16, 50, 4, 50),
          Shape.of("#f2f5f7", 48, 29, 60, 29, 60, 50, 48, 50),
          Shape.of("#f6a821", 16, 29, 42, 29, 16, 44));

  private Logo() {}

  /** A filled polygon: x and y of each corner in turn. */
  private record Shape(String colour, List<Integer> corners) {
    static Shape of(String colour, Integer... corners) {
      return new Shape(colour, List.of(corners));
    }

    Polygon polygon() {
      Polygon polygon = new Polygon();
      for (int i = 0; i < corners.size(); i += 2) {
        polygon.addPoint(corners.get(i), corners.get(i + 1));
      }
      return polygon;
    }

    String svg() {
      String points =
          IntStream.range(0, corners.size() / 2)
              .mapToObj(i -> corners.get(2 * i) + "," + corners.get(2 * i + 1))
              .collect(Collectors.joining(" "));
      return String.format(Locale.ROOT, "  <polygon fill=\"%s\" points=\"%s\"/>\n", colour, points);
    }
  }

  /** The picture as SVG. */
  static String svg() {
    return "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 64 64\">\n"
        + SHAPES.stream().map(Shape::svg).collect(Collectors.joining())
        + "</svg>\n";
  }

  /** The picture as PNG, so many pixels wide and high. */
  static byte[] png(int size) throws IOException {
    BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
    Graphics2D pen = image.createGraphics();
    pen.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    pen.scale((double) size / GRID, (double) size / GRID);
    for (Shape shape : SHAPES) {
      pen.setColor(Color.decode(shape.colour()));
      pen.fill(shape.polygon());
    }
    pen.dispose();
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    ImageIO.write(image, "png", bytes);
    return bytes.toByteArray();
  }
}
