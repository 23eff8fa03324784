package pinchoff.kernel.eval;

import java.io.IOException;
import java.io.InputStream;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.Consumer;

/** The lines of a resource that each jar and folder of the class path may have. */
final class ClassPathLines {
  private ClassPathLines() {}

  /**
   * A line that says something.
   *
   * @param text the line without spaces around it
   * @param where its resource and number, for a message
   */
  record Line(String text, String where) {}

  /** All lines that are neither empty nor a comment; what cannot be read is logged. */
  static List<Line> of(ClassLoader loader, String resource, Consumer<String> log) {
    List<Line> lines = new ArrayList<>();
    try {
      for (URL url : Collections.list(loader.getResources(resource))) {
        read(url, lines);
      }
    } catch (IOException e) {
      log.accept(resource + " cannot be read: " + e.getMessage());
    }
    return lines;
  }

  private static void read(URL url, List<Line> into) throws IOException {
    try (InputStream in = url.openStream()) {
      List<String> all = new String(in.readAllBytes(), StandardCharsets.UTF_8).lines().toList();
      for (int i = 0; i < all.size(); i++) {
        String text = all.get(i).replaceFirst("#.*", "").strip();
        if (!text.isEmpty()) {
          into.add(new Line(text, url + ", line " + (i + 1)));
        }
      }
    }
  }
}
