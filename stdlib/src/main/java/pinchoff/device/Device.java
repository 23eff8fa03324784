package pinchoff.device;

import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.quantity.Quantity;

/**
 * A kind of transistor of a process: parameters, rules, ratings, and where they come from.
 *
 * @param parameters the model parameters
 * @param rules what may be drawn
 * @param ratings what the process allows
 * @param source where all of it comes from
 */
public record Device(
    DeviceParameters parameters, GeometryRules rules, Ratings ratings, Source source)
    implements Displayable {

  /** A device without rules and ratings whose parameters stand in a cell. */
  public static Device of(DeviceParameters parameters) {
    return new Device(parameters, GeometryRules.NONE, Ratings.NONE, Source.CELL);
  }

  /** A device with all that is known of it. */
  public static Device of(
      DeviceParameters parameters, GeometryRules rules, Ratings ratings, Source source) {
    return new Device(parameters, rules, ratings, source);
  }

  /** The name of the device in its process. */
  public String name() {
    return parameters.name();
  }

  /** n or p. */
  public Polarity polarity() {
    return parameters.polarity();
  }

  /**
   * A transistor of this kind: one unit device, by the square law, at the nominal temperature.
   *
   * @param width drawn W
   * @param length drawn L
   * @throws DeviceException if a size is not above zero or below the minimum of the process
   */
  public Transistor sized(Quantity width, Quantity length) {
    return Transistor.of(this, width, length);
  }

  @Override
  public String toString() {
    return parameters.polarity().letter() + " device " + name();
  }

  /** The parameters as a sheet. */
  public Page page() {
    return DeviceSheet.of(this);
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }
}
