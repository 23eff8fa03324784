package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.client.KernelTimeoutException;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookFile;
import pinchoff.kernel.run.CellRun;
import pinchoff.kernel.run.NotebookRun;
import pinchoff.kernel.run.NotebookRunner;
import pinchoff.kernel.run.RunOptions;

/** Runs notebooks and writes them with their outputs. */
@Command(
    name = "run",
    description = {
      "Runs notebooks, each in a fresh kernel, and writes them with their outputs.",
      "A run stops at the first cell that fails; what came until then is written."
    },
    mixinStandardHelpOptions = true,
    footer = {
      "",
      "Examples:",
      "  java -jar pinchoff.jar run first-bias.ipynb            writes first-bias.out.ipynb",
      "  java -jar pinchoff.jar run --print --in-place first-bias.ipynb",
      "A notebook is a program that runs with your rights."
    })
final class RunCommand implements Callable<Integer> {
  private final Streams streams;

  @Parameters(paramLabel = "NOTEBOOK", arity = "1..*", description = "Notebook files to run.")
  private List<String> notebooks = new ArrayList<>();

  @Mixin private PremiseOptions premises = new PremiseOptions();

  @ArgGroup private Destination destination = new Destination();

  @Option(names = "--past-errors", description = "Go on after a cell that fails.")
  private boolean pastErrors;

  @Option(
      names = "--cell-limit",
      paramLabel = "SECONDS",
      description = "Stop a cell that takes longer: interrupt it, then end its kernel.")
  private @Nullable Double cellLimit;

  @Option(names = "--print", description = "Print what the cells show, as plain text.")
  private boolean print;

  /** Where the result goes, if not beside the notebook. */
  static final class Destination {
    @Option(
        names = "--output",
        paramLabel = "FILE",
        description = "Write the result there instead of NAME.out.ipynb beside the notebook.")
    private @Nullable String output;

    @Option(
        names = "--in-place",
        description = "Write the result over the notebook, unless the run stopped early.")
    private boolean inPlace;
  }

  RunCommand(Streams streams) {
    this.streams = streams;
  }

  @Override
  public Integer call() throws InterruptedException {
    if (destination.output != null && notebooks.size() > 1) {
      throw new UsageException(
          "--output names one file, but there are " + notebooks.size() + " notebooks to run");
    }
    Map<String, String> given = premises.all();
    NotebookRunner runner = new NotebookRunner(new KernelStarter(given), options());
    int worst = ExitCode.FINE;
    for (String notebook : notebooks) {
      worst = Math.max(worst, runOne(notebook, runner, given.keySet()));
    }
    return worst;
  }

  private RunOptions options() {
    RunOptions options = RunOptions.standard().withPastErrors(pastErrors);
    if (cellLimit == null) {
      return options;
    }
    if (!(cellLimit > 0 && cellLimit <= 1e6)) {
      throw new UsageException(
          "--cell-limit " + cellLimit + ": expected seconds, more than 0 and at most 1000000");
    }
    return options.withCellLimit(Duration.ofMillis(Math.max(1, Math.round(cellLimit * 1000))));
  }

  /** A notebook that cannot be read does not keep the others from running. */
  private int runOne(String argument, NotebookRunner runner, Set<String> given)
      throws InterruptedException {
    try {
      return run(Paths.of(argument), runner, given);
    } catch (KernelGoneException | KernelTimeoutException e) {
      streams
          .err()
          .println(
              "pinchoff: "
                  + Printable.line(argument)
                  + ": no kernel could be started: "
                  + Printable.text(String.valueOf(e.getMessage())));
      return ExitCode.FAULT;
    } catch (IOException | RuntimeException e) {
      return Pinchoff.explained(e, streams);
    }
  }

  private int run(Path file, NotebookRunner runner, Set<String> given)
      throws IOException, InterruptedException {
    Notebook notebook = NotebookFile.read(file, Limits.standard());
    NotebookRunner.requireJava(notebook, file.toString());
    Path target = target(file);
    Path folder = Optional.ofNullable(file.toAbsolutePath().getParent()).orElse(Path.of(""));
    NotebookRun run;
    try (RunPrinter printer = new RunPrinter(file.toString(), streams, print)) {
      run = runner.run(notebook, folder, printer);
    }
    if (destination.inPlace && !run.reachedEnd()) {
      target = beside(file);
    }
    NotebookFile.write(target, run.notebook());
    report(file, run, target);
    Set<String> unread = new TreeSet<>(given);
    unread.removeAll(run.premisesRead());
    unread.forEach(
        name ->
            streams
                .err()
                .println(
                    Printable.line(file + ": premise " + name + " was set, but no cell reads it")));
    return run.ok() && unread.isEmpty() ? ExitCode.FINE : ExitCode.FINDING;
  }

  private Path target(Path file) {
    Path target =
        destination.inPlace
            ? file
            : destination.output != null ? Paths.of(destination.output) : beside(file);
    Path folder = target.toAbsolutePath().getParent();
    if (Files.isDirectory(target)) {
      throw new UsageException(target + " is a folder: expected the name of a file to write");
    }
    if (folder == null || !Files.isDirectory(folder)) {
      throw new UsageException(target + " cannot be written: there is no folder " + folder);
    }
    return target;
  }

  private static Path beside(Path file) {
    String name = String.valueOf(file.getFileName());
    String stem = name.endsWith(".ipynb") ? name.substring(0, name.length() - 6) : name;
    return file.resolveSibling(stem + ".out.ipynb");
  }

  private void report(Path file, NotebookRun run, Path target) {
    for (CellRun cell : run.findings()) {
      streams
          .err()
          .println(
              Printable.line(
                  file
                      + ": "
                      + cell.label()
                      + ": "
                      + cell.error().map(e -> e.name() + ": " + e.value()).orElse("failed")));
    }
    long notReached =
        run.cells().stream().filter(c -> c.ending() == CellRun.Ending.NOT_REACHED).count();
    streams
        .out()
        .println(
            Printable.line(
                file
                    + ": "
                    + counted(run.ran())
                    + " run, "
                    + run.findings().size()
                    + " failed"
                    + (notReached > 0 ? ", " + notReached + " not reached" : "")
                    + "; written to "
                    + target));
  }

  private static String counted(int cells) {
    return cells == 1 ? "1 cell" : cells + " cells";
  }
}
