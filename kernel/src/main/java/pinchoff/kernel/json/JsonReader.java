package pinchoff.kernel.json;

import java.nio.CharBuffer;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import pinchoff.kernel.limits.Limits;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.json.JsonFactory;

/** Builds a tree from JSON tokens. */
final class JsonReader {
  private static final int NUMBER_LENGTH = 400;

  private final JsonFactory factory;

  JsonReader(Limits limits) {
    factory = limits.equals(Limits.standard()) ? Standard.FACTORY : factory(limits);
  }

  @Nullable Object read(CharBuffer text) {
    try (JsonParser parser =
        factory.createParser(
            ObjectReadContext.empty(),
            text.array(),
            text.arrayOffset() + text.position(),
            text.remaining())) {
      if (parser.nextToken() == null) {
        throw new JsonException("JSON is empty");
      }
      Object tree = value(parser);
      if (parser.nextToken() != null) {
        throw new JsonException("JSON goes on after its end" + place(parser));
      }
      return tree;
    } catch (JacksonException e) {
      var location = e.getLocation();
      throw new JsonException(
          "JSON cannot be read"
              + (location == null
                  ? ""
                  : " at line " + location.getLineNr() + ", column " + location.getColumnNr())
              + ": "
              + e.getOriginalMessage());
    }
  }

  private static @Nullable Object value(JsonParser parser) {
    return switch (parser.currentToken()) {
      case START_OBJECT -> object(parser);
      case START_ARRAY -> array(parser);
      case VALUE_STRING -> parser.getString();
      case VALUE_NUMBER_INT ->
          switch (parser.getNumberType()) {
            case INT, LONG -> parser.getLongValue();
            default -> parser.getBigIntegerValue();
          };
      case VALUE_NUMBER_FLOAT -> finite(parser);
      case VALUE_TRUE -> true;
      case VALUE_FALSE -> false;
      case VALUE_NULL -> null;
      default -> throw new JsonException("JSON is not complete" + place(parser));
    };
  }

  private static Map<String, @Nullable Object> object(JsonParser parser) {
    Map<String, @Nullable Object> object = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      parser.nextToken();
      object.put(name, value(parser));
    }
    return object;
  }

  private static List<@Nullable Object> array(JsonParser parser) {
    List<@Nullable Object> array = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      array.add(value(parser));
    }
    return array;
  }

  private static Double finite(JsonParser parser) {
    double number = parser.getDoubleValue();
    if (!Double.isFinite(number)) {
      throw new JsonException("JSON number is too large" + place(parser));
    }
    return number;
  }

  private static String place(JsonParser parser) {
    var location = parser.currentTokenLocation();
    return " at line " + location.getLineNr() + ", column " + location.getColumnNr();
  }

  private static JsonFactory factory(Limits limits) {
    return JsonFactory.builder()
        .streamReadConstraints(
            StreamReadConstraints.builder()
                .maxNestingDepth(limits.jsonDepth())
                .maxStringLength(limits.frameBytes())
                .maxNameLength(Math.min(limits.frameBytes(), 50_000))
                .maxNumberLength(NUMBER_LENGTH)
                .build())
        .build();
  }

  /** Made once: building a factory costs more than reading a small message. */
  private static final class Standard {
    static final JsonFactory FACTORY = factory(Limits.standard());
  }
}
