package pinchoff.technology;

import java.util.List;
import java.util.Optional;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;
import pinchoff.source.Suggestions;

/**
 * What must hold between values of a file, each of which is right by itself. A rule speaks only if
 * all that it needs is there.
 */
final class Rules {
  private final Document document;
  private final Faults faults;

  private Rules(Document document, Faults faults) {
    this.document = document;
    this.faults = faults;
  }

  static void check(Document document, Faults faults) {
    new Rules(document, faults).check();
  }

  private void check() {
    temperatures();
    for (String name : document.names("rails")) {
      Section rail = new Section(document, "rails." + name);
      ordered(rail, "minimum", "nominal");
      ordered(rail, "nominal", "maximum");
    }
    for (String polarity : List.of("n", "p")) {
      corners(new Section(document, "corners").in(polarity));
    }
    for (String name : document.names("devices")) {
      device(new Section(document, "devices." + name));
    }
    for (String name : document.names("passives.resistors")) {
      leavesSomething(
          new Section(document, "passives.resistors." + name), "widthOffset", "minimumWidth");
    }
  }

  private void temperatures() {
    Optional<Temperature> low = document.degrees("temperatureRange.minimum");
    Optional<Temperature> high = document.degrees("temperatureRange.maximum");
    Optional<Temperature> nominal = document.degrees("nominalTemperature");
    if (low.isPresent() && high.isPresent() && low.get().compareTo(high.get()) >= 0) {
      fault(
          "temperatureRange.minimum",
          " is not below temperatureRange.maximum = " + high.get() + ": expected less");
    } else if (low.isPresent() && high.isPresent() && nominal.isPresent()) {
      if (!new TemperatureRange(low.get(), high.get()).contains(nominal.get())) {
        fault(
            "nominalTemperature",
            " is outside the temperature range: expected " + low.get() + " to " + high.get());
      }
    }
  }

  private void device(Section device) {
    threshold(device);
    Section square = device.in("squareLaw");
    if (square.amount("bodyFactor").filter(g -> g.si() > 0).isPresent()
        && square.amount("surfacePotential").isEmpty()
        && square.document().stated(square.path("surfacePotential")).isEmpty()) {
      fault(
          square.path("bodyFactor"),
          " needs "
              + square.path("surfacePotential")
              + ", which is missing: expected a voltage (V)");
    }
    rail(device);
    Section velocity = device.in("velocitySaturation");
    if (velocity.amount("velocity").isPresent()
        && velocity.amount("mobility").isEmpty()
        && device.in("process").amount("mobility").isEmpty()) {
      fault(
          velocity.path("velocity"),
          " needs a mobility: expected "
              + device.path("process.mobility")
              + " or "
              + velocity.path("mobility"));
    }
    Section alpha = device.in("alphaPower");
    below(alpha, "threshold", "supply");
    Section geometry = device.in("geometry");
    leavesSomething(geometry, "widthOffset", "minimumWidth");
    leavesSomething(geometry, "lengthOffset", "minimumLength");
    onGrid(geometry, "minimumWidth");
    onGrid(geometry, "minimumLength");
    corners(device.in("corners"));
  }

  /** The sign of the threshold against polarity and mode. */
  private void threshold(Section device) {
    String path = device.path("squareLaw.zeroBiasThreshold");
    Optional<Quantity> threshold = document.amount(path);
    String polarity = device.words("polarity");
    String mode = device.words("mode");
    if (threshold.isEmpty() || polarity.isEmpty() || mode.isEmpty()) {
      return;
    }
    boolean wantsPositive = polarity.equals("n") == mode.equals("enhancement");
    double signed = wantsPositive ? threshold.get().si() : -threshold.get().si();
    if (signed < 0) {
      fault(
          path,
          " has the wrong sign for "
              + (polarity.equals("n") ? "an n " : "a p ")
              + mode
              + " device: expected "
              + (wantsPositive ? "0 or more" : "0 or less"));
    }
  }

  private void rail(Section device) {
    Optional<String> rail = document.words(device.path("rail"));
    List<String> rails = document.names("rails");
    if (rail.isPresent() && !rails.contains(rail.get())) {
      String known = rails.isEmpty() ? "none is stated" : "expected " + String.join(" or ", rails);
      fault(
          device.path("rail"),
          " is no rail of this file: " + known,
          Suggestions.didYouMean(rail.get(), rails));
    }
  }

  private void corners(Section corners) {
    corner(corners.in("slow"), 1, "slow");
    corner(corners.in("fast"), -1, "fast");
  }

  private void corner(Section corner, int sign, String name) {
    String direction = sign > 0 ? "or more" : "or less";
    String opposite = sign > 0 ? "or less" : "or more";
    corner
        .amount("thresholdShift")
        .filter(shift -> sign * shift.si() < 0)
        .ifPresent(
            shift ->
                fault(
                    corner.path("thresholdShift"),
                    " makes the "
                        + name
                        + " corner the other one: expected 0 V "
                        + direction
                        + ", for n and p alike"));
    corner
        .amount("transconductanceFactor")
        .filter(factor -> sign * (factor.si() - 1) > 0)
        .ifPresent(
            factor ->
                fault(
                    corner.path("transconductanceFactor"),
                    " makes the " + name + " corner the other one: expected 1 " + opposite));
  }

  private void ordered(Section section, String low, String high) {
    Optional<Quantity> lower = section.amount(low);
    Optional<Quantity> higher = section.amount(high);
    if (lower.isPresent() && higher.isPresent() && lower.get().compareTo(higher.get()) > 0) {
      fault(
          section.path(low),
          " is above " + section.path(high) + " = " + higher.get() + ": expected it or less");
    }
  }

  private void below(Section section, String low, String high) {
    Optional<Quantity> lower = section.amount(low);
    Optional<Quantity> higher = section.amount(high);
    if (lower.isPresent() && higher.isPresent() && lower.get().compareTo(higher.get()) >= 0) {
      fault(
          section.path(low),
          " is not below " + section.path(high) + " = " + higher.get() + ": expected less");
    }
  }

  private void leavesSomething(Section section, String offset, String minimum) {
    Optional<Quantity> taken = section.amount(offset);
    Optional<Quantity> least = section.amount(minimum);
    if (taken.isPresent() && least.isPresent() && taken.get().compareTo(least.get()) >= 0) {
      fault(
          section.path(offset),
          " leaves nothing of " + section.path(minimum) + " = " + least.get() + ": expected less");
    }
  }

  private void onGrid(Section geometry, String key) {
    Optional<Quantity> grid = geometry.amount("grid");
    Optional<Quantity> size = geometry.amount(key);
    if (grid.isPresent() && size.isPresent() && !isMultiple(size.get(), grid.get())) {
      fault(geometry.path(key), " cannot be drawn: expected a multiple of the grid, " + grid.get());
    }
  }

  /** With a tolerance, since 220 nm over 5 nm is not 44 in binary. */
  private static boolean isMultiple(Quantity size, Quantity grid) {
    double steps = size.si() / grid.si();
    return Math.abs(steps - Math.rint(steps)) <= 1e-9 * Math.abs(steps);
  }

  private void fault(String path, String words) {
    fault(path, words, Optional.empty());
  }

  private void fault(String path, String words, Optional<String> hint) {
    document
        .stated(path)
        .ifPresent(s -> faults.add(s.place(), path + " = " + s.spelled() + words, hint));
  }
}
