package pinchoff.derive;

import java.util.ArrayList;
import java.util.List;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.page.Symbol;
import pinchoff.page.Table;
import pinchoff.quantity.Quantity;

/**
 * A result with the errors of the inputs.
 *
 * @param result the name of the result
 * @param value with all inputs as they stand
 * @param least the least value at the corners of the inputs' errors
 * @param most the greatest value at these corners
 * @param rootSumSquare root of the sum of the squares of each error times its sensitivity: how far
 *     off the result is likely to be if the errors have nothing to do with each other
 * @param complete true if all corners were tried; with more than 12 errors only the two corners
 *     that the sensitivities point at
 */
public record Spread(
    String result,
    Quantity value,
    Quantity least,
    Quantity most,
    Quantity rootSumSquare,
    boolean complete)
    implements Displayable {
  private static final int MOST_FOR_ALL_CORNERS = 12;

  static Spread of(Derivation derivation, String name, Quantity value) {
    List<Input> inputs = derivation.inputs();
    List<Integer> uncertain = new ArrayList<>();
    for (int i = 0; i < inputs.size(); i++) {
      if (inputs.get(i).tolerance().isPresent()) {
        uncertain.add(i);
      }
    }
    if (uncertain.isEmpty()) {
      throw new DerivationException(
          "no input has an error: say so first, for example .within(\""
              + inputs.stream().map(Input::name).findFirst().orElse("R")
              + "\", percent(10))");
    }
    Plan plan = derivation.plan();
    double[] row = Gradients.of(plan, derivation.run().slots())[plan.slot(name)];
    double squares = 0;
    for (int i : uncertain) {
      double part = row[i] * inputs.get(i).tolerance().orElseThrow().si();
      squares += part * part;
    }
    boolean complete = uncertain.size() <= MOST_FOR_ALL_CORNERS;
    double[] values =
        corners(row, inputs, uncertain, complete).stream()
            .mapToDouble(corner -> at(derivation, name, corner))
            .toArray();
    return new Spread(
        name,
        value,
        shown(value, java.util.Arrays.stream(values).min().orElseThrow()),
        shown(value, java.util.Arrays.stream(values).max().orElseThrow()),
        shown(value, Math.sqrt(squares)),
        complete);
  }

  private static List<double[]> corners(
      double[] row, List<Input> inputs, List<Integer> uncertain, boolean all) {
    double[] middle = inputs.stream().mapToDouble(i -> i.value().si()).toArray();
    List<double[]> corners = new ArrayList<>();
    int count = all ? 1 << uncertain.size() : 2;
    for (int c = 0; c < count; c++) {
      double[] corner = middle.clone();
      for (int k = 0; k < uncertain.size(); k++) {
        int i = uncertain.get(k);
        double error = inputs.get(i).tolerance().orElseThrow().si();
        boolean up = all ? (c >> k & 1) == 1 : (row[i] >= 0) == (c == 1);
        corner[i] += up ? error : -error;
      }
      corners.add(corner);
    }
    return corners;
  }

  private static double at(Derivation derivation, String name, double[] inputs) {
    Host.current().checkpoint();
    Run run = Run.of(derivation.plan(), inputs);
    double value = run.slots()[derivation.plan().slot(name)];
    if (Double.isNaN(value)) {
      throw new DerivationException(
          name + " has no value at a corner of the errors: " + derivation.corner(inputs));
    }
    return value;
  }

  private static Quantity shown(Quantity like, double si) {
    Quantity plain = Quantity.ofSi(si, like.dimension());
    return like.displayUnit().map(plain::to).orElse(plain);
  }

  /** The three figures. */
  public Table table() {
    return Table.sheet()
        .caption("{} with the errors of the inputs", Symbol.of(result))
        .line("as it stands", value)
        .line("least", least, complete ? "of all corners" : "at the corner of the sensitivities")
        .line("greatest", most, complete ? "of all corners" : "at the corner of the sensitivities")
        .line("± root of sum of squares", rootSumSquare, "if the errors are independent")
        .build();
  }

  @Override
  public MimeBundle display() {
    return Page.of(table()).display();
  }
}
