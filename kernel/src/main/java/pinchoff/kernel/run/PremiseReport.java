package pinchoff.kernel.run;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** What a kernel says of the premises that its cells have read. */
final class PremiseReport {
  private PremiseReport() {}

  /**
   * The names in the value of a user expression.
   *
   * @param expression what the reply holds for it; anything that is no answer counts as no names
   */
  static Set<String> of(@Nullable Object expression) {
    if (expression instanceof Map<?, ?> answer
        && answer.get("data") instanceof Map<?, ?> data
        && data.get("text/plain") instanceof String names) {
      Set<String> all = new LinkedHashSet<>(List.of(names.split(" ")));
      all.remove("");
      return all;
    }
    return Set.of();
  }
}
