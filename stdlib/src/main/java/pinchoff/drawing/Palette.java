package pinchoff.drawing;

import java.util.List;

/**
 * Colours for lines and regions that stay distinct for people with a colour vision deficiency.
 *
 * <p>Source: M. Okabe and K. Ito, "Color Universal Design (CUD): how to make figures and
 * presentations that are friendly to colorblind people", 2008, the set of eight colours. Black is
 * the last of the line colours, since loci and markers are black too; yellow is for areas only,
 * since it is faint as a thin line on white.
 */
public final class Palette {
  private static final List<Colour> COLOURS =
      List.of(
          Colour.of(0x0072B2), // blue
          Colour.of(0xD55E00), // vermilion
          Colour.of(0x009E73), // bluish green
          Colour.of(0xCC79A7), // reddish purple
          Colour.of(0xE69F00), // orange
          Colour.of(0x56B4E9), // sky blue
          Colour.of(0x000000)); // black

  private static final List<Colour> AREAS =
      List.of(
          Colour.of(0x56B4E9), // sky blue
          Colour.of(0xE69F00), // orange
          Colour.of(0x009E73), // bluish green
          Colour.of(0xCC79A7), // reddish purple
          Colour.of(0xF0E442), // yellow
          Colour.of(0x0072B2), // blue
          Colour.of(0xD55E00)); // vermilion

  private Palette() {}

  /** How many colours there are before they start again. */
  public static int size() {
    return COLOURS.size();
  }

  /**
   * The colour of the n-th line.
   *
   * @param index from 0; past the last colour they start again
   */
  public static Colour colour(int index) {
    return COLOURS.get(Math.floorMod(index, COLOURS.size()));
  }

  /**
   * The colour of the n-th area, to be thinned.
   *
   * @param index from 0; past the last colour they start again
   */
  public static Colour area(int index) {
    return AREAS.get(Math.floorMod(index, AREAS.size()));
  }
}
