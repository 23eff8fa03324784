package pinchoff.kernel.notebook;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.Set;
import java.util.UUID;

/**
 * Replaces a file in one step: the content goes to a new file in the same folder, which then takes
 * the name of the old one. A process that is killed at any moment leaves the old file or the new.
 */
public final class AtomicFile {
  private AtomicFile() {}

  /**
   * Writes a file. It keeps the permissions that it had; a link stays a link to the file that is
   * replaced.
   *
   * @throws IOException if it cannot be written; the old file is then untouched and nothing is left
   *     beside it
   */
  public static void write(Path file, byte[] content) throws IOException {
    Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
    if (Files.isDirectory(target)) {
      throw new FileSystemException(file.toString(), null, "it is a folder");
    }
    Path beside = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID());
    try {
      try (FileChannel channel =
          FileChannel.open(
              beside, Set.of(StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE))) {
        ByteBuffer rest = ByteBuffer.wrap(content);
        while (rest.hasRemaining()) {
          channel.write(rest);
        }
        channel.force(true);
      }
      keepPermissions(target, beside);
      move(beside, target);
    } finally {
      Files.deleteIfExists(beside);
    }
  }

  private static void keepPermissions(Path old, Path fresh) throws IOException {
    PosixFileAttributeView view = Files.getFileAttributeView(fresh, PosixFileAttributeView.class);
    if (view != null && Files.exists(old)) {
      view.setPermissions(Files.getPosixFilePermissions(old));
    }
  }

  private static void move(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
