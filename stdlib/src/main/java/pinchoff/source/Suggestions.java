package pinchoff.source;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds what a writer may have meant by a name that does not exist. */
public final class Suggestions {
  private static final int LONGEST = 64;
  private static final int EDIT = LONGEST + 1;

  private Suggestions() {}

  /**
   * The known name nearest to a wrong one: the fewest letters inserted, dropped, exchanged or
   * swapped with a neighbour, at most one in three of the wrong name. A difference in case alone
   * counts less than any other. Of several, the first in alphabetical order.
   *
   * @param wrong the name that was written
   * @param known the names that exist
   * @return the nearest, or empty if none is near
   */
  public static Optional<String> nearest(String wrong, Collection<String> known) {
    if (wrong.isEmpty() || wrong.length() > LONGEST) {
      return Optional.empty();
    }
    int edits = Math.max(1, wrong.length() / 3);
    // A name of one letter is near nothing but the same letter in the other case.
    int most = wrong.length() == 1 ? 1 : edits * EDIT;
    Optional<String> best = Optional.empty();
    int least = most + 1;
    for (String name : known) {
      if (Math.abs(name.length() - wrong.length()) > edits) {
        continue;
      }
      int cost = cost(wrong, name);
      boolean first = cost == least && best.filter(b -> name.compareTo(b) < 0).isPresent();
      if (cost < least || first) {
        best = Optional.of(name);
        least = cost;
      }
    }
    return best;
  }

  /** The question {@code "did you mean V_OV?"}, or empty if no known name is near. */
  public static Optional<String> didYouMean(String wrong, Collection<String> known) {
    return nearest(wrong, known).map(name -> "did you mean " + name + "?");
  }

  /** The number of letters in another case if nothing else differs; else the weighted edits. */
  private static int cost(String wrong, String name) {
    String a = wrong.toLowerCase(Locale.ROOT);
    String b = name.toLowerCase(Locale.ROOT);
    if (!a.equals(b)) {
      return EDIT * edits(a, b);
    }
    int differences = 0;
    for (int i = 0; i < Math.min(wrong.length(), name.length()); i++) {
      differences += wrong.charAt(i) == name.charAt(i) ? 0 : 1;
    }
    return differences;
  }

  /** Edit distance with swaps of neighbours (optimal string alignment). */
  private static int edits(String a, String b) {
    int[] twoAgo = new int[b.length() + 1];
    int[] before = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      before[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] row = new int[b.length() + 1];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
        row[j] = Math.min(Math.min(before[j], row[j - 1]) + 1, before[j - 1] + change);
        boolean swapped =
            i > 1
                && j > 1
                && a.charAt(i - 1) == b.charAt(j - 2)
                && a.charAt(i - 2) == b.charAt(j - 1);
        if (swapped) {
          row[j] = Math.min(row[j], twoAgo[j - 2] + 1);
        }
      }
      twoAgo = before;
      before = row;
    }
    return before[b.length()];
  }
}
