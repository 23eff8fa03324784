package pinchoff.benchmarks;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import pinchoff.chart.Chart;
import pinchoff.device.Known;
import pinchoff.device.OperatingPoint;
import pinchoff.device.Transistor;
import pinchoff.display.MimeBundle;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Units;
import pinchoff.technology.Technology;

/** What a cell's result costs, in milliseconds. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
public class DisplayBenchmark {
  private String text = "";
  private OperatingPoint op;
  private Chart chart;

  @Setup
  public void read() throws IOException {
    Path file = Path.of("notebooks-demo", "larch180.tech.json");
    text = Files.readString(Files.exists(file) ? file : Path.of("..").resolve(file));
    Transistor m1 =
        Technology.parse(text, "larch180").device("core-n").sized(Units.um(2), Units.um(1));
    op = m1.at(Known.vgs(Units.mV(650)), Known.vds(Units.V(1)));
    Quantity[] drives = new Quantity[8];
    for (int i = 0; i < drives.length; i++) {
      drives[i] = Units.V(0.5 + 0.1 * i);
    }
    chart = m1.outputCurves(drives).chart();
  }

  @Benchmark
  public Technology technologyFile() {
    return Technology.parse(text, "larch180");
  }

  @Benchmark
  public MimeBundle biasSheet() {
    return op.display();
  }

  @Benchmark
  public MimeBundle chartOfEightCurves() {
    return chart.display();
  }
}
