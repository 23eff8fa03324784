package pinchoff.kernel.protocol;

import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Dates as the protocol writes them: ISO 8601 in UTC with exactly 6 decimals. */
public final class Dates {
  private static final DateTimeFormatter FORMAT =
      DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSSSSS'Z'", Locale.ROOT)
          .withZone(ZoneOffset.UTC);

  private Dates() {}

  /** The text of a moment, cut to whole microseconds. */
  public static String format(Instant moment) {
    return FORMAT.format(moment);
  }
}
