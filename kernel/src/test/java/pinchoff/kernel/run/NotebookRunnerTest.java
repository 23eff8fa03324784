package pinchoff.kernel.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import org.junit.jupiter.api.Test;
import pinchoff.kernel.client.CellReply;
import pinchoff.kernel.client.KernelGoneException;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookFile;
import pinchoff.kernel.notebook.Output;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.KernelInfoReply;

class NotebookRunnerTest {

  /** A kernel whose cells are words: what they do is in the word. */
  private static final class WordKernel implements RunKernel {
    private final List<String> ran = new ArrayList<>();
    private final CountDownLatch stopped = new CountDownLatch(1);
    private int count;
    private boolean closed;

    @Override
    public KernelInfoReply info(Duration limit) {
      return new KernelInfoReply(
          "5.5", "test", "1", "", Map.of("name", "java"), List.of(), List.of());
    }

    @Override
    public CellReply execute(ExecuteRequest request, OutputListener listener)
        throws InterruptedException {
      if (request.silent()) {
        return new CellReply(
            CellReply.Status.OK,
            Optional.of(count),
            Optional.empty(),
            Map.of("premises", Map.of("status", "ok", "data", Map.of("text/plain", "V_DD I_REF"))),
            List.of());
      }
      ran.add(request.code());
      listener.started(++count);
      switch (request.code()) {
        case "fail" -> {
          ErrorInfo error = new ErrorInfo("Oops", "it failed", List.of("Oops: it failed"));
          listener.error(error);
          return ended(CellReply.Status.ERROR, Optional.of(error));
        }
        case "die" -> throw new KernelGoneException("the kernel ended with exit code 9");
        case "hang" -> {
          stopped.await();
          ErrorInfo error = new ErrorInfo("Interrupted", "stopped", List.of("Interrupted"));
          listener.error(error);
          return ended(CellReply.Status.ERROR, Optional.of(error));
        }
        default -> {
          listener.stream("stdout", request.code() + "\n");
          return ended(CellReply.Status.OK, Optional.empty());
        }
      }
    }

    private CellReply ended(CellReply.Status status, Optional<ErrorInfo> error) {
      return new CellReply(status, Optional.of(count), error, Map.of(), List.of());
    }

    @Override
    public void interrupt() {
      stopped.countDown();
    }

    @Override
    public void kill() {
      stopped.countDown();
    }

    @Override
    public void close() {
      closed = true;
    }
  }

  private final WordKernel kernel = new WordKernel();

  private NotebookRun run(RunOptions options, String cells) throws Exception {
    Notebook notebook =
        NotebookFile.parse(
            ("{\"cells\": ["
                    + cells
                    + "], \"metadata\": {}, \"nbformat\": 4, \"nbformat_minor\": 5}")
                .getBytes(StandardCharsets.UTF_8),
            "n",
            Limits.standard());
    return new NotebookRunner(folder -> kernel, options)
        .run(notebook, Path.of("."), new RunListener() {});
  }

  private static String code(String source, String... tags) {
    String tagged = tags.length == 0 ? "" : "\"tags\": [\"" + String.join("\", \"", tags) + "\"]";
    return "{\"cell_type\": \"code\", \"id\": \"%s\", \"metadata\": {%s}, \"execution_count\": null, \"outputs\": [], \"source\": \"%s\"}"
        .formatted(
            "id-" + source.strip() + Math.abs(source.hashCode() + tags.length), tagged, source);
  }

  private static List<CellRun.Ending> endings(NotebookRun run) {
    return run.cells().stream().map(CellRun::ending).toList();
  }

  @Test
  void cellsRunInOrderAndTheKernelIsClosed() throws Exception {
    NotebookRun run =
        run(
            RunOptions.standard(),
            code("one")
                + ", {\"cell_type\": \"markdown\", \"id\": \"m\", \"metadata\": {}, \"source\": \"t\"}, "
                + code("two"));
    assertEquals(List.of("one", "two"), kernel.ran);
    assertTrue(run.ok() && run.reachedEnd() && kernel.closed);
    assertEquals(java.util.Set.of("V_DD", "I_REF"), run.premisesRead());
    assertEquals("cell [2]", run.cells().get(1).label());
  }

  @Test
  void theFirstFailureEndsTheRun() throws Exception {
    NotebookRun run =
        run(RunOptions.standard(), code("one") + "," + code("fail") + "," + code("two"));
    assertEquals(
        List.of(CellRun.Ending.DONE, CellRun.Ending.FAILED, CellRun.Ending.NOT_REACHED),
        endings(run));
    assertFalse(run.ok());
  }

  @Test
  void aRunMayGoOnPastErrors() throws Exception {
    NotebookRun run =
        run(RunOptions.standard().withPastErrors(true), code("fail") + "," + code("two"));
    assertEquals(List.of(CellRun.Ending.FAILED, CellRun.Ending.DONE), endings(run));
  }

  @Test
  void tagsSayWhatMayFailAndWhatIsSkipped() throws Exception {
    NotebookRun run =
        run(
            RunOptions.standard(),
            code("fail", "raises-exception")
                + ","
                + code("skipped", "skip-execution")
                + ","
                + code(" ")
                + ","
                + code("two"));
    assertEquals(
        List.of(
            CellRun.Ending.FAILED_AS_EXPECTED,
            CellRun.Ending.SKIPPED,
            CellRun.Ending.BLANK,
            CellRun.Ending.DONE),
        endings(run));
    assertTrue(run.ok());
  }

  @Test
  void aKernelThatDiesEndsTheRunWhateverTheOptions() throws Exception {
    NotebookRun run =
        run(
            RunOptions.standard().withPastErrors(true),
            code("one") + "," + code("die") + "," + code("two"));
    assertEquals(
        List.of(CellRun.Ending.DONE, CellRun.Ending.KERNEL_GONE, CellRun.Ending.NOT_REACHED),
        endings(run));
    assertEquals(1, run.findings().size());
  }

  @Test
  void aCellBeyondItsLimitIsInterrupted() throws Exception {
    NotebookRun run =
        run(
            RunOptions.standard().withCellLimit(Duration.ofMillis(50)),
            code("hang") + "," + code("two"));
    assertEquals(CellRun.Ending.OUT_OF_TIME, run.cells().get(0).ending());
  }

  @Test
  void outputsGoToTheirCells() throws Exception {
    NotebookRun run = run(RunOptions.standard(), code("one") + "," + code("two"));
    List<Output> outputs =
        ((pinchoff.kernel.notebook.CodeCell) run.notebook().cells().get(1)).outputs();
    assertEquals("two\n", ((Output.StreamText) outputs.get(0)).text());
    assertEquals(
        Map.of("name", "pinchoff", "display_name", "Pinchoff (Java)", "language", "java"),
        run.notebook().kernelspec());
  }
}
