package pinchoff.technology;

import java.util.List;
import pinchoff.source.Excerpt;

/** A piece of JSON that knows where it stands. */
sealed interface JsonNode {

  /** Where it stands in the file. */
  Place place();

  /** What it is, for the error that something else was expected. */
  String describe();

  /** A key of an object and its value. */
  record Member(String key, Place keyPlace, JsonNode value) {}

  /** An object; its keys differ. */
  record Branch(Place place, List<Member> members) implements JsonNode {
    public Branch {
      members = List.copyOf(members);
    }

    @Override
    public String describe() {
      return "an object";
    }
  }

  /** A list. The format has none; what was in it is not kept. */
  record Sequence(Place place) implements JsonNode {
    @Override
    public String describe() {
      return "a list";
    }
  }

  /**
   * A text.
   *
   * @param verbatim true if the file spells it without escapes, so that places within it are known
   */
  record Text(Place place, String text, boolean verbatim) implements JsonNode {
    @Override
    public String describe() {
      return Excerpt.quote(text);
    }

    /** The place of a part of the text; of all of it if it is spelled with escapes. */
    Place part(int from, int to) {
      return verbatim ? place.part(from + 1, to + 1) : place;
    }
  }

  /** A number without quotes, as the file spells it. */
  record Bare(Place place, String text) implements JsonNode {
    @Override
    public String describe() {
      return Excerpt.clip(text, Excerpt.QUOTED);
    }
  }

  /** {@code true}, {@code false} or {@code null}. */
  record Literal(Place place, String text) implements JsonNode {
    @Override
    public String describe() {
      return text;
    }
  }
}
