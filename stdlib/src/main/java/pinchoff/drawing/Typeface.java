package pinchoff.drawing;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.Objects;

/**
 * The shipped sans-serif typeface: the width and outline of each letter.
 *
 * <p>The resource {@code sans.glyphs} has one line a letter: its code point in hexadecimal, its
 * advance, and its outline as path steps, in units of 1/2048 of the text size with y downwards.
 * Lines that begin with {@code #} are its licence.
 */
final class Typeface {
  /** Names for front ends, nearest in width first. */
  static final String FAMILIES = "DejaVu Sans, Verdana, sans-serif";

  /** How far slanted letters lean: the tangent of about 11°. */
  static final double SLANT = 0.2;

  private static final double UNIT = 1 / 2048.0;
  private static final Map<Integer, Glyph> GLYPHS = read();

  private Typeface() {}

  /** One letter. */
  private record Glyph(double advance, String steps) {}

  /** True if the typeface has this letter. */
  static boolean has(int letter) {
    return GLYPHS.containsKey(letter);
  }

  /** How far the next letter stands from this one, in units of the text size. */
  static double advance(int letter) {
    Glyph glyph = GLYPHS.get(letter);
    if (glyph != null) {
      return glyph.advance();
    }
    // Ideographs and pictographs are square; of other foreign letters the width is guessed.
    return Character.isIdeographic(letter) || letter >= 0x1100 ? 1 : 0.65;
  }

  /** The outline of a letter in units of the text size, the left end of its baseline at (0, 0). */
  static Path outline(int letter) {
    Glyph glyph = GLYPHS.get(letter);
    if (glyph == null) {
      throw new IllegalArgumentException("no letter " + Integer.toHexString(letter));
    }
    return new Steps(glyph.steps()).path();
  }

  private static Map<Integer, Glyph> read() {
    Map<Integer, Glyph> glyphs = new HashMap<>();
    try (InputStream in =
            Objects.requireNonNull(Typeface.class.getResourceAsStream("sans.glyphs"));
        BufferedReader lines =
            new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        if (!line.startsWith("#")) {
          String[] parts = line.split(" ", 3);
          glyphs.put(
              Integer.parseInt(parts[0], 16),
              new Glyph(Integer.parseInt(parts[1]) * UNIT, parts[2]));
        }
      }
      return glyphs;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Reads an outline. */
  private static final class Steps {
    private final String text;
    private int at;

    Steps(String text) {
      this.text = text;
    }

    Path path() {
      Path.Builder path = Path.builder();
      while (at < text.length()) {
        switch (text.charAt(at++)) {
          case 'M' -> path.moveTo(number(), number());
          case 'L' -> path.lineTo(number(), number());
          case 'Q' -> path.quadTo(number(), number(), number(), number());
          default -> path.close();
        }
      }
      return path.build();
    }

    private double number() {
      int end = at + 1;
      while (end < text.length() && Character.isDigit(text.charAt(end))) {
        end++;
      }
      int number = Integer.parseInt(text.substring(at, end).strip());
      at = end;
      return number * UNIT;
    }
  }
}
