package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import pinchoff.kernel.json.Json;

/** A folder by which notebook front ends find and start the kernel. */
final class Kernelspec {
  private static final String USUAL_NAME = "pinchoff";
  private static final Pattern NAME = Pattern.compile("[A-Za-z0-9._-]{1,100}");

  private final Path kernels;
  private final String name;

  /**
   * A kernelspec to be written.
   *
   * @param kernels folder of all kernelspecs
   * @param name name of this one
   * @throws UsageException if front ends could not use the name
   */
  Kernelspec(Path kernels, String name) {
    if (!NAME.matcher(name).matches() || name.startsWith(".")) {
      throw new UsageException(
          "the name \""
              + name
              + "\" cannot be used: expected letters, digits, dots, hyphens and underscores,"
              + " not starting with a dot");
    }
    this.kernels = kernels;
    this.name = name;
  }

  /** Its folder. */
  Path folder() {
    return kernels.resolve(name);
  }

  /** The copy of the program in it. */
  Path jar() {
    return folder().resolve("pinchoff.jar");
  }

  /** Where its start-up archive belongs: in a folder that only its owner can change. */
  Path archive() {
    return folder().resolve("start").resolve("pinchoff.jsa");
  }

  /** What front ends show. */
  String displayName() {
    return name.equals(USUAL_NAME) ? "Pinchoff (Java)" : "Pinchoff (Java, " + name + ")";
  }

  /**
   * Writes the folder beside its place and then puts it there, so that a front end sees the old one
   * or the new one whole.
   *
   * @param program the jar to copy
   * @return the folder
   */
  Path write(Path program) throws IOException {
    Files.createDirectories(kernels);
    refuseOtherSpelling();
    Path fresh = Files.createDirectory(kernels.resolve(".new-" + UUID.randomUUID()));
    try {
      Files.copy(program, fresh.resolve("pinchoff.jar"));
      Files.createDirectory(fresh.resolve("start"), ownerOnly());
      Files.write(fresh.resolve("logo-32x32.png"), Logo.png(32));
      Files.write(fresh.resolve("logo-64x64.png"), Logo.png(64));
      Files.writeString(fresh.resolve("logo-svg.svg"), Logo.svg());
      Files.writeString(fresh.resolve("kernel.json"), description(), StandardCharsets.UTF_8);
      replaceBy(fresh);
    } finally {
      delete(fresh);
    }
    return folder();
  }

  private String description() {
    return Json.indented(
            Json.object(
                "argv",
                KernelJava.command(jar(), archive()),
                "display_name",
                displayName(),
                "interrupt_mode",
                "message",
                "language",
                "java"))
        + "\n";
  }

  /** Front ends compare names without case. */
  private void refuseOtherSpelling() throws IOException {
    try (Stream<Path> others = Files.list(kernels)) {
      Optional<String> other =
          others
              .map(path -> path.getFileName().toString())
              .filter(found -> found.equalsIgnoreCase(name) && !found.equals(name))
              .findFirst();
      if (other.isPresent()) {
        throw new UsageException(
            "the name \"" + name + "\" cannot be used: there is a kernel \"" + other.get() + "\"");
      }
    }
  }

  private void replaceBy(Path fresh) throws IOException {
    Path old = kernels.resolve(".old-" + UUID.randomUUID());
    boolean replaces = Files.exists(folder(), LinkOption.NOFOLLOW_LINKS);
    if (replaces) {
      Files.move(folder(), old);
    }
    try {
      Files.move(fresh, folder());
    } catch (IOException e) {
      if (replaces) {
        Files.move(old, folder());
      }
      throw e;
    }
    delete(old);
  }

  private static void delete(Path tree) throws IOException {
    if (!Files.exists(tree, LinkOption.NOFOLLOW_LINKS)) {
      return;
    }
    List<Path> paths;
    try (Stream<Path> walk = Files.walk(tree)) {
      paths = walk.sorted((a, b) -> b.getNameCount() - a.getNameCount()).toList();
    }
    for (Path path : paths) {
      Files.deleteIfExists(path);
    }
  }

  private static FileAttribute<?>[] ownerOnly() {
    if (!FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
      return new FileAttribute<?>[0];
    }
    return new FileAttribute<?>[] {
      PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------"))
    };
  }
}
