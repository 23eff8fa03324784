package pinchoff.testing;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.opentest4j.AssertionFailedError;

/**
 * Compares an output with the reviewed file of the same name in {@code src/test/resources/golden}.
 *
 * <p>A mismatch fails with the first line that differs and leaves the new text in {@code
 * target/golden}, to be compared there. To adopt what has changed, run the test with {@code
 * -Dpinchoff.adopt} and review the difference before it is committed. An adopting run fails too, so
 * that none can pass by accident.
 */
public final class Golden {
  private static final Path REVIEWED = Path.of("src", "test", "resources", "golden");
  private static final Path ACTUAL = Path.of("target", "golden");
  private static final String ADOPT = "pinchoff.adopt";

  private Golden() {}

  /**
   * Asserts that a text is the reviewed one. The file ends in one more line end than the text.
   *
   * @param name the file below the golden folder, for example {@code page/sheet.txt}
   * @param actual the text as it is now
   */
  public static void assertMatches(String name, String actual) {
    Path reviewed = REVIEWED.resolve(name);
    String expected = Files.exists(reviewed) ? read(reviewed) : "";
    if (expected.equals(actual + "\n")) {
      return;
    }
    boolean adopt = System.getProperty(ADOPT) != null;
    Path written = adopt ? reviewed : ACTUAL.resolve(name);
    write(written, actual + "\n");
    throw new AssertionFailedError(
        name
            + (expected.isEmpty() ? " has no reviewed text" : difference(expected, actual + "\n"))
            + (adopt
                ? "; adopted: review it"
                : "; new text in " + written + ", adopt it with -D" + ADOPT),
        expected,
        actual + "\n");
  }

  private static String difference(String expected, String actual) {
    List<String> left = expected.lines().toList();
    List<String> right = actual.lines().toList();
    int line = 0;
    while (line < left.size() && line < right.size() && left.get(line).equals(right.get(line))) {
      line++;
    }
    return " differs in line "
        + (line + 1)
        + "\n  reviewed: "
        + (line < left.size() ? left.get(line) : "(end)")
        + "\n  now:      "
        + (line < right.size() ? right.get(line) : "(end)")
        + "\n";
  }

  private static String read(Path file) {
    try {
      return Files.readString(file, StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static void write(Path file, String text) {
    try {
      Files.createDirectories(file.getParent());
      Files.writeString(file, text, StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
