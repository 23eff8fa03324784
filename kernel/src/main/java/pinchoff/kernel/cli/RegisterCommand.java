package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import pinchoff.kernel.session.KernelInfo;

/** Makes the kernel known to notebook front ends. */
@Command(
    name = "register",
    description = {
      "Makes the kernel known to the notebook front ends of this user.",
      "What is registered is complete by itself: a copy of this program and a start-up archive."
    },
    mixinStandardHelpOptions = true,
    footer = {
      "",
      "Examples:",
      "  java -jar pinchoff.jar register",
      "  java -jar pinchoff.jar register --prefix /opt/notebooks"
    })
final class RegisterCommand implements Callable<Integer> {
  private final Streams streams;

  @Option(
      names = "--prefix",
      paramLabel = "DIR",
      description = "Write below DIR/share/jupyter instead of the user's own folder.")
  private @Nullable String prefix;

  @Option(
      names = "--name",
      paramLabel = "NAME",
      defaultValue = "pinchoff",
      description = "Name under which front ends know it (default: ${DEFAULT-VALUE}).")
  private String name = "pinchoff";

  RegisterCommand(Streams streams) {
    this.streams = streams;
  }

  @Override
  public Integer call() throws IOException, InterruptedException {
    Path jar =
        KernelJava.ownJar()
            .orElseThrow(
                () ->
                    new UsageException(
                        "only the packaged jar can be registered: java -jar pinchoff.jar register"));
    Path data =
        prefix != null
            ? Paths.of(prefix).toAbsolutePath().resolve("share").resolve("jupyter")
            : DataFolder.ofUser(System.getenv(), System.getProperty("os.name", ""));
    Kernelspec spec = new Kernelspec(data.resolve("kernels"), name);
    Path folder = spec.write(jar);
    streams
        .out()
        .println("Pinchoff " + KernelInfo.version() + " is registered as \"" + name + "\"");
    streams.out().println("  folder   " + folder);
    streams.out().println("  java     " + KernelJava.java());
    streams.err().println("writing the start-up archive: this takes some seconds");
    Optional<String> trouble = new StartArchive(spec).write();
    streams
        .out()
        .println(
            "  archive  "
                + trouble
                    .map(reason -> "none, the kernel starts without it: " + Printable.line(reason))
                    .orElse(spec.archive().toString()));
    streams
        .out()
        .println(
            "Next: open a notebook in your front end and choose the kernel \""
                + spec.displayName()
                + "\".");
    return ExitCode.FINE;
  }
}
