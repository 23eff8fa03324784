package pinchoff.derive;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.display.Host;
import pinchoff.formula.Name;
import pinchoff.formula.NamedValue;
import pinchoff.formula.NamedValues;
import pinchoff.quantity.Constants;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** Where a name that nobody supplied is looked up: variables of the session, then constants. */
final class Surroundings {
  private static final Map<String, Quantity> CONSTANTS =
      Map.of(
          "q",
          Constants.ELEMENTARY_CHARGE,
          "k_B",
          Constants.BOLTZMANN,
          Name.canonical("eps_0"),
          Constants.VACUUM_PERMITTIVITY,
          Name.canonical("epsilon_0"),
          Constants.VACUUM_PERMITTIVITY,
          Name.canonical("pi"),
          Quantity.ofSi(StrictMath.PI, Dimension.NONE));

  private Surroundings() {}

  /**
   * The value that a name has at this moment.
   *
   * @param written the name as it stands in the text
   */
  static Optional<Input> find(String written) {
    String name = Name.canonical(written);
    Optional<Input> variable =
        Host.current()
            .lookup(written)
            .flatMap(Surroundings::quantity)
            .map(value -> Input.of(name, value, "variable of this session"));
    return variable.or(
        () -> Optional.ofNullable(CONSTANTS.get(name)).map(c -> Input.of(name, c, "constant")));
  }

  private static Optional<Quantity> quantity(Object value) {
    if (value instanceof Quantity quantity) {
      return Optional.of(quantity);
    } else if (value instanceof Temperature temperature) {
      return Optional.of(kelvins(temperature));
    } else if (value instanceof Integer || value instanceof Long || value instanceof Double) {
      double number = ((Number) value).doubleValue();
      return Double.isFinite(number)
          ? Optional.of(Quantity.ofSi(number, Dimension.NONE))
          : Optional.empty();
    } else if (value instanceof NamedValues values) {
      List<NamedValue> all = values.namedValues();
      return all.size() == 1 ? Optional.of(all.get(0).value()) : Optional.empty();
    }
    return Optional.empty();
  }

  static Quantity kelvins(Temperature temperature) {
    return Quantity.ofSi(temperature.kelvin(), Dimension.TEMPERATURE);
  }
}
