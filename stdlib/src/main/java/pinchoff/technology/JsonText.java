package pinchoff.technology;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import pinchoff.source.Excerpt;
import pinchoff.source.SourceText;
import pinchoff.source.TextLimits;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.json.JsonFactory;

/**
 * Reads JSON into nodes that know their places. What is not JSON or beyond a limit ends the
 * reading; a key that comes twice or a text that is no text is noted, and the reading goes on.
 */
final class JsonText {
  static final TextLimits LIMITS = TextLimits.FILE;

  /** The most keys in one file. */
  static final int MOST_KEYS = 20_000;

  /** The longest key. */
  static final int LONGEST_KEY = 100;

  /** The longest text, for example an origin. */
  static final int LONGEST_TEXT = 2_000;

  /** The longest number. */
  static final int LONGEST_NUMBER = 60;

  private static final int LONGEST_MESSAGE = 160;
  private static final char BYTE_ORDER_MARK = '\uFEFF';

  /** What the parser adds to its messages for programmers. */
  private static final List<String> INTERNALS =
      List.of(" (start marker", " (for ", ": enable `", "? (not");

  /** All limits are checked here, with our own words, so the parser's own are out of the way. */
  private static final JsonFactory FACTORY =
      JsonFactory.builder()
          .streamReadConstraints(
              StreamReadConstraints.builder()
                  .maxNestingDepth(LIMITS.depth() + 1)
                  .maxNumberLength(LIMITS.length())
                  .maxStringLength(LIMITS.length())
                  .maxNameLength(LIMITS.length())
                  .build())
          .build();

  private final SourceText source;
  private final Faults faults;
  private int keys;

  private JsonText(Faults faults) {
    this.source = faults.source();
    this.faults = faults;
  }

  /**
   * Reads one JSON value.
   *
   * @param faults has the text, and takes what is wrong with it
   * @return the value, or empty if the text is not JSON or beyond the limits
   */
  static Optional<JsonNode> parse(Faults faults) {
    return new JsonText(faults).whole();
  }

  private Optional<JsonNode> whole() {
    try {
      checkStart();
      try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), source.text())) {
        return Optional.of(root(parser));
      }
    } catch (JacksonException notJson) {
      noteNotJson(notJson);
    } catch (Unreadable unreadable) {
      faults.add(unreadable.place, unreadable.words);
    }
    return Optional.empty();
  }

  private void checkStart() {
    String text = source.text();
    int length = text.length();
    if (length > LIMITS.length()) {
      throw new Unreadable(
          new Place(0, 0),
          "file of " + length + " characters: expected at most " + LIMITS.length());
    }
    if (length > 0 && text.charAt(0) == BYTE_ORDER_MARK) {
      throw new Unreadable(
          new Place(0, 1),
          "the file begins with a byte order mark (U+FEFF): expected UTF-8 without one");
    }
    int half = TextFitness.halfCharacter(text);
    if (half >= 0) {
      throw new Unreadable(
          new Place(half, half + 1),
          "half a character, " + TextFitness.code(text, half) + ": expected both halves");
    }
  }

  private JsonNode root(JsonParser parser) {
    if (parser.nextToken() == null) {
      int end = source.text().length();
      throw new Unreadable(
          new Place(end, end), "the file is empty: expected an object in braces, { … }");
    }
    JsonNode root = node(parser, 0);
    if (parser.nextToken() != null) {
      throw new Unreadable(
          place(parser), "more after the end of the object: expected nothing after it");
    }
    return root;
  }

  private JsonNode node(JsonParser parser, int depth) {
    @Nullable JsonToken token = parser.currentToken();
    if (token == JsonToken.START_OBJECT) {
      return object(parser, depth + 1);
    }
    if (token == JsonToken.START_ARRAY) {
      return list(parser, depth + 1);
    }
    String text = parser.getString();
    Place place = place(parser);
    if (token == JsonToken.VALUE_STRING) {
      checkText(text, place, "text", LONGEST_TEXT);
      return new JsonNode.Text(place, text, place.end() - place.start() == text.length() + 2);
    }
    if (token == JsonToken.VALUE_NUMBER_INT || token == JsonToken.VALUE_NUMBER_FLOAT) {
      checkLength(text, place, "number", LONGEST_NUMBER);
      return new JsonNode.Bare(place, text);
    }
    return new JsonNode.Literal(place, text);
  }

  private JsonNode object(JsonParser parser, int depth) {
    int start = enter(parser, depth);
    List<JsonNode.Member> members = new ArrayList<>();
    Map<String, Place> seen = new HashMap<>();
    while (parser.nextToken() == JsonToken.PROPERTY_NAME) {
      String key = parser.getString();
      Place keyPlace = keyPlace(start(parser));
      checkText(key, keyPlace, "key", LONGEST_KEY);
      if (++keys > MOST_KEYS) {
        throw new Unreadable(keyPlace, "more than " + MOST_KEYS + " keys");
      }
      parser.nextToken();
      JsonNode value = node(parser, depth);
      Place first = seen.putIfAbsent(key, keyPlace);
      if (first == null) {
        members.add(new JsonNode.Member(key, keyPlace, value));
      } else {
        faults.add(
            keyPlace,
            Excerpt.quote(key)
                + " is here a second time: expected each key once, and it is at "
                + faults.where(first.start())
                + " already");
      }
    }
    return new JsonNode.Branch(new Place(start, offset(parser)), members);
  }

  private JsonNode list(JsonParser parser, int depth) {
    int start = enter(parser, depth);
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      JsonNode unused = node(parser, depth);
    }
    return new JsonNode.Sequence(new Place(start, offset(parser)));
  }

  /** Checks the depth and returns where the object or list begins. */
  private static int enter(JsonParser parser, int depth) {
    if (depth > LIMITS.depth()) {
      throw new Unreadable(
          place(parser), "nested more than " + LIMITS.depth() + " levels deep: expected less");
    }
    return start(parser);
  }

  private void checkText(String text, Place place, String what, int most) {
    checkLength(text, place, what, most);
    TextFitness.fault(text).ifPresent(fault -> faults.add(place, what + " with " + fault));
  }

  private static void checkLength(String text, Place place, String what, int most) {
    if (text.length() > most) {
      throw new Unreadable(
          place, what + " of " + text.length() + " characters: expected at most " + most);
    }
  }

  private static Place place(JsonParser parser) {
    return new Place(start(parser), offset(parser));
  }

  /** The parser has gone on to the value already, so the end of a key is found from its start. */
  private Place keyPlace(int start) {
    String text = source.text();
    int end = start + 1;
    while (text.charAt(end) != '"') {
      end += text.charAt(end) == '\\' ? 2 : 1;
    }
    return new Place(start, end + 1);
  }

  private static int start(JsonParser parser) {
    return (int) parser.currentTokenLocation().getCharOffset();
  }

  private static int offset(JsonParser parser) {
    return (int) parser.currentLocation().getCharOffset();
  }

  private void noteNotJson(JacksonException fault) {
    String text = source.text();
    int at = (int) Math.max(0, Math.min(text.length(), fault.getLocation().getCharOffset()));
    int end = at == text.length() ? at : text.offsetByCodePoints(at, 1);
    String words = fault.getOriginalMessage();
    for (String internal : INTERNALS) {
      int cut = words.indexOf(internal);
      words = cut < 0 ? words : words.substring(0, cut);
    }
    words = words.substring(0, 1).toLowerCase(Locale.ROOT) + words.substring(1);
    faults.add(new Place(at, end), "this is not JSON: " + Excerpt.clip(words, LONGEST_MESSAGE));
  }

  /** What ends the reading. */
  private static final class Unreadable extends RuntimeException {
    private static final long serialVersionUID = 1;
    private final transient Place place;
    private final String words;

    Unreadable(Place place, String words) {
      super(words, null, false, false);
      this.place = place;
      this.words = words;
    }
  }
}
