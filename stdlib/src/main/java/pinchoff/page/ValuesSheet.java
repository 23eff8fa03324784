package pinchoff.page;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import pinchoff.quantity.Quantity;

/**
 * The canonical values of a page and what they rest on.
 *
 * @param values the values in order, no two with the same id
 * @param premises the named inputs that were read, in order
 * @param technologies the technology files that were used, in order
 * @param completeness how much of the work was done
 */
public record ValuesSheet(
    List<Value> values,
    List<Premise> premises,
    List<TechnologyFile> technologies,
    Optional<Completeness> completeness) {

  /**
   * A named input that was read.
   *
   * @param name its name
   * @param value what it was worth
   * @param overridden true if it was set from outside
   */
  public record Premise(String name, Quantity value, boolean overridden) {}

  /**
   * A technology file that was used.
   *
   * @param name its name as the cell gave it
   * @param contentHash the hash of its content
   */
  public record TechnologyFile(String name, String contentHash) {}

  /**
   * How much of the work was done when the result was made.
   *
   * @param done parts that are done
   * @param of parts in all
   */
  public record Completeness(long done, long of) {

    /** Checks that not more is done than there is. */
    public Completeness {
      if (done < 0 || done > of) {
        throw new IllegalArgumentException(
            "completeness of " + done + " of " + of + ": expected 0 to " + of);
      }
    }

    /** This and another part of the work. */
    public Completeness and(Completeness other) {
      return new Completeness(done + other.done, of + other.of);
    }

    /** True if nothing is left to do. */
    public boolean complete() {
      return done == of;
    }
  }

  /** A sheet with nothing in it. */
  public static final ValuesSheet EMPTY =
      new ValuesSheet(List.of(), List.of(), List.of(), Optional.empty());

  /**
   * Copies the lists and checks the ids.
   *
   * @throws IllegalArgumentException if an id is used twice, with the names of both values
   */
  public ValuesSheet {
    values = List.copyOf(values);
    premises = List.copyOf(premises);
    technologies = List.copyOf(technologies);
    Map<String, String> names = new HashMap<>();
    for (Value value : values) {
      String earlier = names.putIfAbsent(value.id(), value.name());
      if (earlier != null) {
        throw new IllegalArgumentException(
            "value id \""
                + value.id()
                + "\" is used twice on a page: by \""
                + Escape.visible(earlier)
                + "\" and by \""
                + Escape.visible(value.name())
                + "\"");
      }
    }
  }

  /** True if there is nothing to compare or to rest on. */
  public boolean isEmpty() {
    return values.isEmpty()
        && premises.isEmpty()
        && technologies.isEmpty()
        && completeness.isEmpty();
  }

  /** The value with this id. */
  public Optional<Value> value(String id) {
    return values.stream().filter(v -> v.id().equals(id)).findFirst();
  }

  /** The same sheet with every id under a prefix. */
  public ValuesSheet under(String prefix) {
    return new ValuesSheet(
        values.stream().map(v -> v.under(prefix)).toList(), premises, technologies, completeness);
  }

  /**
   * Several sheets as one; premises and technology files that are in several are taken once.
   *
   * @throws IllegalArgumentException if an id is used twice, with the names of both values
   */
  public static ValuesSheet join(List<ValuesSheet> sheets) {
    return new ValuesSheet(
        sheets.stream().flatMap(s -> s.values.stream()).toList(),
        sheets.stream().flatMap(s -> s.premises.stream()).distinct().toList(),
        sheets.stream().flatMap(s -> s.technologies.stream()).distinct().toList(),
        sheets.stream().flatMap(s -> s.completeness.stream()).reduce(Completeness::and));
  }

  /**
   * The sheet as the JSON tree of {@code application/vnd.pinchoff.values+json}, version 1.
   *
   * <p>Numbers are in SI units, as decimals that read back to the same floating-point number and
   * are written alike by every Java version.
   */
  public Map<String, Object> json() {
    return ValuesJson.of(this);
  }
}
