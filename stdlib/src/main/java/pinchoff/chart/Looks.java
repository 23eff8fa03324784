package pinchoff.chart;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.drawing.Colour;
import pinchoff.drawing.Dash;
import pinchoff.drawing.Palette;
import pinchoff.drawing.Style;

/**
 * Gives each item its colour and dashes. Items of the same name look the same in all panels.
 *
 * <p>Lines whose names stand at their ends need no dashes within a family, that is as long as their
 * names agree up to the equals sign; each further family, each further round of the palette and,
 * with a list of names, each line has dashes of its own. Short dashes are left to loci.
 */
final class Looks {
  private static final List<Dash> DASHES =
      List.of(Dash.SOLID, Dash.LONG, Dash.DOT_STROKE, Dash.TWO_DOTS, Dash.DOTS);

  private final boolean namesAtEnds;
  private final Map<String, Integer> lines = new HashMap<>();
  private final Map<String, Integer> families = new HashMap<>();
  private final Map<String, Integer> areas = new HashMap<>();

  private Looks(boolean namesAtEnds) {
    this.namesAtEnds = namesAtEnds;
  }

  /** The look of each item of each panel. */
  static List<List<Look>> of(Chart chart, boolean namesAtEnds) {
    Looks looks = new Looks(namesAtEnds);
    List<List<Look>> all = new ArrayList<>();
    for (Panel panel : chart.panels()) {
      all.add(panel.items().stream().map(looks::look).toList());
    }
    return all;
  }

  private Look look(Item item) {
    if (item instanceof Line line) {
      return look(line);
    } else if (item instanceof Dots dots) {
      int index = dots.colour().orElseGet(() -> index(lines, dots.name()));
      return new Look(Palette.colour(index), Dash.SOLID);
    } else if (item instanceof Region region) {
      int index = index(areas, region.name());
      return new Look(Palette.area(index), Dash.SOLID);
    }
    Colour accent = Style.STANDARD.accent();
    return new Look(accent, item instanceof Guide ? Dash.DOTS : Dash.SHORT);
  }

  private Look look(Line line) {
    Optional<Integer> own = line.colour();
    int index = own.orElseGet(() -> index(lines, line.name()));
    int round = index / Palette.size();
    int dash = namesAtEnds ? index(families, family(line.name())) + round : index + round;
    return new Look(
        Palette.colour(index), line.dash().orElseGet(() -> DASHES.get(dash % DASHES.size())));
  }

  /** Where a name stands in the order of first appearance; what has no name is always new. */
  private static int index(Map<String, Integer> names, String name) {
    String key = name.isEmpty() ? "\0" + names.size() : name;
    Integer known = names.putIfAbsent(key, names.size());
    return known == null ? names.size() - 1 : known;
  }

  private static String family(String name) {
    int equals = name.indexOf('=');
    return equals < 0 ? name : name.substring(0, equals) + "=";
  }
}
