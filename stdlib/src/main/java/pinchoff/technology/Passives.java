package pinchoff.technology;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The resistors and capacitors of a process, by name, in the order of the file.
 *
 * @param resistors kinds of resistors
 * @param capacitors kinds of capacitors
 */
public record Passives(Map<String, ResistorKind> resistors, Map<String, CapacitorKind> capacitors) {

  /** Copies the maps. */
  public Passives {
    resistors = Collections.unmodifiableMap(new LinkedHashMap<>(resistors));
    capacitors = Collections.unmodifiableMap(new LinkedHashMap<>(capacitors));
  }
}
