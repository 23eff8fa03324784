package pinchoff.kernel.json;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Reads the fields of one JSON object by name and type. A field that is missing, or null, takes the
 * default; a field of another type is an error that names it.
 */
public final class Fields {
  private final Map<String, Object> fields;
  private final String where;

  private Fields(Map<String, Object> fields, String where) {
    this.fields = fields;
    this.where = where;
  }

  /**
   * The fields of an object.
   *
   * @param where what the object is, for messages
   */
  public static Fields of(Map<String, Object> fields, String where) {
    return new Fields(fields, where);
  }

  /** The value as an object; an error that says what it is if it is none. */
  @SuppressWarnings("unchecked")
  public static Map<String, Object> object(@Nullable Object value, String where) {
    if (value instanceof Map<?, ?> map) {
      return (Map<String, Object>) map;
    }
    throw new JsonException(where + " is " + kind(value) + ": expected an object");
  }

  /** Whether the object has the field, with a value that is not null. */
  public boolean has(String name) {
    return fields.get(name) != null;
  }

  /** A text that must be there. */
  public String string(String name) {
    return optionalString(name).orElseThrow(() -> missing(name, "a string"));
  }

  /** A text, or the default. */
  public String string(String name, String otherwise) {
    return optionalString(name).orElse(otherwise);
  }

  /** A text if there is one. */
  public Optional<String> optionalString(String name) {
    return optional(name, String.class, "a string");
  }

  /** A truth value, or the default. */
  public boolean flag(String name, boolean otherwise) {
    return optional(name, Boolean.class, "true or false").orElse(otherwise);
  }

  /** An integer that must be there. */
  public int integer(String name) {
    return optionalInteger(name).orElseThrow(() -> missing(name, "an integer"));
  }

  /** An integer, or the default. */
  public int integer(String name, int otherwise) {
    return optionalInteger(name).orElse(otherwise);
  }

  /** An integer of 32 bits if there is one. */
  public Optional<Integer> optionalInteger(String name) {
    Object value = fields.get(name);
    if (value == null) {
      return Optional.empty();
    }
    if (value instanceof Long n && n == n.intValue()) {
      return Optional.of(n.intValue());
    }
    if (value instanceof Integer n) {
      return Optional.of(n);
    }
    throw wrong(name, value, "an integer of 32 bits");
  }

  /** An object, or an empty one. */
  public Map<String, Object> object(String name) {
    Object value = fields.get(name);
    return value == null ? Map.of() : object(value, where + ": field \"" + name + "\"");
  }

  /** A list, or an empty one. */
  @SuppressWarnings("unchecked")
  public List<Object> list(String name) {
    return optional(name, List.class, "a list").map(l -> (List<Object>) l).orElse(List.of());
  }

  /** A list of texts, or an empty one. */
  public List<String> strings(String name) {
    List<String> strings = new ArrayList<>();
    for (Object item : list(name)) {
      if (!(item instanceof String s)) {
        throw wrong(name, item, "a list of strings");
      }
      strings.add(s);
    }
    return strings;
  }

  private <T> Optional<T> optional(String name, Class<T> type, String expected) {
    Object value = fields.get(name);
    if (value != null && !type.isInstance(value)) {
      throw wrong(name, value, expected);
    }
    return Optional.ofNullable(type.cast(value));
  }

  private JsonException missing(String name, String expected) {
    return new JsonException(where + ": field \"" + name + "\" is missing: expected " + expected);
  }

  private JsonException wrong(String name, @Nullable Object value, String expected) {
    return new JsonException(
        where + ": field \"" + name + "\" is " + kind(value) + ": expected " + expected);
  }

  private static String kind(@Nullable Object value) {
    if (value == null) {
      return "null";
    }
    if (value instanceof Map) {
      return "an object";
    }
    if (value instanceof List) {
      return "a list";
    }
    if (value instanceof String) {
      return "a string";
    }
    return value instanceof Boolean ? "true or false" : "the number " + value;
  }
}
