package pinchoff.drawing;

/**
 * The look that charts and drawings share: inks, line widths and text sizes.
 *
 * @param ink titles, axis titles, labels
 * @param quiet tick labels, notes
 * @param frame axis lines and ticks
 * @param grid grid lines
 * @param fine grid lines between these
 * @param zero the line at zero
 * @param accent loci, markers, guides
 * @param text size of axis titles and labels
 * @param small size of tick labels and notes
 * @param heading size of the title
 * @param line width of curves
 * @param thin width of loci and leaders
 * @param hair width of axis lines and the grid
 */
public record Style(
    Colour ink,
    Colour quiet,
    Colour frame,
    Colour grid,
    Colour fine,
    Colour zero,
    Colour accent,
    double text,
    double small,
    double heading,
    double line,
    double thin,
    double hair) {

  /** The one style of Pinchoff. */
  public static final Style STANDARD =
      new Style(
          Colour.of(0x1F2328),
          Colour.of(0x4B5259),
          Colour.of(0x6E767D),
          Colour.of(0xDFE3E6),
          Colour.of(0xEFF1F3),
          Colour.of(0xA9B0B6),
          Colour.of(0x1F2328),
          13,
          12,
          14.5,
          1.9,
          1.3,
          1);
}
