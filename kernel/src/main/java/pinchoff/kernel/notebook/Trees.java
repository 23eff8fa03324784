package pinchoff.kernel.notebook;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;

/** JSON trees: unmodifiable copies, which may hold null as JSON may. */
final class Trees {
  private Trees() {}

  /** An unmodifiable deep copy of an object, in its order. */
  static Map<String, Object> frozen(Map<String, ?> object) {
    Map<String, Object> copy = new LinkedHashMap<>();
    object.forEach((name, value) -> put(copy, name, frozenNode(value)));
    return Collections.unmodifiableMap(copy);
  }

  /** The same tree with the names of every object in order. */
  static Map<String, Object> sorted(Map<String, ?> object) {
    Map<String, Object> copy = new TreeMap<>();
    object.forEach((name, value) -> put(copy, name, sortedNode(value)));
    return copy;
  }

  /** The object without some of its fields. */
  static Map<String, Object> without(Map<String, Object> object, String... names) {
    Map<String, Object> rest = new LinkedHashMap<>(object);
    rest.keySet().removeAll(List.of(names));
    return Collections.unmodifiableMap(rest);
  }

  /** The object with one field set. */
  static Map<String, Object> with(Map<String, Object> object, String name, Object value) {
    Map<String, Object> copy = new LinkedHashMap<>(object);
    copy.put(name, value);
    return Collections.unmodifiableMap(copy);
  }

  @SuppressWarnings("NullAway") // the value of a JSON field may be null
  private static void put(Map<String, Object> object, String name, @Nullable Object value) {
    object.put(name, value);
  }

  @SuppressWarnings("unchecked")
  private static @Nullable Object frozenNode(@Nullable Object node) {
    if (node instanceof Map<?, ?> map) {
      return frozen((Map<String, ?>) map);
    }
    if (node instanceof List<?> list) {
      List<@Nullable Object> copy = new ArrayList<>();
      list.forEach(item -> copy.add(frozenNode(item)));
      return Collections.unmodifiableList(copy);
    }
    return node;
  }

  @SuppressWarnings("unchecked")
  private static @Nullable Object sortedNode(@Nullable Object node) {
    if (node instanceof Map<?, ?> map) {
      return sorted((Map<String, ?>) map);
    }
    if (node instanceof List<?> list) {
      List<@Nullable Object> copy = new ArrayList<>();
      list.forEach(item -> copy.add(sortedNode(item)));
      return copy;
    }
    return node;
  }
}
