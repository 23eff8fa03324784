package pinchoff.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.display.MimeBundle;
import pinchoff.page.Picture;
import pinchoff.quantity.Dimension;
import pinchoff.testing.Gen;
import pinchoff.testing.Golden;

/** What charts look like to programs: sizes, bytes, text. */
class ChartPictureTest {

  private static final Map<String, Chart> ALL = SampleCharts.all();

  static Stream<String> samples() {
    return ALL.keySet().stream();
  }

  private static Chart sample(String name) {
    return ALL.get(name);
  }

  @ParameterizedTest
  @MethodSource("samples")
  void aPictureHasTwicePixelsAndItsSizeInTheMetadata(String name) throws IOException {
    Picture picture = sample(name).picture();
    if (picture.type().equals(MimeBundle.SVG)) {
      return; // letters that the shipped typeface lacks, on a machine without fonts
    }
    BufferedImage image = ImageIO.read(new ByteArrayInputStream(picture.bytes()));
    assertEquals(2 * picture.width(), image.getWidth());
    assertEquals(2 * picture.height(), image.getHeight());
    MimeBundle bundle = sample(name).display();
    assertEquals(
        Map.of("width", picture.width(), "height", picture.height()),
        bundle.metadata().get(MimeBundle.PNG));
  }

  /**
   * The same bytes from every Java version: each one that runs this test compares with the file.
   */
  @Test
  void theBytesAreTheSameEverywhere() {
    String digests =
        Stream.of("output", "transfer", "log", "logLog", "map", "errorBelow", "measured", "noise")
            .map(name -> name + " " + digest(sample(name).picture().bytes()))
            .collect(Collectors.joining("\n"));
    Golden.assertMatches("chart/png-digests.txt", digests);
  }

  private static String digest(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException(e);
    }
  }

  @Test
  void eightCurvesOfFourHundredPointsStayBelow200kB() {
    Chart chart = Chart.of(Axis.of("V_DS", Dimension.VOLTAGE), Axis.of("I_D", Dimension.CURRENT));
    for (int k = 1; k <= 8; k++) {
      double vgs = 0.5 + 0.1 * k;
      chart =
          chart.with(
              Line.of(
                  "V_GS = " + k, Points.sampled(v -> SampleCharts.current(vgs, v), 0, 1.8, 400)));
    }
    int size = chart.picture().bytes().length;
    assertTrue(size < 200_000, () -> size + " bytes");
  }

  @ParameterizedTest
  @MethodSource("samples")
  void vectorsAreWellFormedAndQuiet(String name) throws Exception {
    String svg = new String(sample(name).vector().bytes(), StandardCharsets.UTF_8);
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
    factory
        .newDocumentBuilder()
        .parse(new ByteArrayInputStream(svg.getBytes(StandardCharsets.UTF_8)));
    for (String loud : new String[] {"<script", "onload", "href", "javascript:"}) {
      assertFalse(svg.contains("<" + loud) || svg.contains(" " + loud + "="), loud);
    }
  }

  @Test
  void theVectorFormIsAsReviewed() {
    Golden.assertMatches(
        "chart/output.svg", new String(sample("output").vector().bytes(), StandardCharsets.UTF_8));
  }

  @Test
  void everyChartIsDescribedInWords() {
    String all =
        ALL.entrySet().stream()
            .map(e -> e.getKey() + ": " + e.getValue().description())
            .collect(Collectors.joining("\n"));
    Golden.assertMatches("chart/descriptions.txt", all);
  }

  @Test
  void ticksCoverTheAxisInOrderAndReadBack() {
    Gen.check(
        "ranges",
        300,
        gen -> {
          double low = gen.signed(-12, 9);
          double high = low + gen.magnitude(-13, 9);
          Chart chart =
              Chart.of(Axis.of("V_X", Dimension.VOLTAGE), Axis.of("I_X", Dimension.CURRENT))
                  .with(Line.of("a", new double[] {low, high}, new double[] {0, high - low}));
          assertTrue(chart.description().contains("V_X"));
          assertTrue(chart.scene().elements().size() > 5);
        });
  }

  @Test
  void whatCannotBeDrawnIsRefusedByName() {
    assertTrue(
        assertThrows(
                ChartException.class, () -> Line.of("a", new double[] {0, 1}, new double[] {0}))
            .getMessage()
            .contains("2"));
    assertThrows(
        ChartException.class,
        () -> Points.of(new double[] {0, Double.POSITIVE_INFINITY}, new double[] {0, 1}));
    assertThrows(
        RuntimeException.class,
        () ->
            Chart.of(Axis.of("V_X", Dimension.VOLTAGE), Axis.of("I_X", Dimension.CURRENT))
                .with(
                    Marker.of("m", pinchoff.quantity.Units.uA(1), pinchoff.quantity.Units.uA(1))));
  }
}
