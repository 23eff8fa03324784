package pinchoff.display;

import java.util.Base64;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * One result in several forms: an ordered map from MIME type to content, and metadata for each
 * type.
 *
 * <p>The content is text for text types, base64 text for pictures that are not SVG, and a tree of
 * maps, lists, strings, numbers and booleans for types that end in {@code json}. Immutable.
 */
public final class MimeBundle {

  /** Plain text; every bundle has it. */
  public static final String TEXT = "text/plain";

  /** HTML that is complete by itself. */
  public static final String HTML = "text/html";

  /** LaTeX source, typeset by front ends that know it. */
  public static final String LATEX = "text/latex";

  /** A PNG picture as base64 text. */
  public static final String PNG = "image/png";

  /** An SVG picture as text. */
  public static final String SVG = "image/svg+xml";

  /** The canonical values that a rerun compares, version 1, as a JSON tree. */
  public static final String VALUES = "application/vnd.pinchoff.values+json";

  private static final Pattern TYPE = Pattern.compile("[\\w.+-]+/[\\w.+-]+");

  private final Map<String, Object> data;
  private final Map<String, Map<String, Object>> metadata;

  private MimeBundle(Map<String, Object> data, Map<String, Map<String, Object>> metadata) {
    this.data = Collections.unmodifiableMap(data);
    this.metadata = Collections.unmodifiableMap(metadata);
  }

  /** A bundle of plain text alone. */
  public static MimeBundle text(String text) {
    return builder(text).build();
  }

  /** Starts a bundle with its plain text, which every bundle must have. */
  public static Builder builder(String plainText) {
    return new Builder().with(TEXT, plainText);
  }

  /** The forms in order: MIME type to content. */
  public Map<String, Object> data() {
    return data;
  }

  /** Hints for each type, for example the width and height of a picture in CSS pixels. */
  public Map<String, Map<String, Object>> metadata() {
    return metadata;
  }

  /** The plain text. */
  public String plainText() {
    return (String) data.getOrDefault(TEXT, "");
  }

  /** The content of a type, if the bundle has it and it is text. */
  public Optional<String> textOf(String type) {
    return data.get(type) instanceof String s ? Optional.of(s) : Optional.empty();
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof MimeBundle b && data.equals(b.data) && metadata.equals(b.metadata);
  }

  @Override
  public int hashCode() {
    return data.hashCode();
  }

  @Override
  public String toString() {
    return "MimeBundle" + data.keySet();
  }

  private static String checkedType(String type) {
    if (!TYPE.matcher(type).matches()) {
      throw new IllegalArgumentException(
          "MIME type \"" + type + "\": expected type/subtype of letters, digits, - + .");
    }
    return type;
  }

  /** Collects the forms of one result. */
  public static final class Builder {
    private final Map<String, Object> data = new LinkedHashMap<>();
    private final Map<String, Map<String, Object>> metadata = new LinkedHashMap<>();

    private Builder() {}

    /** Adds a form that is text. A second call for the same type replaces the first. */
    public Builder with(String type, String text) {
      data.put(checkedType(type), text);
      return this;
    }

    /**
     * Adds a form that is a JSON tree.
     *
     * @param tree maps with string keys, lists, strings, finite numbers and booleans
     */
    public Builder withJson(String type, Map<String, ?> tree) {
      if (!type.endsWith("json")) {
        throw new IllegalArgumentException(
            "MIME type \"" + type + "\" holds text: only types that end in json hold a tree");
      }
      data.put(checkedType(type), JsonTree.copyOf(tree));
      return this;
    }

    /**
     * Adds a PNG picture.
     *
     * @param png the bytes of the file
     * @param width width on the page in CSS pixels
     * @param height height on the page in CSS pixels
     */
    public Builder withPng(byte[] png, int width, int height) {
      data.put(PNG, Base64.getEncoder().encodeToString(png));
      metadata.put(PNG, Map.of("width", width, "height", height));
      return this;
    }

    /** The finished bundle. */
    public MimeBundle build() {
      return new MimeBundle(new LinkedHashMap<>(data), new LinkedHashMap<>(metadata));
    }
  }

  /** Copies a JSON tree and refuses what JSON cannot say. */
  private static final class JsonTree {
    private static final int MAX_DEPTH = 100;

    private JsonTree() {}

    static Object copyOf(Object tree) {
      return copy(tree, 0);
    }

    private static Object copy(Object node, int depth) {
      if (depth > MAX_DEPTH) {
        throw new IllegalArgumentException("JSON tree deeper than " + MAX_DEPTH + " levels");
      }
      if (node instanceof Map<?, ?> map) {
        Map<String, Object> copy = new LinkedHashMap<>();
        map.forEach((key, value) -> copy.put((String) key, copy(value, depth + 1)));
        return Collections.unmodifiableMap(copy);
      }
      if (node instanceof List<?> list) {
        return list.stream().map(item -> copy(item, depth + 1)).toList();
      }
      if (node instanceof Double d && !Double.isFinite(d)) {
        throw new IllegalArgumentException("a JSON tree cannot hold the number " + d);
      }
      if (node instanceof String || node instanceof Number || node instanceof Boolean) {
        return node;
      }
      throw new IllegalArgumentException("a JSON tree cannot hold a " + node.getClass().getName());
    }
  }
}
