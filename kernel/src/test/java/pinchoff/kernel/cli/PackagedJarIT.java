package pinchoff.kernel.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.kernel.client.KernelProcess;
import pinchoff.kernel.client.OutputListener;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookFile;
import pinchoff.kernel.notebook.Output;
import pinchoff.kernel.protocol.ExecuteRequest;
import pinchoff.kernel.protocol.ExecuteResult;
import pinchoff.kernel.review.Review;
import pinchoff.kernel.run.CellRun;
import pinchoff.kernel.run.NotebookRun;

/** The packaged program as its users start it. */
class PackagedJarIT {
  private static final Path JAR = Path.of(System.getProperty("pinchoff.jar"));
  private static final Path DEMO = Path.of(System.getProperty("pinchoff.demo"));

  @TempDir Path folder;

  /** How a command ended. */
  private record Ended(int code, String out, String err) {}

  private Ended pinchoff(Map<String, String> environment, String... arguments)
      throws IOException, InterruptedException {
    List<String> command =
        new ArrayList<>(List.of(KernelJava.java().toString(), "-jar", JAR.toString()));
    command.addAll(List.of(arguments));
    ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile());
    builder.environment().putAll(environment);
    Path out = folder.resolve("stdout.txt");
    Path err = folder.resolve("stderr.txt");
    Process process = builder.redirectOutput(out.toFile()).redirectError(err.toFile()).start();
    assertTrue(process.waitFor(120, TimeUnit.SECONDS), "did not end");
    Ended ended =
        new Ended(
            process.exitValue(),
            Files.readString(out, StandardCharsets.UTF_8),
            Files.readString(err, StandardCharsets.UTF_8));
    Files.delete(out);
    Files.delete(err);
    return ended;
  }

  private Ended pinchoff(String... arguments) throws IOException, InterruptedException {
    return pinchoff(Map.of(), arguments);
  }

  @BeforeEach
  void bringTheDemo() throws IOException {
    for (String file : List.of("first-bias.ipynb", "larch180.tech.json")) {
      Files.copy(DEMO.resolve(file), folder.resolve(file));
    }
  }

  private Path notebook(String name, String... cells) throws IOException {
    StringBuilder json = new StringBuilder("{\"cells\": [");
    for (int i = 0; i < cells.length; i++) {
      json.append(i == 0 ? "" : ",")
          .append("{\"cell_type\": \"code\", \"id\": \"c")
          .append(i)
          .append(
              "\", \"metadata\": {}, \"execution_count\": null, \"outputs\": [], \"source\": \"")
          .append(cells[i].replace("\\", "\\\\").replace("\"", "\\\"").replace("\n", "\\n"))
          .append("\"}");
    }
    json.append("], \"metadata\": {}, \"nbformat\": 4, \"nbformat_minor\": 5}");
    return Files.writeString(folder.resolve(name), json);
  }

  private List<CodeCell> cells(String name) {
    return NotebookFile.read(folder.resolve(name), Limits.standard()).cells().stream()
        .filter(CodeCell.class::isInstance)
        .map(CodeCell.class::cast)
        .toList();
  }

  @Test
  void theFirstNotebookRuns() throws Exception {
    Ended ended = pinchoff("run", "--print", "first-bias.ipynb");
    assertEquals(0, ended.code(), ended::err);
    assertTrue(ended.out().contains("saturation: clear of its edges by 200 mV"), ended::out);
    int tables = 0;
    int pictures = 0;
    int values = 0;
    for (CodeCell cell : cells("first-bias.out.ipynb")) {
      for (Output output : cell.outputs()) {
        assertFalse(output instanceof Output.Failure, output::toString);
        if (output instanceof Output.Rich rich) {
          tables += String.valueOf(rich.data().get("text/html")).contains("<table") ? 1 : 0;
          pictures += rich.data().containsKey("image/png") ? 1 : 0;
          values += rich.data().containsKey("application/vnd.pinchoff.values+json") ? 1 : 0;
        }
      }
    }
    assertTrue(tables >= 2 && pictures >= 2 && values >= 1, tables + " " + pictures + " " + values);
  }

  @Test
  void aRunIsReproducible() throws Exception {
    assertEquals(0, pinchoff("run", "--output", "a.ipynb", "first-bias.ipynb").code());
    assertEquals(0, pinchoff("run", "--output", "b.ipynb", "first-bias.ipynb").code());
    assertEquals(-1, Files.mismatch(folder.resolve("a.ipynb"), folder.resolve("b.ipynb")));
  }

  @Test
  void aRunStopsAtTheFirstFailure() throws Exception {
    notebook("fails.ipynb", "var a = 1;", "int half = a / 0;", "System.out.println(\"later\");");
    Ended ended = pinchoff("run", "fails.ipynb");
    assertEquals(1, ended.code());
    assertTrue(ended.err().contains("ArithmeticException: / by zero"), ended::err);
    assertTrue(ended.err().contains("line 1, column 14"), ended::err);
    assertFalse(ended.err().contains("pinchoff.kernel"), ended::err);
    assertTrue(ended.out().contains("2 cells run, 1 failed, 1 not reached"), ended::out);
    assertEquals(List.of(), cells("fails.out.ipynb").get(2).outputs());
    Ended past = pinchoff("run", "--past-errors", "--output", "past.ipynb", "fails.ipynb");
    assertEquals(1, past.code());
    assertEquals(1, cells("past.ipynb").get(2).outputs().size());
  }

  @Test
  void inPlaceWritesTheNotebookItself() throws Exception {
    notebook("mine.ipynb", "6 * 7");
    assertEquals(0, pinchoff("run", "--in-place", "mine.ipynb").code());
    assertTrue(cells("mine.ipynb").get(0).outputs().toString().contains("42"));
    assertFalse(Files.exists(folder.resolve("mine.out.ipynb")));
  }

  @Test
  void premisesAreSetFromOutside() throws Exception {
    notebook("premises.ipynb", "var V_DD = premise(\"V_DD\", V(1.8));\nV_DD.value()");
    Ended usual = pinchoff("run", "--print", "premises.ipynb");
    assertTrue(usual.out().contains("1.8 V"), usual::out);
    Ended set = pinchoff("run", "--print", "--premise", "V_DD=1.62 V", "premises.ipynb");
    assertEquals(0, set.code(), set::err);
    assertTrue(set.out().contains("1.62 V"), set::out);
    Files.writeString(folder.resolve("low.premises"), "# a low supply\nV_DD = 1.5V\n");
    Ended file = pinchoff("run", "--print", "--premises", "low.premises", "premises.ipynb");
    assertTrue(file.out().contains("1.5 V"), file::out);
    Ended unread = pinchoff("run", "--premise", "V_SS=0 V", "premises.ipynb");
    assertEquals(1, unread.code());
    assertTrue(unread.err().contains("premise V_SS was set, but no cell reads it"), unread::err);
    Ended wrong = pinchoff("run", "--premise", "V_DD=20 uA", "premises.ipynb");
    assertEquals(1, wrong.code());
    assertTrue(wrong.err().contains("20 µA is a current (A): expected a voltage"), wrong::err);
  }

  /** Every number of the first notebook and of its technology file, changed in turn, is found. */
  @Test
  void aReviewFindsWhateverWasChanged() throws Exception {
    assertEquals(0, pinchoff("run", "first-bias.ipynb").code());
    Ended honest = pinchoff("review", "first-bias.out.ipynb");
    assertEquals(0, honest.code(), honest::out);
    assertTrue(honest.out().contains("reproduced; 52 of 52 stored values compared"), honest::out);
    Notebook rerun = NotebookFile.read(folder.resolve("first-bias.out.ipynb"), Limits.standard());
    List<CellRun> cells = new ArrayList<>();
    for (CodeCell cell : cells("first-bias.out.ipynb")) {
      cells.add(
          new CellRun(1, cell.id(), CellRun.Ending.DONE, cell.executionCount(), Optional.empty()));
    }
    NotebookRun run = new NotebookRun(rerun, cells, Set.of());
    assertTrue(Review.of(rerun, run).ok());
    String stored = Files.readString(folder.resolve("first-bias.out.ipynb"));
    Matcher value =
        Pattern.compile("\"unit\": \"[^\"]*\",\\s+\"value\": (-?[0-9.eE-]+)").matcher(stored);
    int changed = 0;
    while (value.find()) {
      double old = Double.parseDouble(value.group(1));
      String forged =
          stored.substring(0, value.start(1))
              + (old == 0 ? 1e-6 : old * 1.001)
              + stored.substring(value.end(1));
      byte[] bytes = forged.getBytes(StandardCharsets.UTF_8);
      Review review = Review.of(NotebookFile.parse(bytes, "forged", Limits.standard()), run);
      assertFalse(review.ok(), () -> "not found: " + value.group());
      changed++;
    }
    assertTrue(changed >= 40, "only " + changed + " values were changed");
    Path tech = folder.resolve("larch180.tech.json");
    String text = Files.readString(tech);
    Files.writeString(tech, text.replace("\"0.45 V\"", "\"0.46 V\""));
    Ended moved = pinchoff("review", "first-bias.out.ipynb");
    assertEquals(1, moved.code());
    assertTrue(
        moved.out().lines().findFirst().orElse("").contains("technology changed"), moved::out);
    assertTrue(moved.out().contains("moved: I_D was"), moved::out);
    assertEquals(1, pinchoff("review", "first-bias.ipynb").code(), "nothing is stored");
  }

  @Test
  void aKernelThatDiesIsNamedAndThePartIsSaved() throws Exception {
    notebook(
        "dies.ipynb",
        "1 + 1",
        "ProcessHandle.current().pid();\nnew ProcessBuilder(\"kill\", \"-9\", \"\" + ProcessHandle.current().pid()).start().waitFor();",
        "2 + 2");
    Ended ended = pinchoff("run", "dies.ipynb");
    assertEquals(1, ended.code(), ended::err);
    assertTrue(cells("dies.out.ipynb").get(0).outputs().toString().contains("2"));
    assertTrue(ended.err().contains("cell"), ended::err);
  }

  @Test
  void aCellThatTakesTooLongIsStopped() throws Exception {
    notebook("slow.ipynb", "var kept = 1;", "while (true) { }", "kept");
    Ended ended = pinchoff("run", "--cell-limit", "6", "--past-errors", "slow.ipynb");
    assertEquals(1, ended.code(), ended::err);
    assertTrue(cells("slow.out.ipynb").get(2).outputs().toString().contains("1"));
  }

  static Stream<Arguments> refusals() {
    return Stream.of(
        refusal("no command", "a command is missing"),
        refusal("unknown option", "Unknown option", "run", "--fast", "first-bias.ipynb"),
        refusal("no notebook", "Missing required parameter", "run"),
        refusal("missing notebook", "there is no such file", "run", "nothing.ipynb"),
        refusal("a folder", "folder", "run", "."),
        refusal("not JSON", "broken.ipynb", "run", "broken.ipynb"),
        refusal("another kernel's", "is a notebook for another kernel", "run", "other.ipynb"),
        refusal(
            "two places", "mutually exclusive", "run", "--in-place", "--output", "x", "a.ipynb"),
        refusal(
            "no such folder",
            "there is no folder",
            "run",
            "--output",
            "no/x.ipynb",
            "first-bias.ipynb"),
        refusal(
            "bad premise", "expected NAME=VALUE", "run", "--premise", "V_DD", "first-bias.ipynb"),
        refusal("bad limit", "--cell-limit", "run", "--cell-limit", "-1", "first-bias.ipynb"),
        refusal("missing connection file", "there is no such file", "kernel", "nothing.json"),
        refusal("broken connection file", "broken.ipynb", "kernel", "broken.ipynb"),
        refusal("bad name", "cannot be used", "register", "--prefix", ".", "--name", "../evil"));
  }

  private static Arguments refusal(String what, String part, String... arguments) {
    return Arguments.of(what, part, arguments);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("refusals")
  void badInputIsOneSentence(String what, String part, String[] arguments) throws Exception {
    Files.writeString(folder.resolve("broken.ipynb"), "{\"cells\": [");
    Files.writeString(
        folder.resolve("other.ipynb"),
        "{\"cells\": [], \"metadata\": {\"language_info\": {\"name\": \"python\"}}, \"nbformat\": 4,"
            + " \"nbformat_minor\": 5}");
    List<Path> before = files();
    Ended ended = pinchoff(arguments);
    assertEquals(2, ended.code(), () -> what + ": " + ended);
    assertTrue(ended.err().contains(part), ended::err);
    assertTrue(ended.err().lines().count() <= 3, ended::err);
    assertFalse(ended.err().contains("\tat "), ended::err);
    assertEquals(before, files(), "something was written");
  }

  private List<Path> files() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.filter(f -> !f.toString().endsWith(".txt")).sorted().toList();
    }
  }

  @Test
  void aPathThatTheLocaleCannotEncodeIsOneSentence() throws Exception {
    // The bytes of a name in UTF-8 reach a process of the C locale as they are.
    Path script = folder.resolve("call.sh");
    Files.writeString(
        script,
        "LC_ALL=C exec '" + KernelJava.java() + "' -jar '" + JAR + "' run 'bödkär.ipynb'\n");
    Process process =
        new ProcessBuilder("/bin/sh", script.toString())
            .directory(folder.toFile())
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertEquals(2, process.waitFor(), said);
    assertEquals(1, said.strip().lines().count(), said);
  }

  @Test
  void aPortInUseIsOneSentence() throws Exception {
    InetAddress here = InetAddress.getLoopbackAddress();
    List<Integer> free = new ArrayList<>();
    for (int i = 0; i < 4; i++) {
      try (ServerSocket other = new ServerSocket(0, 1, here)) {
        free.add(other.getLocalPort());
      }
    }
    try (ServerSocket taken = new ServerSocket(0, 1, here)) {
      int port = taken.getLocalPort();
      Files.writeString(
          folder.resolve("connection.json"),
          ("{\"transport\": \"tcp\", \"ip\": \"127.0.0.1\", \"shell_port\": %d, \"iopub_port\": %d,"
                  + " \"stdin_port\": %d, \"control_port\": %d, \"hb_port\": %d, \"key\": \"k\","
                  + " \"signature_scheme\": \"hmac-sha256\"}")
              .formatted(port, free.get(0), free.get(1), free.get(2), free.get(3)));
      Ended ended = pinchoff("kernel", "connection.json");
      assertEquals(2, ended.code(), ended::err);
      assertTrue(ended.err().contains(String.valueOf(port)), ended::err);
      assertFalse(ended.err().contains("\tat "), ended::err);
    }
  }

  @Test
  void everyCommandHasHelpWithAnExample() throws Exception {
    for (String command : List.of("run", "register", "kernel")) {
      Ended ended = pinchoff(command, "--help");
      assertEquals(0, ended.code());
      assertTrue(ended.out().contains("Example"), ended::out);
    }
    assertTrue(pinchoff("--version").out().startsWith("pinchoff "));
  }

  @Test
  void whatIsRegisteredIsCompleteByItself() throws Exception {
    Ended ended = pinchoff("register", "--prefix", "there");
    assertEquals(0, ended.code(), ended::err);
    Path spec = folder.resolve("there/share/jupyter/kernels/pinchoff");
    String json = Files.readString(spec.resolve("kernel.json"));
    assertTrue(json.contains("{connection_file}") && json.contains("message"), json);
    assertFalse(json.contains(JAR.toString()), "it needs the clone's jar");
    Path archive = spec.resolve("start").resolve("pinchoff.jsa");
    assertTrue(Files.isRegularFile(archive), ended::out);
    assertEquals(
        "rwx------",
        PosixFilePermissions.toString(Files.getPosixFilePermissions(archive.getParent())));
    List<String> command = KernelJava.command(spec.resolve("pinchoff.jar"), archive);
    try (KernelProcess kernel =
        KernelProcess.start(command, folder, Map.of(), Duration.ofSeconds(60))) {
      List<String> shown = new ArrayList<>();
      kernel
          .client()
          .execute(
              ExecuteRequest.of("mV(650).times(2)"),
              new OutputListener() {
                @Override
                public void result(ExecuteResult result) {
                  shown.add(String.valueOf(result.data().get("text/plain")));
                }
              });
      assertEquals(List.of("1.3 V"), shown);
    }
  }
}
