package pinchoff.cells;

import java.util.Collections;
import java.util.Map;
import java.util.Set;
import java.util.WeakHashMap;
import java.util.concurrent.ConcurrentHashMap;
import pinchoff.display.Host;

/** The named places that have been published, for each host. */
final class Places {
  private static final Map<Host, Set<String>> KNOWN =
      Collections.synchronizedMap(new WeakHashMap<>());

  private Places() {}

  static boolean isNew(Host host, String place) {
    return KNOWN.computeIfAbsent(host, h -> ConcurrentHashMap.newKeySet()).add(place);
  }
}
