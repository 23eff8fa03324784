package pinchoff.kernel.cli;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where notebook front ends look for what belongs to a user. */
final class DataFolder {
  private DataFolder() {}

  /**
   * The user's folder.
   *
   * @param environment the variables of the process
   * @param system name of the operating system
   */
  static Path ofUser(Map<String, String> environment, String system) {
    String chosen = environment.getOrDefault("JUPYTER_DATA_DIR", "");
    if (!chosen.isBlank()) {
      return Paths.of(chosen).toAbsolutePath();
    }
    String kind = system.toLowerCase(Locale.ROOT);
    String roaming = environment.getOrDefault("APPDATA", "");
    if (kind.startsWith("windows") && !roaming.isBlank()) {
      return Paths.of(roaming).resolve("jupyter");
    }
    Path home = Paths.of(environment.getOrDefault("HOME", System.getProperty("user.home", "")));
    if (kind.startsWith("mac")) {
      return home.resolve("Library").resolve("Jupyter");
    }
    String xdg = environment.getOrDefault("XDG_DATA_HOME", "");
    Path share = xdg.isBlank() ? home.resolve(".local").resolve("share") : Paths.of(xdg);
    return share.resolve("jupyter");
  }
}
