package pinchoff.technology;

import java.util.Optional;
import pinchoff.page.Entry;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Temperature;

/**
 * A value as a technology file states it.
 *
 * @param content what it is
 * @param spelled how the file spells it
 * @param origin where it comes from, if the file says so
 * @param region the region that it was extracted in, if the file says so
 * @param method how it was extracted, if the file says so
 * @param place where it stands in the file
 */
record Stated(
    Content content,
    String spelled,
    Optional<String> origin,
    Optional<String> region,
    Optional<String> method,
    Place place) {

  /** What a value is. */
  sealed interface Content {

    /** A form that is the same for all spellings of the same value, to the last bit. */
    String canonical();

    /** How a page shows it. */
    Entry entry();

    /** A quantity. */
    record Amount(Quantity quantity) implements Content {
      @Override
      public String canonical() {
        return "amount " + bits(quantity.si()) + " " + quantity.dimension();
      }

      @Override
      public Entry entry() {
        return Entry.of(quantity);
      }
    }

    /** An absolute temperature. */
    record Degrees(Temperature temperature) implements Content {
      @Override
      public String canonical() {
        return "temperature " + bits(temperature.kelvin());
      }

      @Override
      public Entry entry() {
        return Entry.of(temperature);
      }
    }

    /** A text or a chosen word. */
    record Words(String text) implements Content {
      @Override
      public String canonical() {
        return "text " + text;
      }

      @Override
      public Entry entry() {
        return Entry.of(text);
      }
    }
  }

  /** All digits of a double, the same on every machine. */
  private static String bits(double value) {
    return Long.toHexString(Double.doubleToLongBits(value));
  }
}
