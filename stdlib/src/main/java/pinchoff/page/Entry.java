package pinchoff.page;

import java.util.Optional;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/** What stands in a cell of a table or in a sentence. */
public sealed interface Entry {

  /** The number of significant digits that is shown unless something else is asked for. */
  int DIGITS = 4;

  /** Nothing. */
  Entry EMPTY = new Words("");

  /** Plain text, shown as it is. */
  record Words(String text) implements Entry {}

  /** A symbol in trade notation. */
  record Notation(Symbol symbol) implements Entry {}

  /**
   * A quantity with its unit.
   *
   * @param quantity what to show
   * @param digits significant digits, 1 to 17
   */
  record Amount(Quantity quantity, int digits) implements Entry {

    /** Checks the number of digits. */
    public Amount {
      if (digits < 1 || digits > 17) {
        throw new IllegalArgumentException(
            "significant digits to show for " + quantity + ": expected 1 to 17, found " + digits);
      }
    }
  }

  /** An absolute temperature, shown in degrees Celsius. */
  record Degrees(Temperature temperature) implements Entry {}

  /** A number of things, without a unit. */
  record Count(long number) implements Entry {}

  /** The outcome of a check. */
  record Judgement(Verdict verdict) implements Entry {}

  /** A formula within a line. */
  record Formula(Relation relation) implements Entry {}

  /** A run of entries, as a sentence. */
  record Run(Phrase phrase) implements Entry {}

  /** Plain text. */
  static Entry of(String text) {
    return text.isEmpty() ? EMPTY : new Words(text);
  }

  /** A symbol. */
  static Entry of(Symbol symbol) {
    return new Notation(symbol);
  }

  /** A quantity with {@value #DIGITS} significant digits. */
  static Entry of(Quantity quantity) {
    return of(quantity, DIGITS);
  }

  /** A quantity with the given number of significant digits. */
  static Entry of(Quantity quantity, int digits) {
    return new Amount(quantity, digits);
  }

  /** A temperature in degrees Celsius. */
  static Entry of(Temperature temperature) {
    return new Degrees(temperature);
  }

  /** A number of things. */
  static Entry of(long number) {
    return new Count(number);
  }

  /** A verdict. */
  static Entry of(Verdict verdict) {
    return new Judgement(verdict);
  }

  /** A formula. */
  static Entry of(Relation relation) {
    return new Formula(relation);
  }

  /** A run of entries. */
  static Entry of(Phrase phrase) {
    return new Run(phrase);
  }

  /**
   * An entry for any of the things that have one. An empty {@link Optional} is an empty entry.
   *
   * @throws IllegalArgumentException for anything else, a bare floating-point number above all: it
   *     has no unit
   */
  static Entry from(Object thing) {
    if (thing instanceof Entry entry) {
      return entry;
    } else if (thing instanceof String text) {
      return of(text);
    } else if (thing instanceof Symbol symbol) {
      return of(symbol);
    } else if (thing instanceof Quantity quantity) {
      return of(quantity);
    } else if (thing instanceof Temperature temperature) {
      return of(temperature);
    } else if (thing instanceof Verdict verdict) {
      return of(verdict);
    } else if (thing instanceof Relation relation) {
      return of(relation);
    } else if (thing instanceof Phrase phrase) {
      return of(phrase);
    } else if (thing instanceof Integer || thing instanceof Long) {
      return of(((Number) thing).longValue());
    } else if (thing instanceof Optional<?> maybe) {
      return maybe.map(Entry::from).orElse(EMPTY);
    }
    throw new IllegalArgumentException(
        "a page cannot show a "
            + thing.getClass().getSimpleName()
            + " ("
            + thing
            + "): expected text, a whole number, Symbol, Quantity, Temperature, Verdict, Relation, Phrase or Entry");
  }
}
