package pinchoff.kernel.notebook;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;

/** Why a file could not be read or written, in words. */
public final class Reason {
  private Reason() {}

  /** The reason, without the file's name where the exception knows it apart. */
  public static String of(IOException e) {
    if (e instanceof AccessDeniedException) {
      return "permission denied";
    }
    if (e instanceof NoSuchFileException) {
      return "there is no such file or folder";
    }
    if (e instanceof FileSystemException fault && fault.getReason() != null) {
      return fault.getReason();
    }
    return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
  }
}
