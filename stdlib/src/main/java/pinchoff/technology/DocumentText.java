package pinchoff.technology;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tools.jackson.core.io.JsonStringEncoder;

/**
 * Writes a document as a technology file: keys in the order of the format, names in the order they
 * have, one value a line. The same document always gives the same text.
 */
final class DocumentText {
  private static final String STEP = "  ";

  private final Document document;

  private DocumentText(Document document) {
    this.document = document;
  }

  static String of(Document document) {
    return new DocumentText(document).group(Format.ROOT, "", "") + "\n";
  }

  private String group(Shape.Group group, String path, String indent) {
    List<String> lines = new ArrayList<>();
    for (Field field : group.fields()) {
      String inner = DocumentReader.below(path, field.key());
      member(field.key(), field.shape(), inner, indent + STEP).ifPresent(lines::add);
    }
    return object(lines, indent);
  }

  private Optional<String> member(String key, Shape shape, String path, String indent) {
    Optional<String> value =
        shape instanceof Shape.Leaf
            ? document.stated(path).map(DocumentText::leaf)
            : Optional.of(path).filter(document::has).map(p -> branch(shape, p, indent));
    return value.map(v -> indent + quoted(key) + ": " + v);
  }

  private String branch(Shape shape, String path, String indent) {
    if (shape instanceof Shape.Group group) {
      return group(group, path, indent);
    }
    Shape.Group each = ((Shape.Catalog) shape).each();
    List<String> lines = new ArrayList<>();
    for (String name : document.names(path)) {
      String inner = indent + STEP;
      lines.add(inner + quoted(name) + ": " + group(each, path + "." + name, inner));
    }
    return object(lines, indent);
  }

  private static String object(List<String> lines, String indent) {
    return "{\n" + String.join(",\n", lines) + "\n" + indent + "}";
  }

  private static String leaf(Stated stated) {
    String value = quoted(stated.spelled());
    List<String> members = new ArrayList<>();
    members.add("\"value\": " + value);
    List<String> source = new ArrayList<>();
    stated.region().ifPresent(region -> source.add("\"region\": " + quoted(region)));
    stated.method().ifPresent(method -> source.add("\"method\": " + quoted(method)));
    if (!source.isEmpty()) {
      members.add("\"extractedFrom\": {" + String.join(", ", source) + "}");
    }
    stated.origin().ifPresent(origin -> members.add("\"origin\": " + quoted(origin)));
    return members.size() == 1 ? value : "{" + String.join(", ", members) + "}";
  }

  private static String quoted(String text) {
    return "\"" + new String(JsonStringEncoder.getInstance().quoteAsCharArray(text)) + "\"";
  }
}
