package pinchoff.claims;

import java.util.List;
import java.util.Optional;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.formula.Name;
import pinchoff.formula.NamedValue;
import pinchoff.formula.NamedValues;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.page.ValuesSheet;
import pinchoff.quantity.Limits;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.QuantityException;

/**
 * A named input of a notebook that can be set from outside when the notebook is run again.
 *
 * @param name its name, which formulas can use too
 * @param value what it is worth in this run
 * @param standard what it is worth if nobody sets it
 * @param limits what it must keep to
 * @param overridden true if it was set from outside
 */
public record Premise(
    String name, Quantity value, Quantity standard, Limits limits, boolean overridden)
    implements Displayable, NamedValues {

  /**
   * Checks the name and the limits.
   *
   * @throws ClaimException if the value is outside the limits, with who set it
   */
  public Premise {
    if (!Name.isValid(name)) {
      throw new ClaimException(
          "name of a premise: \""
              + name
              + "\": expected letters, digits and _, so that formulas can use it");
    }
    if (!limits.contains(value)) {
      throw new ClaimException(
          "premise %s = %s%s: expected %s"
              .formatted(name, value, overridden ? ", set from outside" : "", limits));
    }
  }

  /**
   * An input with its usual value.
   *
   * @throws ClaimException if a value was set from outside that is no quantity of the same kind
   */
  public static Premise of(String name, Quantity standard) {
    Optional<String> given = Host.current().premise(name);
    Quantity value = given.map(text -> parse(name, text, standard)).orElse(standard);
    Premise premise = new Premise(name, value, standard, Limits.NONE, given.isPresent());
    Register.ofThisHost().note(premise);
    return premise;
  }

  private static Quantity parse(String name, String text, Quantity standard) {
    try {
      Quantity value = Quantity.parse(text);
      return value.requireDimension("premise " + name, standard.dimension());
    } catch (QuantityException refused) {
      throw new ClaimException(
          "premise %s, set from outside to \"%s\": %s"
              .formatted(
                  name,
                  pinchoff.source.Excerpt.clip(text, 60),
                  String.valueOf(refused.getMessage()).lines().findFirst().orElse("")));
    }
  }

  /**
   * The same premise with limits that whoever sets it must keep to.
   *
   * @throws ClaimException if its value does not keep to them
   */
  public Premise between(Quantity least, Quantity most) {
    least.requireDimension("least of premise " + name, standard.dimension());
    most.requireDimension("most of premise " + name, standard.dimension());
    return new Premise(name, value, standard, Limits.between(least, most), overridden);
  }

  @Override
  public List<NamedValue> namedValues() {
    return List.of(
        new NamedValue(name, value, overridden ? "premise, set from outside" : "premise"));
  }

  /** Its name and value, and whether it was set from outside. */
  public Page page() {
    Table.Builder table = Table.sheet();
    String remark =
        overridden
            ? "set from outside; usually " + standard
            : limits.equals(Limits.NONE) ? "" : limits.toString();
    table.line(Symbol.of(name), value, remark);
    return Page.untitled()
        .table(table)
        .premise(new ValuesSheet.Premise(name, value, overridden))
        .value(Value.of(Value.Kind.PARAMETER, "premise " + name, name, value))
        .build();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }

  @Override
  public String toString() {
    return name + " = " + value;
  }
}
