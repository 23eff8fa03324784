package pinchoff.kernel.cli;

import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import pinchoff.kernel.client.KernelProcess;

/** How a kernel process is started: with the Java and the program that run now. */
final class KernelJava {
  /** What a kernel needs of its Java, and nothing that only one version knows. */
  private static final List<String> FLAGS =
      List.of("-Djava.awt.headless=true", "-Dfile.encoding=UTF-8");

  /** Silence at start: a missing or foreign archive is no news for the user. */
  private static final List<String> QUIET =
      List.of("-XX:+IgnoreUnrecognizedVMOptions", "-Xlog:disable", "-Xlog:all=error:stderr");

  private KernelJava() {}

  /** The command of a kernel from where this program itself was started. */
  static List<String> command() {
    Optional<Path> jar = ownJar();
    return jar.isPresent()
        ? command(List.of(), List.of("-jar", jar.get().toString()), List.of())
        : command(
            List.of(),
            List.of("-cp", System.getProperty("java.class.path", ""), Main.class.getName()),
            List.of());
  }

  /** The command of a registered kernel, which uses a start-up archive if it can. */
  static List<String> command(Path jar, Path archive) {
    return command(
        quietly("-XX:SharedArchiveFile=" + archive), List.of("-jar", jar.toString()), List.of());
  }

  /** The command of a kernel that writes a start-up archive when it ends. */
  static List<String> rehearsal(Path jar, Path archive) {
    return command(
        quietly("-XX:ArchiveClassesAtExit=" + archive),
        List.of("-jar", jar.toString()),
        List.of(KernelCommand.REHEARSAL));
  }

  /** The jar that runs now; empty when it runs from class folders. */
  static Optional<Path> ownJar() {
    try {
      Path place = Path.of(Main.class.getProtectionDomain().getCodeSource().getLocation().toURI());
      return Files.isRegularFile(place) ? Optional.of(place.toAbsolutePath()) : Optional.empty();
    } catch (URISyntaxException e) {
      return Optional.empty();
    }
  }

  /** The java program that runs now. */
  static Path java() {
    Path bin = Path.of(System.getProperty("java.home"), "bin");
    Path windows = bin.resolve("java.exe");
    return Files.exists(windows) ? windows : bin.resolve("java");
  }

  private static List<String> quietly(String flag) {
    List<String> flags = new ArrayList<>(QUIET);
    flags.add(flag);
    return flags;
  }

  private static List<String> command(
      List<String> flags, List<String> program, List<String> arguments) {
    List<String> command = new ArrayList<>();
    command.add(java().toString());
    command.addAll(flags);
    command.addAll(FLAGS);
    command.addAll(program);
    command.add(KernelCommand.NAME);
    command.addAll(arguments);
    command.add(KernelProcess.CONNECTION_FILE);
    return command;
  }
}
