package pinchoff.display;

/** Holds the host of this process. */
final class CurrentHost {
  private static volatile Host host = new PlainHost();

  private CurrentHost() {}

  static Host get() {
    return host;
  }

  static synchronized Host replaceBy(Host next) {
    Host previous = host;
    host = next;
    return previous;
  }
}
