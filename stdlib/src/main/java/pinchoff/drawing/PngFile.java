package pinchoff.drawing;

import java.awt.image.BufferedImage;
import java.awt.image.DataBufferInt;
import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.zip.CRC32;
import java.util.zip.Deflater;

/**
 * Writes an image as PNG with a palette of at most 256 colours (W3C PNG specification, colour type
 * 3): a third of the size of one with three bytes a pixel, and sooner written. No text and no time
 * is stored, so equal images are equal files.
 */
final class PngFile {
  private static final byte[] SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10};

  private PngFile() {}

  static byte[] of(BufferedImage image) {
    int[] pixels = pixels(image);
    ColourTable table = ColourTable.of(pixels);
    int width = image.getWidth();
    int height = image.getHeight();
    ByteArrayOutputStream out = new ByteArrayOutputStream(1 << 16);
    out.writeBytes(SIGNATURE);
    byte depth = 8;
    byte palette = 3;
    chunk(
        out,
        "IHDR",
        ByteBuffer.allocate(13)
            .putInt(width)
            .putInt(height)
            .put(depth)
            .put(palette)
            .put(new byte[3])
            .array());
    chunk(out, "PLTE", table.bytes());
    chunk(out, "IDAT", deflated(rows(pixels, width, height, table)));
    chunk(out, "IEND", new byte[0]);
    return out.toByteArray();
  }

  /** Red, green and blue of each pixel; the unused bits of an image may hold anything. */
  private static int[] pixels(BufferedImage image) {
    int[] pixels = ((DataBufferInt) image.getRaster().getDataBuffer()).getData();
    for (int i = 0; i < pixels.length; i++) {
      pixels[i] &= 0xFFFFFF;
    }
    return pixels;
  }

  /** Each row begins with the number of its filter: none. */
  private static byte[] rows(int[] pixels, int width, int height, ColourTable table) {
    byte[] rows = new byte[(width + 1) * height];
    int to = 0;
    int from = 0;
    int lastColour = -1;
    byte last = 0;
    for (int row = 0; row < height; row++) {
      rows[to++] = 0;
      for (int column = 0; column < width; column++) {
        int colour = pixels[from++];
        if (colour != lastColour) {
          lastColour = colour;
          last = table.index(colour);
        }
        rows[to++] = last;
      }
    }
    return rows;
  }

  private static byte[] deflated(byte[] rows) {
    Deflater deflater = new Deflater(6);
    try {
      deflater.setInput(rows);
      deflater.finish();
      ByteArrayOutputStream out = new ByteArrayOutputStream(1 << 16);
      byte[] buffer = new byte[1 << 16];
      while (!deflater.finished()) {
        out.write(buffer, 0, deflater.deflate(buffer));
      }
      return out.toByteArray();
    } finally {
      deflater.end();
    }
  }

  private static void chunk(ByteArrayOutputStream out, String type, byte[] data) {
    byte[] name = type.getBytes(StandardCharsets.US_ASCII);
    CRC32 sum = new CRC32();
    sum.update(name);
    sum.update(data);
    out.writeBytes(ByteBuffer.allocate(4).putInt(data.length).array());
    out.writeBytes(name);
    out.writeBytes(data);
    out.writeBytes(ByteBuffer.allocate(4).putInt((int) sum.getValue()).array());
  }
}
