package pinchoff.benchmarks;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Units;

/** Arithmetic on quantities, in operations per second on one core. */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
public class QuantityBenchmark {
  private Quantity voltage = Units.mV(650);
  private Quantity other = Units.V(1.8);
  private Quantity current = Units.uA(20);

  @Benchmark
  public Quantity plus() {
    return voltage.plus(other);
  }

  @Benchmark
  public Quantity times() {
    return voltage.times(current);
  }

  @Benchmark
  public Quantity per() {
    return voltage.per(current);
  }

  @Benchmark
  public int compare() {
    return voltage.compareTo(other);
  }

  @Benchmark
  public String text() {
    return voltage.toString();
  }

  @Benchmark
  public Quantity parse() {
    return Quantity.parse("387 uA/V^2");
  }
}
