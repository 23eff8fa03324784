package pinchoff.kernel.review;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import pinchoff.kernel.limits.Limits;
import pinchoff.kernel.notebook.CodeCell;
import pinchoff.kernel.notebook.Notebook;
import pinchoff.kernel.notebook.NotebookFile;
import pinchoff.kernel.protocol.ErrorInfo;
import pinchoff.kernel.run.CellRun;
import pinchoff.kernel.run.NotebookRun;

class ReviewTest {
  private static final String VALUES =
      """
      {"version": 1,
       "premises": [{"name": "V_DD", "value": 1.8, "dimension": "V", "unit": "V", "overridden": false}],
       "technologies": [{"name": "larch180.tech.json", "contentHash": "abc"}],
       "values": [
         {"id": "I_D", "name": "I_D", "kind": "figure", "value": 2.5e-5, "dimension": "A", "unit": "uA"},
         {"id": "claim R_B", "name": "R_B", "kind": "claim", "value": 50000, "dimension": "ohm", "unit": "kohm",
          "tolerance": {"absolute": 0, "relative": 0.01}},
         {"id": "spec I", "name": "I", "kind": "spec", "value": 2e-5, "dimension": "A", "unit": "uA",
          "limits": {"min": 1.8e-5, "max": 2.2e-5}, "verdict": {"standing": "holds", "words": "holds"}},
         {"id": "region", "name": "region", "kind": "figure", "text": "saturation"},
         {"id": "zero", "name": "zero", "kind": "figure", "value": 0, "dimension": "V", "unit": "V"}]}
      """;

  private static Notebook notebook(String values, String printed) {
    String json =
        """
        {"cells": [{"cell_type": "code", "id": "c1", "metadata": {}, "execution_count": 1, "source": "x", "outputs": [
          {"output_type": "stream", "name": "stdout", "text": "%s"},
          {"output_type": "execute_result", "execution_count": 1, "metadata": {},
           "data": {"text/plain": "x", "application/vnd.pinchoff.values+json": %s}}]}],
         "metadata": {}, "nbformat": 4, "nbformat_minor": 5}
        """
            .formatted(printed, values);
    return NotebookFile.parse(json.getBytes(StandardCharsets.UTF_8), "n", Limits.standard());
  }

  private static NotebookRun run(Notebook notebook) {
    List<CellRun> cells = new ArrayList<>();
    for (var cell : notebook.cells()) {
      if (cell instanceof CodeCell code) {
        cells.add(
            new CellRun(
                1, code.id(), CellRun.Ending.DONE, Optional.of(1), Optional.<ErrorInfo>empty()));
      }
    }
    return new NotebookRun(notebook, cells, Set.of());
  }

  private static Review review(String now) {
    return Review.of(notebook(VALUES, "a"), run(notebook(now, "a")));
  }

  private static List<Finding.Kind> kinds(Review review) {
    return review.findings().stream().map(Finding::kind).distinct().toList();
  }

  @Test
  void whatIsReproducedHasNoFinding() {
    Review review = review(VALUES);
    assertTrue(review.ok(), () -> review.findings().toString());
    assertEquals(5, review.compared());
    assertEquals(5, review.stored());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "\"value\": 2.5e-5|\"value\": 2.6e-5|MOVED",
        "\"value\": 2.5e-5|\"value\": 2.5000001e-5|MOVED",
        "\"value\": 0,|\"value\": 1e-15,|MOVED",
        "\"value\": 50000|\"value\": 50600|MOVED",
        "\"saturation\"|\"triode\"|MOVED",
        "\"dimension\": \"A\", \"unit\": \"uA\"},|\"dimension\": \"V\", \"unit\": \"V\"},|MOVED",
        "\"relative\": 0.01|\"relative\": 0.1|PROMISE",
        "\"max\": 2.2e-5|\"max\": 2.5e-5|PROMISE",
        "\"contentHash\": \"abc\"|\"contentHash\": \"abd\"|TECHNOLOGY",
        "\"value\": 1.8, |\"value\": 1.62, |PREMISE",
        "\"standing\": \"holds\"|\"standing\": \"edge\"|VERDICT",
        "\"id\": \"zero\"|\"id\": \"I_D\"|REPEATED",
        "\"id\": \"zero\"|\"id\": \"one\"|GONE",
      })
  void everyChangeThatMattersIsFound(String from, String to, Finding.Kind kind) {
    assertTrue(VALUES.contains(from), from);
    Review review = review(VALUES.replaceFirst(Pattern.quote(from), Matcher.quoteReplacement(to)));
    assertFalse(review.ok());
    assertTrue(kinds(review).contains(kind), () -> review.findings().toString());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "\"value\": 50000|\"value\": 50400",
        "\"value\": 2.5e-5|\"value\": 2.50000000001e-5",
        "\"unit\": \"kohm\"|\"unit\": \"ohm\"",
        "{\"min\": 1.8e-5, \"max\": 2.2e-5}|{\"max\": 0.000022, \"min\": 0.000018}",
        "\"words\": \"holds\"|\"words\": \"is fine\"",
      })
  void whatIsWithinToleranceOrOnlyLooksDifferentIsNot(String from, String to) {
    Review review = review(VALUES.replace(from, to));
    assertTrue(review.ok(), () -> review.findings().toString());
  }

  @Test
  void aBrokenSpecIsAFindingEvenIfItWasStoredBroken() {
    String broken = VALUES.replace("\"standing\": \"holds\"", "\"standing\": \"fails\"");
    Review review = Review.of(notebook(broken, "a"), run(notebook(broken, "a")));
    assertEquals(List.of(Finding.Kind.BROKEN), kinds(review));
  }

  @Test
  void causesComeBeforeEffects() {
    Review review = review(VALUES.replace("\"abc\"", "\"x\"").replace("2.5e-5", "3e-5"));
    assertEquals(List.of(Finding.Kind.TECHNOLOGY, Finding.Kind.MOVED), kinds(review));
  }

  @Test
  void noStoredValuesIsAFindingAndNeverAPass() {
    String none = "{\"version\": 1, \"values\": [], \"premises\": [], \"technologies\": []}";
    Review review = Review.of(notebook(none, "a"), run(notebook(VALUES, "a")));
    assertEquals(List.of(Finding.Kind.NOTHING), kinds(review));
  }

  @Test
  void otherTextIsAFinding() {
    Review review = Review.of(notebook(VALUES, "a"), run(notebook(VALUES, "b")));
    assertEquals(List.of(Finding.Kind.TEXT), kinds(review));
  }

  @Test
  void hostileValuesDoNoHarm() {
    for (String odd :
        List.of(
            "[]",
            "7",
            "{\"values\": 3}",
            "{\"values\": [1, {}, {\"id\": 5}, {\"id\": \"a\", \"value\": \"x\"}]}")) {
      Review review = Review.of(notebook(odd, "a"), run(notebook(odd, "a")));
      assertFalse(review.findings() == null);
    }
  }
}
