package pinchoff.drawing;

/**
 * Writes a path's steps for SVG, in steps relative to the last point: shorter than absolute ones.
 * Each point is rounded to hundredths before the difference is taken, so errors do not add up.
 */
final class SvgPath implements Path.Walker {
  private final StringBuilder out;
  private long lastX;
  private long lastY;
  private long startX;
  private long startY;
  private char command;

  SvgPath(StringBuilder out) {
    this.out = out;
  }

  @Override
  public void moveTo(double x, double y) {
    command('M');
    lastX = 0;
    lastY = 0;
    point(x, y, true);
    startX = lastX;
    startY = lastY;
    command = 'M';
  }

  @Override
  public void lineTo(double x, double y) {
    command('l');
    point(x, y, true);
  }

  @Override
  public void quadTo(double controlX, double controlY, double x, double y) {
    command('q');
    point(controlX, controlY, false);
    point(x, y, true);
  }

  @Override
  public void cubicTo(double x1, double y1, double x2, double y2, double x, double y) {
    command('c');
    point(x1, y1, false);
    point(x2, y2, false);
    point(x, y, true);
  }

  @Override
  public void close() {
    out.append('z');
    command = 'z';
    lastX = startX;
    lastY = startY;
  }

  private void command(char next) {
    if (next != command) {
      out.append(next);
      command = next;
    } else if (next == 'M') {
      out.append('M');
    }
  }

  private void point(double x, double y, boolean last) {
    long nextX = Math.round(x * 100);
    long nextY = Math.round(y * 100);
    number(nextX - lastX);
    number(nextY - lastY);
    if (last) {
      lastX = nextX;
      lastY = nextY;
    }
  }

  private void number(long hundredths) {
    char before = out.charAt(out.length() - 1);
    if (hundredths >= 0 && Character.isDigit(before)) {
      out.append(' ');
    }
    out.append(SvgWriter.number(hundredths / 100.0));
  }
}
