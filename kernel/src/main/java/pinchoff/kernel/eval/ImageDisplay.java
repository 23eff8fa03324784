package pinchoff.kernel.eval;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import javax.imageio.ImageIO;
import pinchoff.display.MimeBundle;

/** Shows an image as a picture. Apart from the rest, so that nothing of AWT is loaded before. */
final class ImageDisplay {
  private ImageDisplay() {}

  /** Asked by name: a value that is no image must not load AWT. */
  static boolean isImage(Object value) {
    for (Class<?> type = value.getClass(); type != null; type = type.getSuperclass()) {
      if (type.getName().equals("java.awt.image.BufferedImage")) {
        return true;
      }
    }
    return false;
  }

  static MimeBundle of(Object value) {
    BufferedImage image = (BufferedImage) value;
    String text = "image, " + image.getWidth() + " x " + image.getHeight() + " pixels";
    ByteArrayOutputStream png = new ByteArrayOutputStream();
    try {
      ImageIO.setUseCache(false);
      ImageIO.write(image, "png", png);
    } catch (IOException e) {
      return MimeBundle.text(text + " (cannot be shown: " + e.getMessage() + ")");
    }
    return MimeBundle.builder(text)
        .withPng(png.toByteArray(), image.getWidth(), image.getHeight())
        .build();
  }
}
