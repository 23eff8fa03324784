package pinchoff.benchmarks;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import pinchoff.derive.Derivation;
import pinchoff.formula.Code;
import pinchoff.formula.Formulas;
import pinchoff.formula.Statement;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Units;

/** Derivations: reading fifty steps, and evaluating one step again. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class DerivationBenchmark {
  private final String fifty = fifty();
  private final Code step = step();
  private final double[] results = new double[step.size()];
  private final double[] inputs = {20e-6, 290e-6, 2e-6, 1e-6};

  private static String fifty() {
    StringBuilder text = new StringBuilder("V_0 = sqrt(2*I_REF/k_n)\n");
    for (int i = 1; i < 50; i++) {
      text.append("V_%d = V_%d*0.99 + sqrt(2*I_REF/k_n)/%d // step\n".formatted(i, i - 1, i));
    }
    return text.toString();
  }

  private static Code step() {
    Statement.Definition definition =
        (Statement.Definition) Formulas.read("b", "V_OV = sqrt(2*I/(k*W/L))").statements().get(0);
    return Code.of(
        definition.value(),
        name ->
            switch (name) {
              case "I" -> 0;
              case "k" -> 1;
              case "W" -> 2;
              default -> 3;
            });
  }

  @Benchmark
  public Derivation fiftySteps() {
    return Derivation.of(fifty)
        .using("I_REF", Units.uA(20))
        .using("k_n", Quantity.parse("290 uA/V^2"));
  }

  @Benchmark
  public double oneStepAgain() {
    return step.evaluate(inputs, results);
  }

  @Benchmark
  public double oneStepByHand() {
    return Math.sqrt(2 * inputs[0] / (inputs[1] * inputs[2] / inputs[3]));
  }
}
