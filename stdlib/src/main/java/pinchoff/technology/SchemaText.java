package pinchoff.technology;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import tools.jackson.core.io.JsonStringEncoder;

/** Writes the format as a JSON Schema (2020-12), so that schema and reader cannot disagree. */
final class SchemaText {
  private static final String STEP = "  ";
  private static final String DIALECT = "https://json-schema.org/draft/2020-12/schema";

  private SchemaText() {}

  static String of() {
    List<String> members = new ArrayList<>();
    members.add(STEP + "\"$schema\": " + quoted(DIALECT));
    members.add(STEP + "\"title\": \"Pinchoff technology file\"");
    members.addAll(group(Format.ROOT, STEP));
    members.add(STEP + "\"$defs\": " + definitions(STEP));
    return object(members, "") + "\n";
  }

  private static List<String> group(Shape.Group group, String indent) {
    List<String> properties =
        group.fields().stream()
            .map(f -> indent + STEP + quoted(f.key()) + ": " + field(f, indent + STEP))
            .toList();
    String required =
        group.fields().stream()
            .filter(Field::required)
            .map(f -> quoted(f.key()))
            .collect(Collectors.joining(", ", "[", "]"));
    List<String> members = new ArrayList<>();
    members.add(indent + "\"type\": \"object\"");
    members.add(indent + "\"properties\": " + object(properties, indent));
    if (!required.equals("[]")) {
      members.add(indent + "\"required\": " + required);
    }
    members.add(indent + "\"additionalProperties\": false");
    return members;
  }

  private static String field(Field field, String indent) {
    String inner = indent + STEP;
    List<String> members = new ArrayList<>();
    members.add(inner + "\"description\": " + quoted(description(field)));
    if (field.shape() instanceof Shape.Group group) {
      members.addAll(group(group, inner));
    } else if (field.shape() instanceof Shape.Catalog catalog) {
      members.add(inner + "\"type\": \"object\"");
      members.add(
          inner
              + "\"additionalProperties\": "
              + object(group(catalog.each(), inner + STEP), inner));
    } else {
      members.add(inner + "\"anyOf\": " + leaf((Shape.Leaf) field.shape()));
    }
    return object(members, indent);
  }

  private static String description(Field field) {
    String symbol = field.symbol().map(s -> s.text() + ": ").orElse("");
    String unit =
        field.shape() instanceof Shape.Amount amount
            ? "; " + amount.dimension().description() + ", " + amount.range().words()
            : "";
    return symbol + field.meaning() + unit;
  }

  /** A value, or an object of the value and where it comes from. */
  private static String leaf(Shape.Leaf leaf) {
    String value =
        leaf instanceof Shape.Choice choice
            ? choice.words().stream()
                .map(SchemaText::quoted)
                .collect(Collectors.joining(", ", "{\"enum\": [", "]}"))
            : leaf instanceof Shape.Amount amount && amount.dimension().isNone()
                ? "{\"type\": [\"string\", \"number\"]}"
                : "{\"type\": \"string\"}";
    return "["
        + value
        + ", {\"$ref\": \"#/$defs/sourced\", \"properties\": {\"value\": "
        + value
        + "}}]";
  }

  private static String definitions(String indent) {
    return object(
        List.of(
            indent
                + STEP
                + "\"sourced\": {\"type\": \"object\", \"required\": [\"value\"], \"properties\": {"
                + "\"value\": {}, \"origin\": {\"type\": \"string\"}, \"extractedFrom\": {\"type\":"
                + " \"object\", \"properties\": {\"region\": {\"type\": \"string\"}, \"method\":"
                + " {\"type\": \"string\"}}, \"additionalProperties\": false}},"
                + " \"additionalProperties\": false}"),
        indent);
  }

  private static String object(List<String> lines, String indent) {
    return "{\n" + String.join(",\n", lines) + "\n" + indent + "}";
  }

  private static String quoted(String text) {
    return "\"" + new String(JsonStringEncoder.getInstance().quoteAsCharArray(text)) + "\"";
  }
}
