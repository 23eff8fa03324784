package pinchoff.derive;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import pinchoff.formula.Dimensions;
import pinchoff.quantity.Dimension;

/**
 * A derivation with all names resolved and dimensions checked for given kinds of inputs. Slots hold
 * the inputs first, in their order, then what the steps define.
 *
 * @param inputs how many slots are inputs
 * @param slots the slot of each name
 * @param dimensions what each name measures
 * @param steps the steps in order
 */
record Plan(
    int inputs,
    Map<String, Integer> slots,
    Map<String, Dimension> dimensions,
    List<Planned> steps) {

  Plan {
    slots = new LinkedHashMap<>(slots);
    dimensions = new LinkedHashMap<>(dimensions);
    steps = List.copyOf(steps);
  }

  /** The slot of a name that has one. */
  int slot(String name) {
    return Objects.requireNonNull(slots.get(name), name);
  }

  /** What a name with a slot measures. */
  Dimension dimension(String name) {
    return Objects.requireNonNull(dimensions.get(name), name);
  }

  /** The names in the order of their slots. */
  Set<String> names() {
    return slots.keySet();
  }

  /** For the text of messages: all names are known to it. */
  Dimensions forMessages() {
    return new Dimensions(dimensions, new java.util.ArrayList<>());
  }
}
