package pinchoff.technology;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;
import pinchoff.source.Excerpt;

/**
 * Writes a file so that it is either the old one or the new one, never half of it: into a file
 * beside it, which then takes its name.
 */
final class FileWriter {
  private static final int LONGEST_PATH = 300;

  private FileWriter() {}

  static void write(Path path, String text) {
    Path target = path.toAbsolutePath().normalize();
    Path folder = target.getParent();
    if (folder == null || Files.isDirectory(target)) {
      throw refused(target, "this is a directory: expected a file");
    }
    if (!Files.isDirectory(folder)) {
      throw refused(target, "there is no such folder: expected one");
    }
    try {
      replace(folder, target, text.getBytes(StandardCharsets.UTF_8));
    } catch (IOException failed) {
      throw refused(target, "it cannot be written (" + failed.getMessage() + ")");
    }
  }

  private static void replace(Path folder, Path target, byte[] bytes) throws IOException {
    Path fresh = folder.resolve("." + UUID.randomUUID() + ".tmp");
    try {
      Files.write(fresh, bytes, StandardOpenOption.CREATE_NEW);
      move(fresh, target);
    } finally {
      Files.deleteIfExists(fresh);
    }
  }

  private static void move(Path fresh, Path target) throws IOException {
    try {
      Files.move(
          fresh, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException impossible) {
      Files.move(fresh, target, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static TechnologyException refused(Path target, String why) {
    return new TechnologyException(
        "technology file " + Excerpt.quote(target.toString(), LONGEST_PATH) + ": " + why);
  }
}
