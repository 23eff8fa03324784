package pinchoff.derive;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import pinchoff.chart.Axis;
import pinchoff.chart.Chart;
import pinchoff.chart.Line;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.formula.Name;
import pinchoff.page.Column;
import pinchoff.page.Entry;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.source.Suggestions;

/**
 * A derivation over a range of one input.
 *
 * @param input the name of the input
 * @param dimension of the input
 * @param at its values in SI units
 * @param results the values of each step in SI units, NaN where it has none
 * @param dimensions of the steps
 */
public record Sweep(
    String input,
    Dimension dimension,
    List<Double> at,
    Map<String, List<Double>> results,
    Map<String, Dimension> dimensions)
    implements Displayable {
  private static final int MOST_POINTS = 10_000;

  /** Copies the values. */
  public Sweep {
    at = List.copyOf(at);
    results = Collections.unmodifiableMap(new LinkedHashMap<>(results));
    dimensions = Collections.unmodifiableMap(new LinkedHashMap<>(dimensions));
  }

  static Sweep of(Derivation derivation, Input input, Quantity from, Quantity to, int points) {
    from.requireDimension(input.name(), input.value().dimension());
    to.requireDimension(input.name(), input.value().dimension());
    if (points < 2 || points > MOST_POINTS) {
      throw new DerivationException(points + " points over a range: expected 2 to " + MOST_POINTS);
    }
    Plan plan = derivation.plan();
    double[] inputs = derivation.inputs().stream().mapToDouble(i -> i.value().si()).toArray();
    int swept = plan.slot(input.name());
    List<Double> at = new ArrayList<>();
    Map<String, List<Double>> results = new LinkedHashMap<>();
    for (int k = 0; k < points; k++) {
      Host.current().checkpoint();
      inputs[swept] = from.si() + (to.si() - from.si()) * k / (points - 1);
      at.add(inputs[swept]);
      double[] slots = Run.of(plan, inputs).slots();
      plan.slots()
          .forEach(
              (name, slot) -> {
                if (slot >= plan.inputs()) {
                  results.computeIfAbsent(name, n -> new ArrayList<>()).add(slots[slot]);
                }
              });
    }
    Map<String, Dimension> dimensions = new LinkedHashMap<>(plan.dimensions());
    dimensions.keySet().retainAll(results.keySet());
    return new Sweep(input.name(), input.value().dimension(), at, results, dimensions);
  }

  /** All results against the input; an empty entry where there is none. */
  public Table table() {
    List<Column> columns = new ArrayList<>();
    columns.add(Column.of(Symbol.of(input)).shared());
    results.keySet().forEach(name -> columns.add(Column.of(Symbol.of(name)).shared()));
    Table.Builder table = Table.of(columns.toArray(new Column[0]));
    for (int k = 0; k < at.size(); k++) {
      List<Entry> row = new ArrayList<>();
      row.add(Entry.of(Quantity.ofSi(at.get(k), dimension)));
      for (Map.Entry<String, List<Double>> result : results.entrySet()) {
        double value = result.getValue().get(k);
        row.add(
            Double.isNaN(value)
                ? Entry.EMPTY
                : Entry.of(Quantity.ofSi(value, dimensionOf(result.getKey()))));
      }
      table.row(row);
    }
    return table.build();
  }

  /**
   * One result against the input, as a chart.
   *
   * @throws DerivationException if there is no such result
   */
  public Chart chart(String result) {
    String name = Name.canonical(result);
    List<Double> values = results.get(name);
    if (values == null) {
      throw new DerivationException(
          result
              + " is no result of this derivation"
              + Suggestions.didYouMean(result, results.keySet())
                  .map(hint -> "; " + hint)
                  .orElse(": expected one of " + String.join(", ", results.keySet())));
    }
    return Chart.of(Axis.of(input, dimension), Axis.of(name, dimensionOf(name)))
        .titled(name + " against " + input)
        .with(Line.of(name, array(at), array(values)));
  }

  private Dimension dimensionOf(String name) {
    return Objects.requireNonNull(dimensions.get(name), name);
  }

  private static double[] array(List<Double> values) {
    return values.stream().mapToDouble(Double::doubleValue).toArray();
  }

  @Override
  public MimeBundle display() {
    return Page.of(table()).display();
  }
}
