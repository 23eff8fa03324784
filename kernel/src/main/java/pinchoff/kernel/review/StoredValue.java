package pinchoff.kernel.review;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/**
 * One canonical value as a notebook stores it.
 *
 * @param fields its fields
 */
record StoredValue(Map<String, Object> fields) {

  String id() {
    return text("id").orElse("");
  }

  String name() {
    return text("name").orElse(id());
  }

  String kind() {
    return text("kind").orElse("");
  }

  Optional<Double> number() {
    return number(fields.get("value"));
  }

  String unit() {
    return text("dimension").orElse("");
  }

  /** What it says if it is no number. */
  Optional<String> words() {
    return text("text").or(() -> Optional.ofNullable(fields.get("holds")).map(String::valueOf));
  }

  Optional<String> standing() {
    return fields.get("verdict") instanceof Map<?, ?> verdict
            && verdict.get("standing") instanceof String standing
        ? Optional.of(standing)
        : Optional.empty();
  }

  /** Limits and tolerance as they stand: these belong to what is promised. */
  String promise() {
    return "limits "
        + sorted(fields.get("limits"))
        + ", tolerance "
        + sorted(fields.get("tolerance"));
  }

  /** Numbers by name, whatever order and form a file has them in. */
  private static Map<String, String> sorted(@Nullable Object tree) {
    Map<String, String> sorted = new TreeMap<>();
    if (tree instanceof Map<?, ?> map) {
      map.forEach(
          (key, value) ->
              sorted.put(
                  String.valueOf(key),
                  number(value).map(String::valueOf).orElse(String.valueOf(value))));
    }
    return sorted;
  }

  Optional<String> relation() {
    return text("relation");
  }

  boolean hasTolerance() {
    return fields.get("tolerance") instanceof Map<?, ?>;
  }

  /** How far a rerun may differ from a value, in SI units. */
  double allowed(double reference, double standard) {
    if (fields.get("tolerance") instanceof Map<?, ?> tolerance) {
      double absolute = number(tolerance.get("absolute")).orElse(0.0);
      double relative = number(tolerance.get("relative")).orElse(0.0);
      return Math.max(absolute, relative * Math.abs(reference));
    }
    return standard * Math.abs(reference);
  }

  private Optional<String> text(String key) {
    return fields.get(key) instanceof String text ? Optional.of(text) : Optional.empty();
  }

  private static Optional<Double> number(@Nullable Object value) {
    return value instanceof Number n ? Optional.of(n.doubleValue()) : Optional.empty();
  }

  @SuppressWarnings("unchecked") // the keys of JSON objects are texts
  static List<Map<String, Object>> maps(@Nullable Object list) {
    return list instanceof List<?> items
        ? items.stream()
            .filter(Map.class::isInstance)
            .map(item -> (Map<String, Object>) item)
            .toList()
        : List.of();
  }
}
