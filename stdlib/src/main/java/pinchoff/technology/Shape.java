package pinchoff.technology;

import java.util.List;
import pinchoff.quantity.Dimension;

/** What may stand at a place of a technology file. */
sealed interface Shape {

  /** A text. */
  Shape WORDS = new Words();

  /** An absolute temperature. */
  Shape DEGREES = new Degrees();

  /** A quantity of a dimension in a range. */
  static Amount amount(Dimension dimension, Range range) {
    return new Amount(dimension, range);
  }

  /** An object with these keys and no others. */
  record Group(List<Field> fields) implements Shape {
    public Group {
      fields = List.copyOf(fields);
    }

    static Group of(Field... fields) {
      return new Group(List.of(fields));
    }

    List<String> keys() {
      return fields.stream().map(Field::key).toList();
    }
  }

  /**
   * An object whose keys are names that the file's writer chose.
   *
   * @param item what one name stands for, for a message: "a device"
   * @param each what each name has
   */
  record Catalog(String item, Group each) implements Shape {}

  /** A value that may bring where it comes from. */
  sealed interface Leaf extends Shape {}

  /** A quantity. */
  record Amount(Dimension dimension, Range range) implements Leaf {}

  /** An absolute temperature. */
  record Degrees() implements Leaf {}

  /** A text. */
  record Words() implements Leaf {}

  /** One of some words. */
  record Choice(List<String> words) implements Leaf {
    public Choice {
      words = List.copyOf(words);
    }
  }
}
