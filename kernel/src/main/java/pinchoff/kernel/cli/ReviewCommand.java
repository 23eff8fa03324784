package pinchoff.kernel.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.client.KernelTimeoutException;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookFile;
import pinchoff.kernel.review.Finding;
import pinchoff.kernel.review.Review;
import pinchoff.kernel.run.NotebookRun;
import pinchoff.kernel.run.NotebookRunner;
import pinchoff.kernel.run.RunOptions;

/** Reruns notebooks and compares them with what they store. */
@Command(
    name = "review",
    description = {
      "Runs notebooks again, each in a fresh kernel, and compares the values with those stored.",
      "Nothing is written. Exit code 0 only if all values are reproduced and every limit holds."
    },
    mixinStandardHelpOptions = true,
    footer = {
      "",
      "Examples:",
      "  java -jar pinchoff.jar review first-bias.out.ipynb",
      "  java -jar pinchoff.jar review --premise V_DD=1.62V first-bias.out.ipynb",
      "A notebook is a program that runs with your rights; its author could have forged what it stores."
    })
final class ReviewCommand implements Callable<Integer> {
  private final Streams streams;

  @Parameters(paramLabel = "NOTEBOOK", arity = "1..*", description = "Notebook files with outputs.")
  private List<String> notebooks = new ArrayList<>();

  @Mixin private PremiseOptions premises = new PremiseOptions();

  ReviewCommand(Streams streams) {
    this.streams = streams;
  }

  @Override
  public Integer call() throws InterruptedException {
    NotebookRunner runner =
        new NotebookRunner(
            new KernelStarter(premises.all()), RunOptions.standard().withPastErrors(true));
    int worst = ExitCode.FINE;
    for (String notebook : notebooks) {
      worst = Math.max(worst, reviewed(notebook, runner));
    }
    return worst;
  }

  private int reviewed(String argument, NotebookRunner runner) throws InterruptedException {
    try {
      return review(Paths.of(argument), runner);
    } catch (KernelGoneException | KernelTimeoutException e) {
      streams
          .err()
          .println(
              "pinchoff: "
                  + Printable.line(argument + ": no kernel could be started: " + e.getMessage()));
      return ExitCode.FAULT;
    } catch (IOException | RuntimeException e) {
      return Pinchoff.explained(e, streams);
    }
  }

  private int review(Path file, NotebookRunner runner) throws IOException, InterruptedException {
    Notebook before = NotebookFile.read(file, Limits.standard());
    NotebookRunner.requireJava(before, file.toString());
    Path folder = Optional.ofNullable(file.toAbsolutePath().getParent()).orElse(Path.of(""));
    NotebookRun run;
    try (RunPrinter printer = new RunPrinter(file.toString(), streams, false)) {
      run = runner.run(before, folder, printer);
    }
    Review review = Review.of(before, run);
    for (Finding finding : review.findings()) {
      streams.out().println(Printable.line(file + ": " + finding));
    }
    streams
        .out()
        .println(
            Printable.line(
                "%s: %s; %d of %d stored values compared"
                    .formatted(
                        file,
                        review.ok() ? "reproduced" : counted(review.findings().size()),
                        review.compared(),
                        review.stored())));
    return review.ok() ? ExitCode.FINE : ExitCode.FINDING;
  }

  private static String counted(int findings) {
    return findings == 1 ? "1 finding" : findings + " findings";
  }
}
