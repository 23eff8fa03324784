package pinchoff.technology;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** The technology file of the demo notebooks. */
final class Larch {
  static final Path FILE = Path.of("..", "notebooks-demo", "larch180.tech.json");

  private Larch() {}

  static String text() {
    try {
      return Files.readString(FILE);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Technology technology() {
    return Technology.parse(text(), "larch180.tech.json");
  }
}
