package pinchoff.chart;

/** What stands in a panel. Regions are drawn first, markers last. */
public sealed interface Item permits Line, Locus, Guide, Region, Marker, Dots {

  /** The longest name, in characters. */
  int MAX_NAME = 200;

  /** The name that labels it; empty for none. */
  String name();

  /** Refuses a name that is too long to be one. */
  static String checkedName(String name) {
    if (name.length() > MAX_NAME) {
      throw new ChartException(
          "a name in a chart has %d characters (\"%s…\"): at most %d are allowed"
              .formatted(name.length(), name.substring(0, 30), MAX_NAME));
    }
    return name;
  }
}
