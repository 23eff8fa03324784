package pinchoff.source;

import java.util.Locale;

/** How much an issue matters. */
public enum Severity {
  /** The text cannot be used. */
  ERROR,
  /** The text can be used, but probably does not mean what its writer wants. */
  WARNING,
  /** Something worth knowing. */
  NOTE;

  /** The word in lower case. */
  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT);
  }
}
