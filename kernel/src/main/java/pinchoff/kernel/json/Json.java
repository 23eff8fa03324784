package pinchoff.kernel.json;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import pinchoff.kernel.limits.Limits;

/** Reads JSON text into trees and writes trees as JSON text. */
public final class Json {

  private Json() {}

  /**
   * Reads one JSON value and nothing after it.
   *
   * @param utf8 the text in UTF-8
   * @return the tree; null if the text is the word null
   * @throws JsonException if it is not UTF-8, not JSON, or larger or deeper than allowed
   */
  public static @Nullable Object parse(byte[] utf8, Limits limits) {
    if (utf8.length > limits.frameBytes()) {
      throw new JsonException(
          utf8.length + " bytes of JSON: expected at most " + limits.frameBytes());
    }
    return new JsonReader(limits).read(decoded(utf8));
  }

  /**
   * Reads one JSON object and nothing after it.
   *
   * @throws JsonException as {@link #parse}, and if the value is no object
   */
  public static Map<String, Object> parseObject(byte[] utf8, Limits limits) {
    return Fields.object(parse(utf8, limits), "the JSON value");
  }

  /** Writes a tree on one line in UTF-8. */
  public static byte[] bytes(@Nullable Object tree) {
    return JsonWriter.compact(tree);
  }

  /** Writes a tree on one line. */
  public static String text(@Nullable Object tree) {
    return new String(bytes(tree), StandardCharsets.UTF_8);
  }

  /**
   * Writes a tree for readers and small differences: one element a line, one space of indent, empty
   * objects and arrays as {@code {}} and {@code []}, no newline at the end. The order of keys is
   * that of the maps.
   */
  public static String indented(@Nullable Object tree) {
    return JsonWriter.indented(tree);
  }

  /**
   * An object with its fields in order.
   *
   * @param namesAndValues name, value, name, value, …
   */
  public static Map<String, Object> object(Object... namesAndValues) {
    if (namesAndValues.length % 2 != 0) {
      throw new IllegalArgumentException("a field without a value");
    }
    Map<String, Object> object = new LinkedHashMap<>();
    for (int i = 0; i < namesAndValues.length; i += 2) {
      object.put((String) namesAndValues[i], namesAndValues[i + 1]);
    }
    return object;
  }

  private static CharBuffer decoded(byte[] utf8) {
    try {
      return StandardCharsets.UTF_8
          .newDecoder()
          .onMalformedInput(CodingErrorAction.REPORT)
          .onUnmappableCharacter(CodingErrorAction.REPORT)
          .decode(ByteBuffer.wrap(utf8));
    } catch (CharacterCodingException e) {
      throw new JsonException("JSON is not UTF-8");
    }
  }
}
