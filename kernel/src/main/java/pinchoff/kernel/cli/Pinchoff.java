package pinchoff.kernel.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import pinchoff.kernel.notebook.NotebookException;
import pinchoff.kernel.notebook.Reason;
import pinchoff.kernel.session.KernelInfo;
import pinchoff.kernel.wire.ConnectionException;

/** The whole program: commands in, exit code out. */
@Command(
    name = "pinchoff",
    description = "A notebook kernel for MOS hand analysis.",
    mixinStandardHelpOptions = true,
    versionProvider = Pinchoff.Version.class,
    footer = {
      "",
      "Example:",
      "  java -jar pinchoff.jar run first-bias.ipynb",
      "Exit codes: 0 fine, 1 a finding (a cell failed), 2 usage or unreadable input, 3 our own fault"
    })
public final class Pinchoff implements Callable<Integer> {
  @Spec private CommandSpec spec = CommandSpec.create();

  private Pinchoff() {}

  /**
   * Runs one command.
   *
   * @return the exit code
   */
  static int run(String[] args, Streams streams) {
    try {
      return args.length == 2 && args[0].equals(KernelCommand.NAME) && !args[1].startsWith("-")
          ? guarded(() -> KernelCommand.serve(args[1], streams), streams)
          : commands(streams).execute(args);
    } finally {
      streams.out().flush();
      streams.err().flush();
    }
  }

  /** Ends the process; a kernel at once, whatever the cells' threads and exit hooks still do. */
  static void end(String[] args, int code) {
    if (args.length == 2 && args[0].equals(KernelCommand.NAME)) {
      Runtime.getRuntime().halt(code);
    }
    System.exit(code);
  }

  @Override
  public Integer call() {
    throw new CommandLine.ParameterException(
        spec.commandLine(), "a command is missing: expected run, review, register or kernel");
  }

  private static CommandLine commands(Streams streams) {
    CommandLine commands =
        new CommandLine(new Pinchoff())
            .addSubcommand(new RunCommand(streams))
            .addSubcommand(new ReviewCommand(streams))
            .addSubcommand(new RegisterCommand(streams))
            .addSubcommand(new KernelCommand(streams));
    return commands
        .setOut(new PrintWriter(streams.out(), true, StandardCharsets.UTF_8))
        .setErr(new PrintWriter(streams.err(), true, StandardCharsets.UTF_8))
        .setUsageHelpWidth(100)
        .setExecutionExceptionHandler((fault, command, parsed) -> explained(fault, streams))
        .setParameterExceptionHandler(
            (fault, arguments) -> {
              streams.err().println("pinchoff: " + Printable.line(fault.getMessage()));
              streams
                  .err()
                  .println(
                      "try: "
                          + fault.getCommandLine().getCommandSpec().qualifiedName()
                          + " --help");
              return ExitCode.USAGE;
            });
  }

  private static int guarded(Callable<Integer> command, Streams streams) {
    try {
      return command.call();
    } catch (Exception e) {
      return explained(e, streams);
    }
  }

  /** Says what went wrong: a sentence if it is about the user's input, else all that is known. */
  static int explained(Exception fault, Streams streams) {
    if (fault instanceof UsageException
        || fault instanceof NotebookException
        || fault instanceof ConnectionException) {
      streams.err().println("pinchoff: " + Printable.line(fault.getMessage()));
      return ExitCode.USAGE;
    }
    if (fault instanceof InvalidPathException path) {
      streams.err().println("pinchoff: " + Printable.line(Paths.unusable(path.getInput())));
      return ExitCode.USAGE;
    }
    if (fault instanceof IOException e) {
      streams.err().println("pinchoff: " + Printable.line(Reason.of(e)));
      return ExitCode.FAULT;
    }
    streams.err().println("pinchoff: this is a fault of Pinchoff itself");
    fault.printStackTrace(streams.err());
    return ExitCode.FAULT;
  }

  /** What {@code --version} prints. */
  static final class Version implements CommandLine.IVersionProvider {
    @Override
    public String[] getVersion() {
      return new String[] {
        "pinchoff " + KernelInfo.version() + " (Java " + Runtime.version() + ")"
      };
    }
  }
}
