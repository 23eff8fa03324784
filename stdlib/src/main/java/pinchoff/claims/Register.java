package pinchoff.claims;

import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.WeakHashMap;
import pinchoff.display.Host;

/** The premises that were read, for each host. */
final class Register {
  private static final Map<Host, Register> ALL = Collections.synchronizedMap(new WeakHashMap<>());

  private final Map<String, Premise> premises = new LinkedHashMap<>();

  private Register() {}

  static Register ofThisHost() {
    return ALL.computeIfAbsent(Host.current(), host -> new Register());
  }

  synchronized void note(Premise premise) {
    premises.put(premise.name(), premise);
  }

  synchronized Collection<Premise> premises() {
    return List.copyOf(premises.values());
  }
}
