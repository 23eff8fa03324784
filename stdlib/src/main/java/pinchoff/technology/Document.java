package pinchoff.technology;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * What a technology file states, as values by their paths: {@code
 * devices.core-n.squareLaw.bodyFactor}. Names hold no dots, so a path means one place.
 */
final class Document {
  private final Map<String, Stated> values;

  Document(Map<String, Stated> values) {
    this.values = Collections.unmodifiableMap(new LinkedHashMap<>(values));
  }

  /** All values in the order of the file. */
  Map<String, Stated> values() {
    return values;
  }

  /** The value at a path. */
  Optional<Stated> stated(String path) {
    return Optional.ofNullable(values.get(path));
  }

  /** The quantity at a path. */
  Optional<Quantity> amount(String path) {
    return content(path, Stated.Content.Amount.class).map(Stated.Content.Amount::quantity);
  }

  /** The temperature at a path. */
  Optional<Temperature> degrees(String path) {
    return content(path, Stated.Content.Degrees.class).map(Stated.Content.Degrees::temperature);
  }

  /** The text at a path. */
  Optional<String> words(String path) {
    return content(path, Stated.Content.Words.class).map(Stated.Content.Words::text);
  }

  private <T extends Stated.Content> Optional<T> content(String path, Class<T> kind) {
    return stated(path).map(Stated::content).filter(kind::isInstance).map(kind::cast);
  }

  /** True if anything is stated below a path. */
  boolean has(String path) {
    String prefix = path + ".";
    return values.keySet().stream().anyMatch(p -> p.startsWith(prefix));
  }

  /** The names directly below a path, in the order of the file. */
  List<String> names(String path) {
    String prefix = path + ".";
    Set<String> names = new LinkedHashSet<>();
    for (String value : values.keySet()) {
      if (value.startsWith(prefix)) {
        int end = value.indexOf('.', prefix.length());
        names.add(value.substring(prefix.length(), end < 0 ? value.length() : end));
      }
    }
    return List.copyOf(names);
  }

  /** This document with one value more, or another one at a path. */
  Document with(String path, Stated value) {
    Map<String, Stated> changed = new LinkedHashMap<>(values);
    changed.put(path, value);
    return new Document(changed);
  }

  /**
   * A text that depends on what is stated alone: not on layout, the order of keys or the spelling
   * of units. No text in it has a line break, so lines cannot be mistaken.
   */
  String canonical() {
    List<String> lines = new ArrayList<>();
    new TreeMap<>(values)
        .forEach(
            (path, value) -> {
              lines.add(path + " " + value.content().canonical());
              value.origin().ifPresent(origin -> lines.add(path + " origin " + origin));
              value.region().ifPresent(region -> lines.add(path + " region " + region));
              value.method().ifPresent(method -> lines.add(path + " method " + method));
            });
    return String.join("\n", lines);
  }

  /** SHA-256 of the canonical text, in hexadecimal. */
  String hash() {
    try {
      byte[] digest =
          MessageDigest.getInstance("SHA-256").digest(canonical().getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(digest);
    } catch (NoSuchAlgorithmException impossible) {
      throw new IllegalStateException("every Java platform has SHA-256", impossible);
    }
  }
}
