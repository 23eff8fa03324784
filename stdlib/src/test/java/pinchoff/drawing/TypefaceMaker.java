package pinchoff.drawing;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.awt.font.GlyphVector;
import java.awt.geom.PathIterator;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Makes the resource {@code sans.glyphs} from a TrueType font file and the text of its licence.
 *
 * <p>Arguments: the font file, the licence as text, the resource to write. The resource in the tree
 * was made from DejaVu Sans 2.37.
 */
final class TypefaceMaker {
  private static final int EM = 2048;

  private TypefaceMaker() {}

  public static void main(String[] arguments) throws Exception {
    Font font;
    try (InputStream in = Files.newInputStream(Path.of(arguments[0]))) {
      font = Font.createFont(Font.TRUETYPE_FONT, in).deriveFont((float) EM);
    }
    List<String> lines = new ArrayList<>();
    licence(Path.of(arguments[1]), lines);
    letters().filter(font::canDisplay).forEach(letter -> lines.add(line(font, letter)));
    Files.write(Path.of(arguments[2]), lines);
  }

  private static void licence(Path file, List<String> lines) throws IOException {
    for (String line : Files.readAllLines(file)) {
      lines.add(("# " + line).stripTrailing());
    }
  }

  private static IntStream letters() {
    int[][] ranges = {
      {0x20, 0x7E},
      {0xA0, 0xAC},
      {0xAE, 0x17F},
      {0x391, 0x3C9},
      {0x3D1, 0x3D6},
      {0x3F5, 0x3F5},
      {0x410, 0x44F},
      {0x2010, 0x2027},
      {0x2030, 0x2037},
      {0x2070, 0x2071},
      {0x2074, 0x208E},
      {0x20AC, 0x20AC},
      {0x2103, 0x2103},
      {0x2113, 0x2113},
      {0x2126, 0x2126},
      {0x2190, 0x2195},
      {0x21D2, 0x21D2},
      {0x21D4, 0x21D4},
      {0x2200, 0x2213},
      {0x2215, 0x222B},
      {0x2248, 0x2248},
      {0x2260, 0x2265},
      {0x226A, 0x226B},
      {0x22C5, 0x22C5},
      {0x25A0, 0x25A1},
      {0x25B2, 0x25B3},
      {0x25BC, 0x25BD},
      {0x25C6, 0x25C7},
      {0x25CB, 0x25CB},
      {0x25CF, 0x25CF},
      {0x2713, 0x2713},
      {0x2717, 0x2717},
      {0xFFFD, 0xFFFD}
    };
    return IntStream.range(0, ranges.length)
        .flatMap(i -> IntStream.rangeClosed(ranges[i][0], ranges[i][1]));
  }

  private static String line(Font font, int letter) {
    FontRenderContext exact = new FontRenderContext(null, true, true);
    GlyphVector glyphs = font.createGlyphVector(exact, Character.toString(letter));
    long advance = Math.round(glyphs.getGlyphMetrics(0).getAdvanceX());
    StringBuilder line = new StringBuilder(Integer.toHexString(letter) + " " + advance + " ");
    double[] c = new double[6];
    for (PathIterator i = glyphs.getOutline().getPathIterator(null); !i.isDone(); i.next()) {
      int step = i.currentSegment(c);
      switch (step) {
        case PathIterator.SEG_MOVETO -> append(line, 'M', c, 2);
        case PathIterator.SEG_LINETO -> append(line, 'L', c, 2);
        case PathIterator.SEG_QUADTO -> append(line, 'Q', c, 4);
        case PathIterator.SEG_CLOSE -> line.append('Z');
        default -> throw new IllegalStateException("cubic curve in a TrueType font");
      }
    }
    return line.toString();
  }

  private static void append(StringBuilder line, char step, double[] c, int count) {
    line.append(step);
    for (int i = 0; i < count; i++) {
      long number = Math.round(c[i]);
      line.append(i > 0 && number >= 0 ? " " : "").append(number);
    }
  }
}
