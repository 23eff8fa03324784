package pinchoff.kernel.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * The cells that are run to record a start-up archive: some Java of every kind, and what each
 * library on the class path suggests in a resource {@code META-INF/pinchoff/rehearsal} (UTF-8,
 * cells apart by lines of three hyphens). A cell that fails does no harm.
 */
final class Rehearsal {
  private static final String RESOURCE = "META-INF/pinchoff/rehearsal";

  private static final List<String> PLAIN =
      List.of(
          "1 + 1",
          "var x = 1.5;\nint n = 3;\nString text = \"width\";",
          "double twice(double y) { return 2 * y; }",
          "record Size(double width, double length) {}\nnew Size(twice(x), 1)",
          "for (int i = 0; i < n; i++) { System.out.println(i + \" \" + text); }",
          "java.util.stream.Stream.of(1, 2, 3).map(i -> i * x).toList()",
          "int wrong = \"text\";",
          "throw new IllegalStateException(\"expected\");");

  private Rehearsal() {}

  static List<String> cells() throws IOException {
    List<String> cells = new ArrayList<>(PLAIN);
    ClassLoader loader = Rehearsal.class.getClassLoader();
    Collections.list(loader.getResources(RESOURCE)).forEach(found -> cells.addAll(read(found)));
    return cells;
  }

  private static List<String> read(URL resource) {
    try (InputStream in = resource.openStream()) {
      return List.of(new String(in.readAllBytes(), StandardCharsets.UTF_8).split("(?m)^---$"));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
