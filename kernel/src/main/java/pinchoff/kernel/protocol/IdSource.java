package pinchoff.kernel.protocol;

import java.util.UUID;

/** Where ids come from. */
@FunctionalInterface
public interface IdSource {
  /** An id that this process has not used yet. */
  String next();

  /** Ids that no other process uses either. */
  static IdSource random() {
    return () -> UUID.randomUUID().toString();
  }
}
