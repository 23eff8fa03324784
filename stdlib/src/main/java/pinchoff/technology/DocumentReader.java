package pinchoff.technology;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import pinchoff.source.Excerpt;
import pinchoff.source.Suggestions;

/**
 * Checks JSON against the format, key by key and value by value, and keeps what is right. It notes
 * every fault and goes on.
 */
final class DocumentReader {
  private static final Pattern NAME = Pattern.compile("\\p{L}[\\p{L}\\p{M}\\p{N}_-]{0,39}");
  private static final int MOST_LISTED = 12;

  private final Faults faults;
  private final LeafReader leaves;
  private final Map<String, Stated> values = new LinkedHashMap<>();

  private DocumentReader(Faults faults) {
    this.faults = faults;
    this.leaves = new LeafReader(faults);
  }

  /** What the JSON states in terms of the format; incomplete if there are faults. */
  static Document read(JsonNode root, Faults faults) {
    DocumentReader reader = new DocumentReader(faults);
    reader.group(root, Format.ROOT, "");
    return new Document(reader.values);
  }

  private void read(JsonNode node, Shape shape, String path) {
    if (shape instanceof Shape.Group group) {
      group(node, group, path);
    } else if (shape instanceof Shape.Catalog catalog) {
      catalog(node, catalog, path);
    } else if (shape instanceof Shape.Leaf leaf) {
      leaves.read(node, leaf, path).ifPresent(value -> values.put(path, value));
    }
  }

  private void group(JsonNode node, Shape.Group group, String path) {
    JsonNode.@Nullable Branch branch = branch(node, path);
    if (branch == null) {
      return;
    }
    List<String> found = new ArrayList<>();
    for (JsonNode.Member member : branch.members()) {
      Optional<Field> field =
          group.fields().stream().filter(f -> f.key().equals(member.key())).findFirst();
      if (field.isPresent()) {
        found.add(member.key());
        read(member.value(), field.get().shape(), below(path, member.key()));
      } else {
        unknown(member, group, path);
      }
    }
    for (Field field : group.fields()) {
      if (field.required() && !found.contains(field.key())) {
        int start = branch.place().start();
        faults.add(
            new Place(start, start + 1),
            below(path, field.key()) + " is missing: expected " + field.meaning());
      }
    }
  }

  private void catalog(JsonNode node, Shape.Catalog catalog, String path) {
    JsonNode.@Nullable Branch branch = branch(node, path);
    if (branch == null) {
      return;
    }
    for (JsonNode.Member member : branch.members()) {
      if (NAME.matcher(member.key()).matches()) {
        group(member.value(), catalog.each(), below(path, member.key()));
      } else {
        faults.add(
            member.keyPlace(),
            path
                + ": "
                + Excerpt.quote(member.key())
                + " cannot name "
                + catalog.item()
                + ": expected a letter, then at most 39 letters, digits, - or _");
      }
    }
  }

  private JsonNode.@Nullable Branch branch(JsonNode node, String path) {
    if (node instanceof JsonNode.Branch branch) {
      return branch;
    }
    String what = path.isEmpty() ? "the file" : path;
    faults.add(
        node.place(), what + " is " + node.describe() + ": expected an object in braces, { … }");
    return null;
  }

  private void unknown(JsonNode.Member member, Shape.Group group, String path) {
    String where = path.isEmpty() ? "" : path + ": ";
    String message = where + "unknown key " + Excerpt.quote(member.key());
    Optional<String> hint =
        elsewhere(member.key(), group).or(() -> Suggestions.didYouMean(member.key(), group.keys()));
    faults.add(member.keyPlace(), hint.isPresent() ? message : message + expected(group), hint);
  }

  /** A key that would be right one level deeper. */
  private static Optional<String> elsewhere(String key, Shape.Group group) {
    return group.fields().stream()
        .filter(f -> f.shape() instanceof Shape.Group inner && inner.keys().contains(key))
        .map(f -> key + " belongs in " + f.key())
        .findFirst();
  }

  private static String expected(Shape.Group group) {
    List<String> keys = group.keys();
    return keys.size() <= MOST_LISTED
        ? ": expected " + String.join(", ", keys)
        : ": expected one of "
            + String.join(", ", keys.subList(0, MOST_LISTED))
            + " and "
            + (keys.size() - MOST_LISTED)
            + " more";
  }

  static String below(String path, String key) {
    return path.isEmpty() ? key : path + "." + key;
  }
}
