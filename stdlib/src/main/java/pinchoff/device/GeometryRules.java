package pinchoff.device;

import java.util.Optional;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * What may be drawn, and what becomes of it. W and L are drawn sizes everywhere; the equations use
 * the effective ones.
 *
 * @param minimumWidth least drawn W, above 0; any width where empty
 * @param minimumLength least drawn L, above 0; any length where empty
 * @param grid the step that drawn sizes are multiples of, above 0
 * @param widthOffset drawn minus effective W, of a unit device
 * @param lengthOffset drawn minus effective L
 */
public record GeometryRules(
    Optional<Quantity> minimumWidth,
    Optional<Quantity> minimumLength,
    Optional<Quantity> grid,
    Quantity widthOffset,
    Quantity lengthOffset) {

  private static final Quantity NOTHING = Quantity.ofSi(0, Dimension.LENGTH);

  /** No rules: any size, and the effective size is the drawn one. */
  public static final GeometryRules NONE =
      new GeometryRules(Optional.empty(), Optional.empty(), Optional.empty(), NOTHING, NOTHING);

  /** Checks dimensions and signs, and that something is left of the smallest device. */
  public GeometryRules {
    Check.positive("minimum width", minimumWidth, Dimension.LENGTH);
    Check.positive("minimum length", minimumLength, Dimension.LENGTH);
    Check.positive("grid", grid, Dimension.LENGTH);
    leaves("width", widthOffset, minimumWidth);
    leaves("length", lengthOffset, minimumLength);
  }

  private static void leaves(String what, Quantity offset, Optional<Quantity> minimum) {
    offset.requireDimension(what + " offset", Dimension.LENGTH);
    minimum
        .filter(m -> m.compareTo(offset) <= 0)
        .ifPresent(
            m -> {
              throw new DeviceException(
                  "%s offset = %s: nothing is left of the minimum %s of %s"
                      .formatted(what, offset, what, m));
            });
  }

  /** Rules of a least size only. */
  public static GeometryRules atLeast(Quantity width, Quantity length) {
    return new GeometryRules(
        Optional.of(width), Optional.of(length), Optional.empty(), NOTHING, NOTHING);
  }

  /** The same with another grid. */
  public GeometryRules withGrid(Quantity step) {
    return new GeometryRules(
        minimumWidth, minimumLength, Optional.of(step), widthOffset, lengthOffset);
  }

  /** The same with other offsets, drawn minus effective. */
  public GeometryRules withOffsets(Quantity width, Quantity length) {
    return new GeometryRules(minimumWidth, minimumLength, grid, width, length);
  }
}
