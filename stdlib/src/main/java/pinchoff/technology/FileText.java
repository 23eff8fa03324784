package pinchoff.technology;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import pinchoff.source.Excerpt;
import pinchoff.source.SourceText;
import pinchoff.source.Suggestions;

/** Finds a file and reads it as strict UTF-8; each way to fail is one sentence with the path. */
final class FileText {
  private static final int MOST_BYTES = 3 * JsonText.LIMITS.length();
  private static final int LONGEST_PATH = 300;
  private static final int MOST_NEIGHBOURS = 1_000;
  private static final String ENDING = ".tech.json";

  private FileText() {}

  /** The path that a text names. */
  static Path path(String text) {
    if (text.isBlank()) {
      throw new TechnologyException(
          "technology file \"\": expected the path of a file, such as \"larch180.tech.json\"");
    }
    try {
      return Path.of(text);
    } catch (InvalidPathException refused) {
      throw new TechnologyException(
          "technology file "
              + Excerpt.quote(text, LONGEST_PATH)
              + ": this can be no file name on this machine ("
              + refused.getReason()
              + "; file names are in "
              + System.getProperty("sun.jnu.encoding", "an unknown encoding")
              + ")");
    }
  }

  /** The last part of a path, which is the same on every machine. */
  static String name(Path path) {
    Path last = path.getFileName();
    return Excerpt.clip(last == null ? path.toString() : last.toString(), LONGEST_PATH);
  }

  /** The text of a file, under the name by which it was asked for. */
  static SourceText read(Path path) {
    String name = Excerpt.clip(path.toString(), LONGEST_PATH);
    return SourceText.of(name, decode(name, bytes(path)));
  }

  private static byte[] bytes(Path path) {
    if (Files.isDirectory(path)) {
      throw refused(path, "this is a directory: expected a file");
    }
    if (!Files.exists(path)) {
      throw missing(path);
    }
    if (!Files.isRegularFile(path)) {
      throw refused(path, "this is no ordinary file: expected one");
    }
    try (InputStream in = Files.newInputStream(path)) {
      byte[] bytes = in.readNBytes(MOST_BYTES + 1);
      if (bytes.length > MOST_BYTES) {
        throw refused(path, "larger than " + MOST_BYTES + " bytes: expected a technology file");
      }
      return bytes;
    } catch (AccessDeniedException denied) {
      throw refused(path, "reading it is not permitted");
    } catch (IOException failed) {
      throw refused(path, "it cannot be read (" + failed.getMessage() + ")");
    }
  }

  private static TechnologyException missing(Path path) {
    String hint = neighbour(path).map(name -> "; did you mean " + name + "?").orElse("");
    return refused(path, "there is no such file" + hint);
  }

  private static TechnologyException refused(Path path, String why) {
    return new TechnologyException(
        "technology file " + Excerpt.quote(absolute(path), LONGEST_PATH) + ": " + why);
  }

  static String absolute(Path path) {
    return path.toAbsolutePath().normalize().toString();
  }

  /** The technology file in the same folder whose name is nearest. */
  private static Optional<String> neighbour(Path path) {
    Path folder = path.toAbsolutePath().normalize().getParent();
    Path wanted = path.getFileName();
    if (folder == null || wanted == null || !Files.isDirectory(folder)) {
      return Optional.empty();
    }
    try (Stream<Path> files = Files.list(folder)) {
      List<String> names =
          files
              .limit(MOST_NEIGHBOURS)
              .map(file -> String.valueOf(file.getFileName()))
              .filter(name -> name.endsWith(ENDING))
              .sorted()
              .toList();
      return Suggestions.nearest(wanted.toString(), names)
          .map(name -> Excerpt.clip(name, LONGEST_PATH));
    } catch (IOException unreadable) {
      return Optional.empty();
    }
  }

  private static String decode(String name, byte[] bytes) {
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CharBuffer out = CharBuffer.allocate(bytes.length);
    CoderResult result = decoder.decode(in, out, true);
    String text = out.flip().toString();
    if (result.isError()) {
      throw notUtf8(SourceText.of(name, text), bytes[in.position()], in.position());
    }
    return text;
  }

  private static TechnologyException notUtf8(SourceText before, byte found, int offset) {
    Faults faults = new Faults(before);
    int end = before.text().length();
    faults.add(
        new Place(end, end),
        String.format(
            Locale.ROOT,
            "byte 0x%02X (byte %d of the file) is not UTF-8 here: expected a file in UTF-8",
            found,
            offset + 1));
    return faults.exception();
  }
}
