package pinchoff.chart;

/** A chart was asked for something that cannot be drawn. */
public final class ChartException extends IllegalArgumentException {

  /** With a sentence that names the item, the value and what was expected. */
  public ChartException(String message) {
    super(message);
  }
}
