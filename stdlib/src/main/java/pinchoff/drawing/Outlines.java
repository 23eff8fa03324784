package pinchoff.drawing;

import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** Text as paths to fill. */
final class Outlines {
  private static final Map<Integer, Path2D> SHIPPED = new ConcurrentHashMap<>();

  private Outlines() {}

  /** True if every letter of the line has an outline. */
  static boolean has(TextLine line) {
    return line.spans().stream()
        .flatMapToInt(span -> span.text().codePoints())
        .allMatch(letter -> Typeface.has(letter) || MachineFont.has(letter));
  }

  /** A line of text, the left end of its baseline at (0, 0). */
  static Path2D of(TextLine line, double size) {
    Path2D all = new Path2D.Double(Path2D.WIND_NON_ZERO);
    double x = 0;
    for (TextLine.Span span : line.spans()) {
      double spanSize = size * span.level().size();
      double y = size * span.level().drop();
      for (int letter : span.text().codePoints().toArray()) {
        double lean = span.slanted() ? -Typeface.SLANT * spanSize : 0;
        all.append(
            letter(letter).getPathIterator(new AffineTransform(spanSize, 0, lean, spanSize, x, y)),
            false);
        x += Typeface.advance(letter) * spanSize;
      }
    }
    return all;
  }

  private static Path2D letter(int letter) {
    if (Typeface.has(letter)) {
      return SHIPPED.computeIfAbsent(
          letter, l -> path2d(Typeface.outline(l), new Path2D.Double(Path2D.WIND_NON_ZERO)));
    }
    Optional<Path2D> foreign = MachineFont.outline(letter, Typeface.advance(letter));
    return foreign.orElseThrow(
        () ->
            new IllegalStateException(
                "no font for the character U+%04X on this machine".formatted(letter)));
  }

  /** Appends a path. */
  static Path2D path2d(Path path, Path2D to) {
    path.walk(
        new Path.Walker() {
          @Override
          public void moveTo(double x, double y) {
            to.moveTo(x, y);
          }

          @Override
          public void lineTo(double x, double y) {
            to.lineTo(x, y);
          }

          @Override
          public void quadTo(double controlX, double controlY, double x, double y) {
            to.quadTo(controlX, controlY, x, y);
          }

          @Override
          public void cubicTo(double x1, double y1, double x2, double y2, double x, double y) {
            to.curveTo(x1, y1, x2, y2, x, y);
          }

          @Override
          public void close() {
            to.closePath();
          }
        });
    return to;
  }
}
