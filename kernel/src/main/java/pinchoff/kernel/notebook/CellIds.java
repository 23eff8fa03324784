package pinchoff.kernel.notebook;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HashSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * Gives ids to the cells that have none. An id is eight hex digits that depend on the cell's place
 * and text alone, so that the same file always gets the same ids.
 */
final class CellIds {
  private static final Pattern VALID = Pattern.compile("[A-Za-z0-9_-]{1,64}");

  private final Set<String> reserved = new HashSet<>();
  private final Set<String> given = new HashSet<>();

  /**
   * Starts with the ids that the file has.
   *
   * @param present the ids of all cells, empty for a cell without one
   */
  CellIds(List<Optional<String>> present) {
    present.forEach(id -> id.filter(CellIds::isValid).ifPresent(reserved::add));
  }

  /**
   * The id of the next cell: its own if that is valid and no earlier cell has it, else a new one.
   *
   * @param place number of the cell
   * @param text what it holds
   */
  String next(Optional<String> own, int place, String text) {
    if (own.isPresent() && isValid(own.get()) && given.add(own.get())) {
      return own.get();
    }
    for (int attempt = 0; ; attempt++) {
      String id = digest(place + ":" + attempt + ":" + text);
      if (!reserved.contains(id) && given.add(id)) {
        return id;
      }
    }
  }

  private static boolean isValid(String id) {
    return VALID.matcher(id).matches();
  }

  private static String digest(String text) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(hash, 0, 4);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
