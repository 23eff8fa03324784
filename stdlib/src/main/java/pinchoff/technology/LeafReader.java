package pinchoff.technology;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.QuantityException;
import pinchoff.quantity.Temperature;
import pinchoff.source.Excerpt;
import pinchoff.source.Issue;
import pinchoff.source.Suggestions;

/** Reads one value: a text with a unit, or an object of that text and where it comes from. */
final class LeafReader {
  private static final String VALUE = "value";
  private static final String ORIGIN = "origin";
  private static final String EXTRACTED_FROM = "extractedFrom";
  private static final String REGION = "region";
  private static final String METHOD = "method";
  private static final List<String> KEYS = List.of(VALUE, ORIGIN, EXTRACTED_FROM);
  private static final List<String> SOURCE_KEYS = List.of(REGION, METHOD);

  private final Faults faults;

  LeafReader(Faults faults) {
    this.faults = faults;
  }

  /** The value of a node, or empty if it is not what the shape asks for. */
  Optional<Stated> read(JsonNode node, Shape.Leaf shape, String path) {
    if (!(node instanceof JsonNode.Branch branch)) {
      return content(node, shape, path)
          .map(content -> stated(node, content, Optional.empty(), List.of()));
    }
    @Nullable JsonNode value = null;
    Optional<String> origin = Optional.empty();
    List<Optional<String>> source = List.of();
    for (JsonNode.Member member : branch.members()) {
      String key = member.key();
      String inner = DocumentReader.below(path, key);
      if (key.equals(VALUE)) {
        value = member.value();
      } else if (key.equals(ORIGIN)) {
        origin = text(member.value(), inner);
      } else if (key.equals(EXTRACTED_FROM)) {
        source = source(member.value(), inner);
      } else {
        unknown(member, KEYS, path);
      }
    }
    if (value == null) {
      int start = branch.place().start();
      faults.add(
          new Place(start, start + 1), path + "." + VALUE + " is missing: expected " + what(shape));
      return Optional.empty();
    }
    JsonNode spelled = value;
    Optional<String> from = origin;
    List<Optional<String>> extracted = source;
    return content(value, shape, path).map(content -> stated(spelled, content, from, extracted));
  }

  private static Stated stated(
      JsonNode node,
      Stated.Content content,
      Optional<String> origin,
      List<Optional<String>> source) {
    return new Stated(
        content,
        spelled(node),
        origin,
        source.isEmpty() ? Optional.empty() : source.get(0),
        source.isEmpty() ? Optional.empty() : source.get(1),
        node.place());
  }

  private static String spelled(JsonNode node) {
    if (node instanceof JsonNode.Text text) {
      return text.text();
    }
    return node instanceof JsonNode.Bare bare ? bare.text() : "";
  }

  /** Region and method. */
  private List<Optional<String>> source(JsonNode node, String path) {
    Optional<String> region = Optional.empty();
    Optional<String> method = Optional.empty();
    if (!(node instanceof JsonNode.Branch branch)) {
      faults.add(
          node.place(),
          path + " is " + node.describe() + ": expected an object with region and method");
      return List.of();
    }
    for (JsonNode.Member member : branch.members()) {
      if (member.key().equals(REGION)) {
        region = text(member.value(), path + "." + REGION);
      } else if (member.key().equals(METHOD)) {
        method = text(member.value(), path + "." + METHOD);
      } else {
        unknown(member, SOURCE_KEYS, path);
      }
    }
    return List.of(region, method);
  }

  private void unknown(JsonNode.Member member, List<String> keys, String path) {
    faults.add(
        member.keyPlace(),
        path
            + ": unknown key "
            + Excerpt.quote(member.key())
            + ": expected "
            + String.join(", ", keys),
        Suggestions.didYouMean(member.key(), keys));
  }

  private Optional<Stated.Content> content(JsonNode node, Shape.Leaf shape, String path) {
    if (shape instanceof Shape.Amount amount) {
      return amount(node, amount, path).map(Stated.Content.Amount::new);
    }
    if (shape instanceof Shape.Degrees) {
      return degrees(node, path).map(Stated.Content.Degrees::new);
    }
    if (shape instanceof Shape.Choice choice) {
      return choice(node, choice, path).map(Stated.Content.Words::new);
    }
    return text(node, path).map(Stated.Content.Words::new);
  }

  private Optional<Quantity> amount(JsonNode node, Shape.Amount shape, String path) {
    Optional<Quantity> parsed = quantity(node, shape.dimension(), path);
    if (parsed.isEmpty()) {
      return parsed;
    }
    Quantity quantity = parsed.get();
    String found = path + " = " + spelled(node);
    Dimension expected = shape.dimension();
    if (!quantity.dimension().equals(expected)) {
      String fault =
          quantity.dimension().isNone()
              ? " has no unit" + expectedWithUnit(node, expected)
              : " is "
                  + quantity.dimension().description()
                  + ": expected "
                  + expected.description();
      faults.add(node.place(), found + fault);
      return Optional.empty();
    }
    Optional<String> fault = shape.range().fault(quantity);
    fault.ifPresent(range -> faults.add(node.place(), found + " is impossible: expected " + range));
    return fault.isPresent() ? Optional.empty() : parsed;
  }

  private Optional<Quantity> quantity(JsonNode node, Dimension expected, String path) {
    if (node instanceof JsonNode.Text || (node instanceof JsonNode.Bare && expected.isNone())) {
      try {
        return Optional.of(Quantity.parse(spelled(node)));
      } catch (QuantityException fault) {
        noteQuantity(node, fault, path);
        return Optional.empty();
      }
    }
    if (node instanceof JsonNode.Bare) {
      faults.add(
          node.place(),
          path + " = " + node.describe() + " has no unit" + expectedWithUnit(node, expected));
      return Optional.empty();
    }
    faults.add(
        node.place(),
        path + " is " + node.describe() + ": expected " + expected.description() + " as text");
    return Optional.empty();
  }

  /** Points at the character of the text where the quantity goes wrong. */
  private void noteQuantity(JsonNode node, QuantityException fault, String path) {
    Optional<Issue> issue = fault.issue();
    Place place =
        issue.isPresent() && node instanceof JsonNode.Text text
            ? text.part(issue.get().span().start().offset(), issue.get().span().end().offset())
            : node.place();
    String words = issue.map(Issue::message).orElse(String.valueOf(fault.getMessage()));
    faults.add(
        place, path + " = " + node.describe() + ": " + words, issue.flatMap(Issue::suggestion));
  }

  private static String expectedWithUnit(JsonNode node, Dimension expected) {
    String number = Excerpt.clip(spelled(node).strip(), 20);
    return ": expected "
        + expected.description()
        + " as text with its unit, for example \""
        + number
        + " "
        + expected
        + "\"";
  }

  private Optional<Temperature> degrees(JsonNode node, String path) {
    if (node instanceof JsonNode.Text text) {
      try {
        Optional<Temperature> parsed = TemperatureText.parse(text.text());
        if (parsed.isPresent()) {
          return parsed;
        }
      } catch (QuantityException belowZero) {
        faults.add(node.place(), path + ": " + belowZero.getMessage());
        return Optional.empty();
      }
    }
    faults.add(
        node.place(),
        path
            + " = "
            + node.describe()
            + ": expected a temperature as text, for example \"27 degC\" or \"300.15 K\"");
    return Optional.empty();
  }

  private Optional<String> choice(JsonNode node, Shape.Choice shape, String path) {
    if (node instanceof JsonNode.Text text && shape.words().contains(text.text())) {
      return Optional.of(text.text());
    }
    Optional<String> hint =
        node instanceof JsonNode.Text text
            ? Suggestions.nearest(text.text(), shape.words())
                .map(word -> "did you mean \"" + word + "\"?")
            : Optional.empty();
    faults.add(node.place(), path + " = " + node.describe() + ": expected " + what(shape), hint);
    return Optional.empty();
  }

  private Optional<String> text(JsonNode node, String path) {
    if (node instanceof JsonNode.Text text && !text.text().isBlank()) {
      return Optional.of(text.text());
    }
    String found = node instanceof JsonNode.Text ? "empty" : node.describe();
    faults.add(node.place(), path + " is " + found + ": expected a text");
    return Optional.empty();
  }

  /** What a shape asks for, in words. */
  static String what(Shape.Leaf shape) {
    if (shape instanceof Shape.Amount amount) {
      return amount.dimension().description();
    }
    if (shape instanceof Shape.Degrees) {
      return "a temperature";
    }
    return shape instanceof Shape.Choice choice
        ? choice.words().stream().map(w -> "\"" + w + "\"").collect(Collectors.joining(" or "))
        : "a text";
  }
}
