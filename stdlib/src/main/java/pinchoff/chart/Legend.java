package pinchoff.chart;

/** Where the names of lines stand. None of these places covers data. */
public enum Legend {
  /** At the ends of the curves if they fit there, otherwise at the right or below. */
  AUTOMATIC,
  /** Each name at the right end of its curve. */
  AT_ENDS,
  /** A list at the right of the plotting area. */
  RIGHT,
  /** A list below the plotting area. */
  BELOW,
  /** Nowhere. */
  NONE
}
