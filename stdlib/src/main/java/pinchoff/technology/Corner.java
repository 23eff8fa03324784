package pinchoff.technology;

import java.util.Locale;

/** Where a process lies within its spread, for the devices of one polarity. */
public enum Corner {
  /** Hard to turn on and of little transconductance: the least current. */
  SLOW,
  /** As the technology file states its parameters. */
  TYPICAL,
  /** Easy to turn on and of much transconductance: the most current. */
  FAST;

  /** The word in lower case, as technology files spell it. */
  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT);
  }
}
