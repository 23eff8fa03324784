package pinchoff.kernel.cli;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import pinchoff.kernel.eval.EvaluatorOptions;
import pinchoff.kernel.eval.JShellEvaluator;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.transport.KernelServer;
import pinchoff.kernel.wire.ConnectionFile;
import pinchoff.kernel.wire.ConnectionInfo;

/** The kernel itself, as notebook front ends start it. */
@Command(
    name = KernelCommand.NAME,
    description = "Serves one notebook: this is what notebook front ends start.",
    mixinStandardHelpOptions = true,
    footer = {"", "Example:", "  java -jar pinchoff.jar kernel connection.json"})
final class KernelCommand implements Callable<Integer> {
  static final String NAME = "kernel";

  /** Marks a run that is recorded for a start-up archive: it ends as ordinary programs do. */
  static final String REHEARSAL = "--rehearsal";

  private final Streams streams;

  /** Read by nobody: with it there are three arguments, and {@link Pinchoff#end} lets Java exit. */
  @SuppressWarnings("UnusedVariable")
  @Option(names = REHEARSAL, hidden = true)
  private boolean rehearsal;

  @Parameters(
      paramLabel = "CONNECTION_FILE",
      description = "JSON file with the addresses and the key, written by the front end.")
  private String connectionFile = "";

  KernelCommand(Streams streams) {
    this.streams = streams;
  }

  @Override
  public Integer call() throws InterruptedException {
    return serve(connectionFile, streams);
  }

  /**
   * Runs the kernel until it is told to end. Cells see the same locale everywhere, so that a number
   * prints the same on every machine.
   */
  static int serve(String connectionFile, Streams streams) throws InterruptedException {
    Path file = Paths.of(connectionFile);
    ConnectionInfo connection = ConnectionFile.read(file);
    Map<String, String> premises = PremiseFile.ofEnvironment();
    Locale.setDefault(Locale.ROOT);
    Consumer<String> log = line -> streams.err().println("pinchoff: " + Printable.line(line));
    try (KernelServer server =
        new KernelServer(
            connection,
            Limits.standard(),
            () ->
                JShellEvaluator.create(
                    EvaluatorOptions.standard().withLog(log).withPremises(premises)),
            log)) {
      String parent = System.getenv("JPY_PARENT_PID");
      if (parent != null) {
        server.endWith(parent);
      }
      server.awaitEnd();
    }
    return ExitCode.FINE;
  }
}
