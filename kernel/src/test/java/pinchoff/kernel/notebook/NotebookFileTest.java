package pinchoff.kernel.notebook;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.kernel.limits.Limits;

class NotebookFileTest {
  private static final String PLAIN =
      """
      {"cells": [
        {"cell_type": "markdown", "id": "t1", "metadata": {"tags": ["a"]}, "source": ["# Title\\n", "text"],
         "attachments": {"x.png": {"image/png": "aGk="}}},
        {"cell_type": "code", "id": "c1", "metadata": {"collapsed": true}, "execution_count": 3,
         "outputs": [{"output_type": "stream", "name": "stdout", "text": "a\\nb"}], "source": "1 + 1"},
        {"cell_type": "raw", "id": "r1", "metadata": {}, "source": "as is"}],
       "metadata": {"kernelspec": {"name": "x", "display_name": "X", "language": "java"}, "mine": [1, null, {"a": 1.5}]},
       "nbformat": 4, "nbformat_minor": 5}
      """;

  private static Notebook parse(String text) {
    return NotebookFile.parse(text.getBytes(StandardCharsets.UTF_8), "n.ipynb", Limits.standard());
  }

  @Test
  void whatIsNotUnderstoodIsKept() {
    String text = new String(NotebookFile.bytes(parse(PLAIN)), StandardCharsets.UTF_8);
    for (String kept :
        List.of("attachments", "aGk=", "collapsed", "mine", "1.5", "as is", "tags")) {
      assertTrue(text.contains(kept), () -> kept + " in " + text);
    }
  }

  @Test
  void writingIsStable() {
    byte[] once = NotebookFile.bytes(parse(PLAIN));
    byte[] twice = NotebookFile.bytes(NotebookFile.parse(once, "n.ipynb", Limits.standard()));
    assertArrayEquals(once, twice);
  }

  @Test
  void cellsKeepTheirPlaceKindAndText() {
    Notebook notebook = parse(PLAIN);
    assertEquals(3, notebook.cells().size());
    CodeCell code = (CodeCell) notebook.cells().get(1);
    assertEquals("1 + 1", code.source());
    assertEquals("c1", code.id());
    assertEquals(Optional.of("java"), notebook.language());
  }

  @Test
  void olderMinorVersionsGetIds() {
    Notebook notebook =
        parse(
            "{\"cells\": [{\"cell_type\": \"code\", \"metadata\": {}, \"source\": [], \"outputs\": [],"
                + " \"execution_count\": null}, {\"cell_type\": \"code\", \"metadata\": {},"
                + " \"source\": [], \"outputs\": [], \"execution_count\": null}], \"metadata\": {},"
                + " \"nbformat\": 4, \"nbformat_minor\": 2}");
    List<String> ids = notebook.cells().stream().map(NotebookCell::id).toList();
    assertEquals(2, ids.stream().distinct().filter(id -> !id.isEmpty()).count(), ids::toString);
    String text = new String(NotebookFile.bytes(notebook), StandardCharsets.UTF_8);
    assertTrue(text.contains("\"nbformat_minor\": 5"), text);
  }

  static Stream<Arguments> refused() {
    return Stream.of(
        Arguments.of("nothing", ""),
        Arguments.of("not JSON", "{\"cells\": ["),
        Arguments.of("a list", "[]"),
        Arguments.of("no cells", "{\"metadata\": {}, \"nbformat\": 4, \"nbformat_minor\": 5}"),
        Arguments.of("another major version", PLAIN.replace("\"nbformat\": 4", "\"nbformat\": 3")),
        Arguments.of("cells of the wrong kind", PLAIN.replace("\"cells\": [", "\"cells\": [7, ")),
        Arguments.of("source of the wrong kind", PLAIN.replace("\"1 + 1\"", "{}")),
        Arguments.of("deep", "{\"cells\": " + "[".repeat(50_000)),
        Arguments.of("rest after the end", PLAIN + "x"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("refused")
  void brokenFilesAreRefusedWithTheirName(String what, String text) {
    NotebookException refused = assertThrows(NotebookException.class, () -> parse(text), what);
    assertTrue(refused.getMessage().contains("n.ipynb"), refused::getMessage);
    assertTrue(refused.getMessage().length() < 1000, refused::getMessage);
  }

  @Test
  void bytesThatAreNoUtf8AreRefused() {
    byte[] bytes = PLAIN.replace("as is", "\u00e4").getBytes(StandardCharsets.ISO_8859_1);
    assertThrows(
        NotebookException.class, () -> NotebookFile.parse(bytes, "n.ipynb", Limits.standard()));
  }

  @Test
  void lineEndsOfOtherSystemsAreRead() {
    assertEquals(parse(PLAIN).cells(), parse(PLAIN.replace("\n", "\r\n")).cells());
  }

  @Test
  void aFileIsReplacedAsAWhole(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("n.ipynb");
    Files.writeString(file, "old");
    NotebookFile.write(file, parse(PLAIN));
    assertEquals(parse(PLAIN), NotebookFile.read(file, Limits.standard()));
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(List.of(file), left.toList(), "a temporary file is left");
    }
  }

  @Test
  void aFileThatCannotBeWrittenStaysAsItWas(@TempDir Path folder) throws IOException {
    Path taken = Files.createDirectory(folder.resolve("n.ipynb"));
    assertThrows(NotebookException.class, () -> NotebookFile.write(taken, parse(PLAIN)));
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(List.of(taken), left.toList());
    }
  }
}
