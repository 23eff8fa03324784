package pinchoff.chart;

import java.util.ArrayList;
import java.util.List;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.drawing.Scene;
import pinchoff.page.Page;
import pinchoff.page.Phrase;
import pinchoff.page.Picture;
import pinchoff.page.PictureBlock;

/**
 * Panels one above the other over a common horizontal axis. Immutable; the value of a cell that
 * ends with a chart is its picture.
 *
 * @param title what it shows, in a few words; may be empty
 * @param x the horizontal axis
 * @param panels from top to bottom, 1 to {@value #MAX_PANELS}
 * @param width of the whole picture in CSS pixels, {@value #MIN_WIDTH} to {@value #MAX_WIDTH}
 * @param legend where the names of lines stand
 */
public record Chart(String title, Axis x, List<Panel> panels, int width, Legend legend)
    implements Displayable {

  /** The largest number of panels. */
  public static final int MAX_PANELS = 4;

  /** The least width of a picture. */
  public static final int MIN_WIDTH = 240;

  /** The greatest width of a picture. */
  public static final int MAX_WIDTH = 2000;

  private static final int USUAL_WIDTH = 720;
  private static final int USUAL_LOWER_HEIGHT = 130;

  /** Checks counts, sizes and the dimensions of markers and guides. */
  public Chart {
    Item.checkedName(title);
    panels = List.copyOf(panels);
    if (panels.isEmpty() || panels.size() > MAX_PANELS) {
      throw new ChartException("%d panels: expected 1 to %d".formatted(panels.size(), MAX_PANELS));
    }
    if (width < MIN_WIDTH || width > MAX_WIDTH) {
      throw new ChartException(
          "chart width %d px: expected %d to %d".formatted(width, MIN_WIDTH, MAX_WIDTH));
    }
    for (Panel panel : panels) {
      panel.items().forEach(item -> checkDimensions(item, x, panel.left()));
    }
  }

  /** An empty chart of one panel. */
  public static Chart of(Axis x, Axis y) {
    return of(x, Panel.of(y));
  }

  /** A chart of these panels, from top to bottom. */
  public static Chart of(Axis x, Panel... panels) {
    return new Chart("", x, List.of(panels), USUAL_WIDTH, Legend.AUTOMATIC);
  }

  /** This chart with a title. */
  public Chart titled(String text) {
    return new Chart(text, x, panels, width, legend);
  }

  /** This chart with more in its first panel. */
  public Chart with(Item... more) {
    return with(List.of(more));
  }

  /** This chart with more in its first panel. */
  public Chart with(List<? extends Item> more) {
    List<Panel> all = new ArrayList<>(panels);
    all.set(0, panels.get(0).with(more));
    return new Chart(title, x, all, width, legend);
  }

  /** This chart with another panel below. */
  public Chart below(Panel panel) {
    List<Panel> all = new ArrayList<>(panels);
    all.add(panel);
    return new Chart(title, x, all, width, legend);
  }

  /** This chart with another, lower panel below, for an error or a difference. */
  public Chart below(Axis y, Item... items) {
    return below(Panel.of(y).height(USUAL_LOWER_HEIGHT).with(items));
  }

  /** This chart with another width of the whole picture in CSS pixels. */
  public Chart wide(int pixels) {
    return new Chart(title, x, panels, pixels, legend);
  }

  /** This chart with the names of its lines elsewhere. */
  public Chart legend(Legend place) {
    return new Chart(title, x, panels, width, place);
  }

  /** What is plotted, in words: axes with ranges, lines with their ends, crossings, markers. */
  public String description() {
    return Description.of(this);
  }

  /** The chart laid out, before it is painted or written. */
  public Scene scene() {
    return Layout.of(this);
  }

  /**
   * The picture as PNG with twice as many pixels as CSS pixels each way; as SVG where the machine
   * lacks fonts for some of its letters.
   */
  public Picture picture() {
    return scene().picture(description());
  }

  /** The picture as SVG with real text, for documents. */
  public Picture vector() {
    return scene().vector(description());
  }

  /** The picture on a page of its own. */
  @Override
  public MimeBundle display() {
    Picture picture = picture();
    String remark =
        picture.type().equals(MimeBundle.SVG)
            ? "Shown as vectors, since this machine has no font for some of the letters."
            : "";
    return Page.of(new PictureBlock(picture, Phrase.plain(remark))).display();
  }

  private static void checkDimensions(Item item, Axis x, Axis y) {
    String what = "\"" + item.name() + "\" in a chart";
    if (item instanceof Marker marker) {
      marker.x().requireDimension("x of " + what, x.dimension());
      marker.y().requireDimension("y of " + what, y.dimension());
    } else if (item instanceof Guide guide) {
      guide.value().requireDimension(what, guide.vertical() ? x.dimension() : y.dimension());
    }
  }
}
