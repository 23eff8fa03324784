package pinchoff.drawing;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;

/** Paints a scene to pixels, two to a CSS pixel each way. */
final class Painter {
  /** Pixels of the image to a CSS pixel. */
  static final int SCALE = 2;

  static {
    // Before the first use of the toolkit: without it a machine with a dead display would fail.
    if (System.getProperty("java.awt.headless") == null) {
      System.setProperty("java.awt.headless", "true");
    }
  }

  private final Graphics2D graphics;

  private Painter(Graphics2D graphics) {
    this.graphics = graphics;
  }

  static BufferedImage paint(Scene scene) {
    BufferedImage image =
        new BufferedImage(
            scene.width() * SCALE, scene.height() * SCALE, BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    try {
      graphics.setColor(Color.WHITE);
      graphics.fillRect(0, 0, image.getWidth(), image.getHeight());
      graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      graphics.setRenderingHint(
          RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
      graphics.scale(SCALE, SCALE);
      new Painter(graphics).all(scene.elements());
    } finally {
      graphics.dispose();
    }
    return image;
  }

  /** True if every letter of the scene has an outline, here or in the machine's fonts. */
  static boolean canPaint(Scene scene) {
    return canPaint(scene.elements());
  }

  private static boolean canPaint(List<Element> elements) {
    for (Element element : elements) {
      if (element instanceof Element.Clipped clipped && !canPaint(clipped.elements())) {
        return false;
      }
      if (element instanceof Element.Text text && !Outlines.has(text.line())) {
        return false;
      }
    }
    return true;
  }

  private void all(List<Element> elements) {
    for (Element element : elements) {
      if (element instanceof Element.Shape shape) {
        shape(shape);
      } else if (element instanceof Element.Text text) {
        text(text);
      } else if (element instanceof Element.Clipped clipped) {
        clipped(clipped);
      }
    }
  }

  private void clipped(Element.Clipped clipped) {
    java.awt.Shape before = graphics.getClip();
    Rect r = clipped.window();
    graphics.clip(new Rectangle2D.Double(r.x(), r.y(), r.width(), r.height()));
    all(clipped.elements());
    graphics.setClip(before);
  }

  private void shape(Element.Shape shape) {
    Path2D path = Outlines.path2d(shape.path(), new Path2D.Double(Path2D.WIND_EVEN_ODD));
    shape
        .fill()
        .ifPresent(
            fill -> {
              graphics.setColor(awt(fill));
              graphics.fill(path);
            });
    shape
        .pen()
        .ifPresent(
            pen -> {
              graphics.setColor(awt(pen.colour()));
              graphics.setStroke(stroke(pen));
              graphics.draw(path);
            });
  }

  private void text(Element.Text text) {
    AffineTransform before = graphics.getTransform();
    graphics.rotate(StrictMath.toRadians(-text.angle()), text.x(), text.y());
    graphics.translate(text.left(), text.y());
    Path2D outline = Outlines.of(text.line(), text.size());
    if (text.halo() > 0) {
      graphics.setColor(Color.WHITE);
      graphics.setStroke(stroke(Pen.of(Colour.WHITE, 2 * text.halo())));
      graphics.draw(outline);
    }
    graphics.setColor(awt(text.colour()));
    graphics.fill(outline);
    graphics.setTransform(before);
  }

  private static BasicStroke stroke(Pen pen) {
    List<Double> pattern = pen.dash().pattern();
    if (pattern.isEmpty()) {
      return new BasicStroke((float) pen.width(), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10);
    }
    float[] dash = new float[pattern.size()];
    for (int i = 0; i < dash.length; i++) {
      dash[i] = pattern.get(i).floatValue();
    }
    return new BasicStroke(
        (float) pen.width(), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash, 0);
  }

  private static Color awt(Colour colour) {
    int alpha = (int) Math.round(255 * colour.opacity());
    return new Color(colour.red(), colour.green(), colour.blue(), alpha);
  }
}
