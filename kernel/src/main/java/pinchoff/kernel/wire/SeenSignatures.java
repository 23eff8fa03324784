package pinchoff.kernel.wire;

import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.Set;

/**
 * Remembers the newest signatures, so that a message that comes twice is refused. Shared by all
 * channels of a process; safe for use by several threads.
 */
final class SeenSignatures {
  private final int capacity;
  private final Set<String> seen = new HashSet<>();
  private final Deque<String> oldestFirst = new ArrayDeque<>();

  SeenSignatures(int capacity) {
    this.capacity = capacity;
  }

  /** Remembers a signature; false if it was there already. */
  synchronized boolean isNew(byte[] signature) {
    String key = new String(signature, StandardCharsets.ISO_8859_1);
    if (!seen.add(key)) {
      return false;
    }
    oldestFirst.addLast(key);
    if (oldestFirst.size() > capacity) {
      seen.remove(oldestFirst.removeFirst());
    }
    return true;
  }
}
