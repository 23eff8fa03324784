package pinchoff.kernel.cli;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Locale;

/** Paths as the user types them. */
final class Paths {
  private static final char REPLACEMENT = '\uFFFD';

  private Paths() {}

  /**
   * The path of an argument.
   *
   * @throws UsageException if this session's locale has no way to name it
   */
  static Path of(String argument) {
    if (argument.isBlank()) {
      throw new UsageException("a path is blank: expected the name of a file or folder");
    }
    if (argument.indexOf(REPLACEMENT) >= 0) {
      throw new UsageException(unusable(argument));
    }
    try {
      Path path = Path.of(argument);
      if (argument.indexOf('?') >= 0 && !localeIsUnicode() && !Files.exists(path)) {
        throw new UsageException(unusable(argument));
      }
      return path;
    } catch (InvalidPathException e) {
      throw new UsageException(unusable(argument));
    }
  }

  /** Why a path cannot be used, and what helps. */
  static String unusable(String path) {
    return "the path \""
        + path
        + "\" cannot be used: "
        + (localeIsUnicode()
            ? "it has characters that no file name has"
            : "this session's locale (encoding "
                + encoding()
                + ") has no such characters; set LC_ALL=C.UTF-8 and run the command again");
  }

  private static boolean localeIsUnicode() {
    return encoding().toUpperCase(Locale.ROOT).startsWith("UTF");
  }

  private static String encoding() {
    return System.getProperty("sun.jnu.encoding", "UTF-8");
  }
}
