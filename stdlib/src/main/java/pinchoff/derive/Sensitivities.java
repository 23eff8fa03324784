package pinchoff.derive;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.page.Column;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * How much one result depends on each input, the strongest first.
 *
 * @param result the name of the result
 * @param value what it is worth
 * @param to one line for each input that it depends on
 */
public record Sensitivities(String result, Quantity value, List<To> to) implements Displayable {

  /**
   * The dependence on one input.
   *
   * @param input its name
   * @param at its value
   * @param derivative exact change of the result for a change of the input
   * @param relative relative change of the result for a relative change of the input: 2 is "2 % per
   *     1 %"; zero if either value is zero
   */
  public record To(String input, Quantity at, Quantity derivative, double relative) {}

  /** Copies the list. */
  public Sensitivities {
    to = List.copyOf(to);
  }

  static Sensitivities of(Derivation derivation, String name, Quantity value) {
    Plan plan = derivation.plan();
    double[] row = Gradients.of(plan, derivation.run().slots())[plan.slot(name)];
    List<To> all = new ArrayList<>();
    int column = 0;
    for (Input input : derivation.inputs()) {
      double derivative = row[column++];
      if (derivative != 0 && Double.isFinite(derivative)) {
        Quantity exact =
            Quantity.ofSi(derivative, value.dimension().per(input.value().dimension()));
        double relative = value.isZero() ? 0 : derivative * input.value().si() / value.si();
        all.add(new To(input.name(), input.value(), exact, relative));
      }
    }
    all.sort(
        Comparator.comparingDouble((To t) -> -Math.abs(t.relative())).thenComparing(To::input));
    return new Sensitivities(name, value, all);
  }

  /** The ranked table. */
  public Table table() {
    Table.Builder table =
        Table.of(
            Column.of("Input"),
            Column.of("at"),
            Column.of("Derivative"),
            Column.of("Change per 1 % of the input"));
    for (To t : to) {
      table.row(
          Symbol.of(t.input()),
          t.at(),
          t.derivative(),
          Quantity.ofSi(t.relative() / 100, Dimension.NONE).to("%"));
    }
    return table.caption("What moves {} = {}", Symbol.of(result), value).build();
  }

  @Override
  public MimeBundle display() {
    return Page.of(table()).display();
  }
}
