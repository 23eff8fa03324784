package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import pinchoff.drawing.TextLine;

/** Finds where loci and level or upright guides meet the lines of a panel. */
final class Crossings {
  private static final int MOST = 16;
  private static final int MOST_OF_A_PAIR = 3;
  private static final int LONGEST = 5000;

  private final Axis x;
  private final Axis y;
  private final List<String> found = new ArrayList<>();

  private Crossings(Axis x, Axis y) {
    this.x = x;
    this.y = y;
  }

  /** A sentence for each crossing, {@value #MOST} at most. */
  static List<String> of(Panel panel, Axis x) {
    Crossings crossings = new Crossings(x, panel.left());
    for (Item item : panel.items()) {
      for (Item other : panel.items()) {
        if (other instanceof Line line && !line.onRight()) {
          if (item instanceof Locus locus) {
            crossings.add(locus.name(), locus.points(), line);
          } else if (item instanceof Guide guide) {
            crossings.add(guide, line);
          }
        }
      }
    }
    return crossings.found;
  }

  private void add(Guide guide, Line line) {
    double at = guide.value().si();
    Points points = line.points();
    int here = 0;
    for (int i = 1; i < points.size() && here < MOST_OF_A_PAIR; i++) {
      double before = guide.vertical() ? points.x(i - 1) : points.y(i - 1);
      double after = guide.vertical() ? points.x(i) : points.y(i);
      if (before != after && before <= at == at < after) {
        double share = (at - before) / (after - before);
        double otherX = points.x(i - 1) + share * (points.x(i) - points.x(i - 1));
        double otherY = points.y(i - 1) + share * (points.y(i) - points.y(i - 1));
        if (!Double.isNaN(otherX + otherY)) {
          say(guide.name(), line.name(), otherX, otherY);
          here++;
        }
      }
    }
  }

  /** Both are walked by ascending x at once; curves that turn back are not compared. */
  private void add(String name, Points locus, Line line) {
    Points points = line.points();
    boolean both = isAscending(locus) && isAscending(points);
    if (!both || (locus.size() > LONGEST && points.size() > LONGEST)) {
      return;
    }
    int here = 0;
    int i = 1;
    int k = 1;
    while (i < locus.size() && k < points.size() && here < MOST_OF_A_PAIR) {
      if (meet(name, locus, i, line, k)) {
        here++;
      }
      if (locus.x(i) < points.x(k)) {
        i++;
      } else {
        k++;
      }
    }
  }

  private boolean meet(String name, Points locus, int i, Line line, int k) {
    Points points = line.points();
    double ax = locus.x(i - 1);
    double ay = locus.y(i - 1);
    double bx = locus.x(i) - ax;
    double by = locus.y(i) - ay;
    double cx = points.x(k - 1);
    double cy = points.y(k - 1);
    double dx = points.x(k) - cx;
    double dy = points.y(k) - cy;
    double turn = bx * dy - by * dx;
    double s = ((cx - ax) * dy - (cy - ay) * dx) / turn;
    double t = ((cx - ax) * by - (cy - ay) * bx) / turn;
    boolean inside = s >= 0 && s < 1 && t >= 0 && t < 1;
    boolean atOrigin = ax + s * bx == 0 && ay + s * by == 0;
    if (!inside || atOrigin) {
      return false;
    }
    say(name, line.name(), ax + s * bx, ay + s * by);
    return true;
  }

  private static boolean isAscending(Points points) {
    for (int i = 1; i < points.size(); i++) {
      if (!(points.x(i - 1) <= points.x(i))) {
        return false;
      }
    }
    return true;
  }

  private void say(String name, String line, double atX, double atY) {
    if (found.size() < MOST) {
      found.add(
          "%s meets %s at (%s, %s)"
              .formatted(
                  quoted(name),
                  quoted(line),
                  Description.value(atX, x.dimension(), x),
                  Description.value(atY, y.dimension(), y)));
    }
  }

  private static String quoted(String name) {
    return name.isEmpty() ? "a curve" : "\"" + TextLine.plain(name).text() + "\"";
  }
}
