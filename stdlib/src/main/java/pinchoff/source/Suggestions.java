package pinchoff.source;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds what a writer may have meant by a name that does not exist. */
public final class Suggestions {
  private static final int LONGEST = 64;

  private Suggestions() {}

  /**
   * The known name nearest to a wrong one: the fewest letters inserted, dropped, exchanged or
   * swapped with a neighbour, at most one in three. A difference in case counts less than any
   * other. Of several, the first in alphabetical order.
   *
   * @param wrong the name that was written
   * @param known the names that exist
   * @return the nearest, or empty if none is near
   */
  public static Optional<String> nearest(String wrong, Collection<String> known) {
    if (wrong.length() > LONGEST) {
      return Optional.empty();
    }
    String best = "";
    int bestCost = 2 * Math.max(1, wrong.length() / 3) + 1;
    for (String candidate : known) {
      if (Math.abs(candidate.length() - wrong.length()) * 2 >= bestCost + 2) {
        continue;
      }
      int cost = cost(wrong, candidate);
      if (cost < bestCost
          || (cost == bestCost && !best.isEmpty() && candidate.compareTo(best) < 0)) {
        best = candidate;
        bestCost = cost;
      }
    }
    return best.isEmpty() ? Optional.empty() : Optional.of(best);
  }

  /** The question {@code "did you mean V_OV?"}, or empty if no known name is near. */
  public static Optional<String> didYouMean(String wrong, Collection<String> known) {
    return nearest(wrong, known).map(name -> "did you mean " + name + "?");
  }

  /** Twice the number of edits; a name that differs in case alone costs one in all. */
  private static int cost(String a, String b) {
    if (a.equals(b)) {
      return 0;
    }
    String x = a.toLowerCase(Locale.ROOT);
    String y = b.toLowerCase(Locale.ROOT);
    return x.equals(y) ? 1 : 2 * edits(x, y);
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
