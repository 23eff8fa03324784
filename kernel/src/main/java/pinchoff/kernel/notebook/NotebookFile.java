package pinchoff.kernel.notebook;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import pinchoff.kernel.json.Json;
import pinchoff.kernel.json.JsonException;
import pinchoff.kernel.limits.Limits;

/** Reads and writes notebook files. */
public final class NotebookFile {
  private NotebookFile() {}

  /**
   * Reads a file.
   *
   * @param limits how large and how deep its JSON may be
   * @throws NotebookException if there is no such file, or it is no notebook of format 4; the
   *     message names the file and the place
   */
  public static Notebook read(Path file, Limits limits) {
    if (!Files.exists(file)) {
      throw new NotebookException(file + ": there is no such file");
    }
    if (Files.isDirectory(file)) {
      throw new NotebookException(file + " is a folder: expected a notebook file");
    }
    try {
      long size = Files.size(file);
      if (size > limits.frameBytes()) {
        throw new NotebookException(
            file + " has " + size + " bytes: expected at most " + limits.frameBytes());
      }
      return parse(Files.readAllBytes(file), file.toString(), limits);
    } catch (IOException e) {
      throw new NotebookException(file + " cannot be read: " + Reason.of(e), e);
    }
  }

  /**
   * Reads the content of a file.
   *
   * @param name what to call it in messages
   * @throws NotebookException as {@link #read}
   */
  public static Notebook parse(byte[] content, String name, Limits limits) {
    try {
      return NotebookReader.read(Json.parse(content, limits));
    } catch (JsonException e) {
      throw new NotebookException(name + ": " + e.getMessage(), e);
    }
  }

  /** The content of a notebook's file: the same bytes for the same notebook, always. */
  public static byte[] bytes(Notebook notebook) {
    return (Json.indented(NotebookWriter.tree(notebook)) + "\n").getBytes(StandardCharsets.UTF_8);
  }

  /**
   * Writes a file in one step: whoever looks sees the old content or the new, also after the
   * process was killed in between.
   *
   * @throws NotebookException if it cannot be written; the old file is then untouched
   */
  public static void write(Path file, Notebook notebook) {
    try {
      AtomicFile.write(file, bytes(notebook));
    } catch (IOException e) {
      throw new NotebookException(file + " cannot be written: " + Reason.of(e), e);
    }
  }
}
