package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import pinchoff.kernel.notebook.Reason;

/**
 * Values for premises: lines of {@code NAME=VALUE}, with comments after {@code #} at the start of a
 * line. They reach a kernel by a file that only its user can read, named in its environment.
 */
final class PremiseFile {
  /** The variable that names the file. */
  static final String VARIABLE = "PINCHOFF_PREMISES";

  private static final int MOST_BYTES = 1 << 20;

  private PremiseFile() {}

  /** Reads a file of the user's. */
  static Map<String, String> read(Path file) {
    try {
      if (Files.size(file) > MOST_BYTES) {
        throw new UsageException(file + ": larger than " + MOST_BYTES + " bytes");
      }
      Map<String, String> premises = new LinkedHashMap<>();
      int number = 0;
      for (String line : Files.readAllLines(file, StandardCharsets.UTF_8)) {
        number++;
        if (!line.isBlank() && !line.startsWith("#")) {
          add(premises, line, file + ", line " + number);
        }
      }
      return premises;
    } catch (IOException e) {
      throw new UsageException("premises " + file + ": " + Reason.of(e));
    }
  }

  /** Adds one {@code NAME=VALUE}. */
  static void add(Map<String, String> premises, String text, String where) {
    int equals = text.indexOf('=');
    String name = equals < 0 ? "" : text.substring(0, equals).strip();
    String value = equals < 0 ? "" : text.substring(equals + 1).strip();
    if (name.isEmpty() || value.isEmpty()) {
      throw new UsageException(
          where + ": \"" + Printable.line(text) + "\": expected NAME=VALUE, such as V_DD=1.62V");
    }
    if (premises.put(name, value) != null) {
      throw new UsageException(where + ": premise " + Printable.line(name) + " is set twice");
    }
  }

  /** Writes a file for a kernel. */
  static Path write(Map<String, String> premises) throws IOException {
    Path file = Files.createTempFile("pinchoff-premises", ".txt"); // readable by this user alone
    List<String> lines =
        premises.entrySet().stream().map(e -> e.getKey() + "=" + e.getValue()).toList();
    Files.write(file, lines, StandardCharsets.UTF_8);
    return file;
  }

  /** What the environment of this process sets. */
  static Map<String, String> ofEnvironment() {
    String file = System.getenv(VARIABLE);
    return file == null || file.isBlank() ? Collections.emptyMap() : read(Paths.of(file));
  }
}
