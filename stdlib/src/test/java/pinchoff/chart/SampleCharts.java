package pinchoff.chart;

import static pinchoff.quantity.Units.V;
import static pinchoff.quantity.Units.mV;
import static pinchoff.quantity.Units.uA;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import pinchoff.drawing.Dash;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** One chart of each kind, drawn from an invented square law; also a program that writes them. */
final class SampleCharts {
  private static final double BETA = 400e-6;
  private static final double THRESHOLD = 0.45;
  private static final double LAMBDA = 0.08;
  private static final double THERMAL = 0.02585;
  private static final double SLOPE = 1.35;

  private SampleCharts() {}

  /** Writes every chart as PNG and SVG into the folder given. */
  public static void main(String[] arguments) throws IOException {
    Path folder = Path.of(arguments[0]);
    Files.createDirectories(folder);
    for (Map.Entry<String, Chart> sample : all().entrySet()) {
      Chart chart = sample.getValue();
      Files.write(folder.resolve(sample.getKey() + ".png"), chart.picture().bytes());
      Files.write(folder.resolve(sample.getKey() + ".svg"), chart.vector().bytes());
      Files.write(
          folder.resolve(sample.getKey() + ".txt"),
          chart.description().getBytes(StandardCharsets.UTF_8));
    }
  }

  static Map<String, Chart> all() {
    Map<String, Chart> all = new LinkedHashMap<>();
    all.put("output", outputCurves());
    all.put("transfer", transferCurves());
    all.put("secondAxis", secondAxis());
    all.put("log", logPlot());
    all.put("logLog", logLog());
    all.put("map", regionMap());
    all.put("tenLines", tenLines());
    all.put("manyLines", manyLines());
    all.put("tiny", tinyRange());
    all.put("negative", negative());
    all.put("large", large());
    all.put("longNames", longNames());
    all.put("errorBelow", errorBelow());
    all.put("measured", measured());
    all.put("gaps", gaps());
    all.put("empty", empty());
    all.put("onePoint", onePoint());
    all.put("constant", constant());
    all.put("hostile", hostile());
    all.put("noise", noise());
    all.put("crowd", crowd());
    all.put("decade", withinDecade());
    return all;
  }

  static double current(double vgs, double vds) {
    double overdrive = vgs - THRESHOLD;
    if (overdrive <= 0) {
      return 0;
    }
    double effective = Math.min(vds, overdrive);
    return BETA * (overdrive - effective / 2) * effective * (1 + LAMBDA * vds);
  }

  static double allRegion(double vgs) {
    double half = (vgs - THRESHOLD) / (2 * SLOPE * THERMAL);
    double l = StrictMath.log1p(StrictMath.exp(half));
    return 2 * SLOPE * BETA * THERMAL * THERMAL * l * l;
  }

  static Chart outputCurves() {
    List<Line> family = new ArrayList<>();
    for (double vgs = 0.6; vgs < 1.25; vgs += 0.1) {
      double gate = vgs;
      family.add(
          Line.of(
              String.format(Locale.ROOT, "V_GS = %.1f V", vgs),
              Points.sampled(vds -> current(gate, vds), 0, 1.8, 400)));
    }
    Points edge = Points.sampled(v -> BETA / 2 * v * v * (1 + LAMBDA * v), 0, 1.8, 200);
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Output curves of M1 (core-n, W = 2 µm, L = 1 µm)")
        .with(family)
        .with(Locus.of("edge of saturation", edge))
        .with(Marker.of("bias point", V(1), Quantity.ofSi(current(0.9, 1), Dimension.CURRENT)));
  }

  static Chart transferCurves() {
    List<Line> currents = new ArrayList<>();
    List<Line> roots = new ArrayList<>();
    for (double vsb : new double[] {0, 0.4, 0.8}) {
      double shift = 0.45 * (Math.sqrt(0.8 + vsb) - Math.sqrt(0.8));
      String name = String.format(Locale.ROOT, "V_SB = %.1f V", vsb);
      currents.add(Line.of(name, Points.sampled(v -> current(v - shift, 1.8), 0, 1.4, 300)));
      roots.add(
          Line.of(name, Points.sampled(v -> Math.sqrt(current(v - shift, 1.8)), 0, 1.4, 300)));
    }
    return Chart.of(Axis.of("V_GS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Transfer curves at V_DS = 1.8 V")
        .with(currents)
        .with(Guide.atX("V_TH0", mV(450)))
        .below(
            Panel.of(Axis.of("√I_D", Dimension.CURRENT.sqrt()))
                .height(220)
                .with(roots)
                .with(Guide.atX("", mV(450))));
  }

  static Chart secondAxis() {
    return Chart.of(
            Axis.of("V_GS", Dimension.VOLTAGE),
            Panel.of(Axis.of("I_D", Dimension.CURRENT))
                .right(Axis.of("√I_D", Dimension.CURRENT.sqrt()))
                .with(
                    Line.of("I_D", Points.sampled(v -> current(v, 1.8), 0, 1.2, 200)),
                    Line.of("√I_D", Points.sampled(v -> Math.sqrt(current(v, 1.8)), 0, 1.2, 200))
                        .onRightAxis()))
        .titled("Transfer curve of M1");
  }

  static Chart logPlot() {
    return Chart.of(Axis.of("V_GS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT).log())
        .titled("Weak to strong inversion")
        .with(
            Line.of("all-region", Points.sampled(SampleCharts::allRegion, 0, 1.2, 400)),
            Line.of("square law", Points.sampled(v -> current(v, 0.8), 0, 1.2, 400))
                .dashed(Dash.LONG),
            Guide.atX("V_TH", mV(450)),
            Marker.of("IC = 1", mV(470), Quantity.ofSi(allRegion(0.47), Dimension.CURRENT)));
  }

  static Chart logLog() {
    double[] ics = new double[300];
    double[] gmId = new double[300];
    for (int i = 0; i < 300; i++) {
      ics[i] = StrictMath.pow(10, -3 + 6.0 * i / 299);
      gmId[i] = 1 / (SLOPE * THERMAL * (0.5 + Math.sqrt(0.25 + ics[i])));
    }
    double[] strong = new double[300];
    for (int i = 0; i < 300; i++) {
      strong[i] = 1 / (SLOPE * THERMAL * Math.sqrt(ics[i]));
    }
    return Chart.of(
            Axis.of("IC", Dimension.NONE).log(),
            Axis.of("g_m/I_D", Dimension.PER_VOLTAGE).log().range(quantity(0.5), quantity(60)))
        .titled("Transconductance efficiency")
        .with(
            Line.of("g_m/I_D", ics, gmId),
            Locus.of("strong inversion", ics, strong),
            Guide.atY("weak inversion 1/(n U_T)", quantity(1 / (SLOPE * THERMAL))));
  }

  private static Quantity quantity(double perVolt) {
    return Quantity.ofSi(perVolt, Dimension.PER_VOLTAGE);
  }

  static Chart regionMap() {
    double end = 1.8;
    return Chart.of(
            Axis.of("V_DS", Dimension.VOLTAGE).range(V(0), V(end)),
            Axis.of("V_GS", Dimension.VOLTAGE).range(V(0), V(end)))
        .titled("Region map of core-n at V_SB = 0 V")
        .with(
            Region.of("cutoff", new double[] {0, end, end, 0}, new double[] {0, 0, 0.45, 0.45}),
            Region.of(
                "saturation", new double[] {0, end, end, 1.35}, new double[] {.45, .45, 1.8, 1.8}),
            Region.of("triode", new double[] {0, 1.35, 0}, new double[] {.45, 1.8, 1.8}),
            Locus.of("V_DS = V_OV", new double[] {0, 1.35}, new double[] {.45, 1.8}),
            Guide.atY("V_TH", mV(450)),
            Marker.of("M1, 312 mV of margin", V(0.9), V(0.8)),
            Marker.of("M2", V(0.35), V(0.8)),
            Marker.of("M3", V(0.08), V(1.6)));
  }

  static Chart tenLines() {
    List<Line> lines = new ArrayList<>();
    for (int i = 0; i < 10; i++) {
      double gate = 0.55 + 0.07 * i;
      lines.add(
          Line.of(
              String.format(Locale.ROOT, "V_GS = %.2f V", gate),
              Points.sampled(v -> current(gate, v), 0, 1.8, 400)));
    }
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Ten gate voltages")
        .with(lines);
  }

  static Chart manyLines() {
    List<Line> lines = new ArrayList<>();
    for (int i = 0; i < 16; i++) {
      double phase = i * 0.4;
      lines.add(
          Line.of(
              "corner " + (i + 1),
              Points.sampled(v -> StrictMath.sin(4 * v + phase) * 1e-3, 0, 1.8, 200)));
    }
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Sixteen lines")
        .with(lines);
  }

  static Chart tinyRange() {
    return Chart.of(Axis.of("V_DD", Dimension.VOLTAGE), Axis.of("V_REF", Dimension.VOLTAGE))
        .titled("A tiny range")
        .with(
            Line.of(
                "V_REF",
                Points.sampled(v -> 1.0005 + 0.0005 * StrictMath.tanh(3 * (v - 1.8)), 1, 3, 200)));
  }

  static Chart negative() {
    return Chart.of(
            Axis.of("V_GS", Dimension.VOLTAGE), Axis.of("error of I_D", Dimension.NONE).in("%"))
        .titled("Square law against all-region")
        .with(
            Line.of(
                "error", Points.sampled(v -> StrictMath.sin(5 * v) * -0.12 - 0.02, -1, 1, 200)));
  }

  static Chart large() {
    return Chart.of(Axis.of("f", Dimension.FREQUENCY).log(), Axis.of("R", Dimension.RESISTANCE))
        .titled("Large numbers")
        .with(
            Line.of(
                "R_out",
                new double[] {1, 1e3, 1e6, 1e9, 1e12},
                new double[] {9.9e13, 8e13, 4e13, 1e12, 1e9}));
  }

  static Chart longNames() {
    return Chart.of(
            Axis.of(
                "drain-source voltage V_DS of the output device of the mirror", Dimension.VOLTAGE),
            Axis.of(
                "drain current I_D of the output device of the mirror in the bias branch",
                Dimension.CURRENT))
        .titled(
            "A title that goes on for so long that it cannot possibly fit into the width of a chart of usual size in a notebook")
        .with(
            Line.of(
                "the all-region interpolation with pinch-off computed exactly from the body factor",
                Points.sampled(v -> current(0.9, v), 0, 1.8, 100)),
            Line.of(
                "the square law with channel-length modulation in triode and saturation alike",
                Points.sampled(v -> current(0.95, v), 0, 1.8, 100)));
  }

  static Chart errorBelow() {
    return Chart.of(Axis.of("V_OV", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Square law against all-region, error below")
        .with(
            Line.of("square law", Points.sampled(v -> current(v + THRESHOLD, 0), 0, 0, 2)),
            Line.of("all-region", Points.sampled(v -> allRegion(v + THRESHOLD), -0.1, 0.5, 300)),
            Line.of(
                "square law with λ",
                Points.sampled(v -> current(v + THRESHOLD, 0.8), -0.1, 0.5, 300)))
        .below(
            Axis.of("error", Dimension.NONE).in("%"),
            Line.of(
                "square law with λ",
                Points.sampled(
                    v ->
                        v < 0.02
                            ? Double.NaN
                            : current(v + THRESHOLD, 0.8) / allRegion(v + THRESHOLD) - 1,
                    -0.1,
                    0.5,
                    300)));
  }

  static Chart measured() {
    Random random = new Random(7);
    double[] xs = new double[40];
    double[] ys = new double[40];
    for (int i = 0; i < 40; i++) {
      xs[i] = 0.03 * i;
      ys[i] = allRegion(xs[i]) * (1 + 0.05 * random.nextGaussian());
    }
    return Chart.of(Axis.of("V_GS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Measured curve and fit")
        .with(
            Dots.of("measured", xs, ys),
            Line.of("fit", Points.sampled(SampleCharts::allRegion, 0, 1.2, 200)).coloured(1));
  }

  static Chart gaps() {
    return Chart.of(Axis.of("x", Dimension.NONE), Axis.of("y", Dimension.NONE))
        .titled("Gaps and a single point")
        .with(
            Line.of(
                "with gaps",
                new double[] {0, 1, 2, 3, 4, 5, 6, 7, 8},
                new double[] {0, 1, Double.NaN, 3, Double.NaN, 2, 3, Double.NaN, 1}));
  }

  static Chart empty() {
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Nothing yet");
  }

  static Chart onePoint() {
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .with(Marker.of("M1", V(1), uA(20)));
  }

  static Chart constant() {
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .with(Line.of("ideal", Points.sampled(v -> 20e-6, 0, 1.8, 10)));
  }

  static Chart hostile() {
    return Chart.of(
            Axis.of("<script>alert(1)</script>", Dimension.VOLTAGE),
            Axis.of("a\u0000b\u202Ec & \"d\"", Dimension.CURRENT))
        .titled("</svg><img src=x onerror=alert(1)> \uD800 漢字 \u0007")
        .with(
            Line.of("]]>&amp;<b>bold</b>", Points.sampled(v -> v * v, 0, 1, 10)),
            Marker.of("line\nbreak", V(0.5), Quantity.ofSi(0.25, Dimension.CURRENT)));
  }

  static Chart noise() {
    Random random = new Random(3);
    double[] xs = new double[1_000_000];
    double[] ys = new double[1_000_000];
    double walk = 0;
    for (int i = 0; i < xs.length; i++) {
      walk += random.nextGaussian();
      xs[i] = i * 1e-6;
      ys[i] = walk * 1e-6 + 1e-5 * random.nextGaussian();
    }
    return Chart.of(Axis.of("t", Dimension.TIME), Axis.of("v_n", Dimension.VOLTAGE))
        .titled("A million points")
        .with(Line.of("noise", xs, ys));
  }

  static Chart crowd() {
    List<Item> items = new ArrayList<>();
    Random random = new Random(11);
    for (int i = 0; i < 12; i++) {
      double x = 0.2 + 1.4 * random.nextDouble();
      items.add(Marker.of("M" + (i + 1), V(x), Quantity.ofSi(current(0.9, x), Dimension.CURRENT)));
    }
    items.add(Line.of("V_GS = 0.9 V", Points.sampled(v -> current(0.9, v), 0, 1.8, 200)));
    return Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT))
        .titled("Twelve bias points on one curve")
        .with(items);
  }

  static Chart withinDecade() {
    return Chart.of(
            Axis.of("I_REF", Dimension.CURRENT).log(), Axis.of("V_OV", Dimension.VOLTAGE).log())
        .titled("Logarithmic within a decade")
        .with(Line.of("M1", Points.sampled(i -> Math.sqrt(2 * i / BETA), 12e-6, 31e-6, 50)));
  }
}
