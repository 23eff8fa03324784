package pinchoff.drawing;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.awt.font.GlyphVector;
import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.util.Optional;

/**
 * The machine's own sans-serif font, asked only for letters that the shipped typeface lacks. Where
 * a machine has no fonts, or lacks the native libraries that read them, it has no letters.
 */
final class MachineFont {
  private static final FontRenderContext EXACT = new FontRenderContext(null, true, true);

  private MachineFont() {}

  /** Found once: asking takes long, and failing leaves the font system unusable. */
  private static final class Holder {
    static final Optional<Font> FONT = find();

    private static Optional<Font> find() {
      try {
        Font font = new Font(Font.SANS_SERIF, Font.PLAIN, 1000);
        font.createGlyphVector(EXACT, "x").getOutline();
        return Optional.of(font);
      } catch (RuntimeException | Error e) {
        // No fonts, no font configuration, no native library: each is reported differently.
        if (e instanceof VirtualMachineError && !(e instanceof InternalError)) {
          throw e;
        }
        return Optional.empty();
      }
    }
  }

  static boolean has(int letter) {
    return Holder.FONT.filter(font -> font.canDisplay(letter)).isPresent();
  }

  /** The outline of a letter, fitted to the given width, both in units of the text size. */
  static Optional<Path2D> outline(int letter, double advance) {
    return Holder.FONT
        .filter(font -> font.canDisplay(letter))
        .map(
            font -> {
              GlyphVector glyphs = font.createGlyphVector(EXACT, Character.toString(letter));
              double own = glyphs.getGlyphMetrics(0).getAdvanceX() / 1000;
              double fit = own > advance ? advance / own : 1;
              return new Path2D.Double(
                  glyphs.getOutline(), AffineTransform.getScaleInstance(fit / 1000, 1 / 1000.0));
            });
  }
}
