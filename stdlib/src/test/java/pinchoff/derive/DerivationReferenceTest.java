package pinchoff.derive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import pinchoff.formula.Statement;
import pinchoff.quantity.Quantity;
import pinchoff.testing.Close;

/** Published worked examples, worked out again as derivations. */
class DerivationReferenceTest {

  /** One block of the resource. */
  record Example(String title, List<String> lines) {
    List<String> starting(String word) {
      return lines.stream()
          .filter(l -> l.startsWith(word + " "))
          .flatMap(l -> Arrays.stream(l.substring(word.length()).split(";")))
          .map(String::strip)
          .toList();
    }

    String formulas() {
      return lines.stream()
          .filter(l -> !l.startsWith("in ") && !l.startsWith("out ") && !l.startsWith("rejected "))
          .collect(Collectors.joining("\n"));
    }

    Derivation derivation() {
      Derivation derivation = Derivation.of(formulas());
      for (String input : starting("in")) {
        String[] parts = input.split("=");
        derivation = derivation.using(parts[0].strip(), Quantity.parse(parts[1].strip()));
      }
      return derivation;
    }

    @Override
    public String toString() {
      return title;
    }
  }

  static Stream<Example> examples() {
    try (InputStream in =
        DerivationReferenceTest.class.getResourceAsStream("/reference/derivations.txt")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return Arrays.stream(text.split("(?m)^== "))
          .skip(1)
          .map(block -> block.lines().filter(l -> !l.isBlank()).toList())
          .map(lines -> new Example(lines.get(0), lines.subList(1, lines.size())));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Test
  void atLeastTwentyFive() {
    assertTrue(examples().count() >= 25, () -> "only " + examples().count());
  }

  @ParameterizedTest
  @MethodSource("examples")
  void agreesWithTheExample(Example example) {
    Derivation derivation = example.derivation();
    assertEquals(List.of(), derivation.issues(), example.title());
    for (String expected : example.starting("out")) {
      String[] parts = expected.split("=");
      Quantity value = Quantity.parse(parts[1].strip());
      Quantity found = derivation.value(parts[0].strip());
      assertEquals(value.dimension(), found.dimension(), expected);
      Close.assertRelative(value.si(), found.si(), 1e-6, expected);
    }
    for (String rejected : example.starting("rejected")) {
      String[] parts = rejected.split("=");
      double expected = Quantity.parse(parts[1].strip()).si();
      boolean listed =
          derivation.steps().stream()
              .filter(s -> s.statement() instanceof Statement.Implicit)
              .flatMap(s -> s.rejected().stream())
              .anyMatch(r -> Math.abs(r.value().si() / expected - 1) < 1e-6);
      assertTrue(listed, () -> rejected + " is not among the rejected roots");
    }
  }

  /** Each derivative against a central difference, to 1e-6 of the largest term. */
  @ParameterizedTest
  @MethodSource("examples")
  void sensitivitiesAreDerivatives(Example example) {
    Derivation derivation = example.derivation();
    for (String expected : example.starting("out")) {
      String name = expected.split("=")[0].strip();
      for (Sensitivities.To to : derivation.sensitivities(name).to()) {
        double step = Math.max(Math.abs(to.at().si()), 1e-30) * 1e-4;
        double up = moved(derivation, to, step).value(name).si();
        double down = moved(derivation, to, -step).value(name).si();
        double difference = (up - down) / (2 * step);
        assertEquals(
            difference,
            to.derivative().si(),
            2e-6 * Math.abs(difference) + 1e-7 * Math.abs(derivation.value(name).si() / step),
            () -> name + " to " + to.input());
      }
    }
  }

  private static Derivation moved(Derivation derivation, Sensitivities.To to, double by) {
    return derivation.with(to.input(), Quantity.ofSi(to.at().si() + by, to.at().dimension()));
  }

  /** Cut anywhere, a text is read to an end, with faults or without. */
  @ParameterizedTest
  @MethodSource("examples")
  void aTextCutAnywhereIsRead(Example example) {
    String text = example.formulas();
    for (int end = 0; end <= text.length(); end++) {
      Derivation cut = Derivation.of(text.substring(0, end));
      assertTrue(cut.page().text() != null && cut.issues() != null);
    }
  }
}
