package pinchoff.technology;

import java.util.Optional;
import pinchoff.page.Entry;
import pinchoff.quantity.Quantity;

/**
 * One value in which two technologies differ.
 *
 * @param path where it stands, for example {@code devices.core-n.squareLaw.bodyFactor}
 * @param before what the first technology states; empty if it states nothing there
 * @param after what the second technology states; empty if it states nothing there
 * @param change how much it changed: relative to the first, or a difference in kelvin for a
 *     temperature; empty if that means nothing
 */
public record Difference(String path, Entry before, Entry after, Optional<Quantity> change) {}
