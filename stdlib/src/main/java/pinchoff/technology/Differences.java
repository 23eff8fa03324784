package pinchoff.technology;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import pinchoff.page.Entry;
import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/** Finds the values in which two documents differ. */
final class Differences {
  private static final int MOST_DIGITS = 17;

  private Differences() {}

  static List<Difference> between(Document before, Document after) {
    Set<String> paths = new LinkedHashSet<>(before.values().keySet());
    paths.addAll(after.values().keySet());
    List<Difference> differences = new ArrayList<>();
    for (String path : paths) {
      Optional<Stated> old = before.stated(path);
      Optional<Stated> fresh = after.stated(path);
      if (!canonical(old).equals(canonical(fresh))) {
        differences.add(content(path, old, fresh));
      }
      text(path + ", origin", Stated::origin, old, fresh).ifPresent(differences::add);
      text(path + ", region", Stated::region, old, fresh).ifPresent(differences::add);
      text(path + ", method", Stated::method, old, fresh).ifPresent(differences::add);
    }
    return differences;
  }

  private static String canonical(Optional<Stated> stated) {
    return stated.map(s -> s.content().canonical()).orElse("");
  }

  private static Difference content(String path, Optional<Stated> old, Optional<Stated> fresh) {
    Optional<Quantity> x = old.flatMap(Differences::amount);
    Optional<Quantity> y = fresh.flatMap(Differences::amount);
    if (x.isPresent() && y.isPresent()) {
      int digits = digits(x.get(), y.get());
      return new Difference(
          path, Entry.of(x.get(), digits), Entry.of(y.get(), digits), relative(x.get(), y.get()));
    }
    return new Difference(path, entry(old), entry(fresh), kelvins(old, fresh));
  }

  private static Optional<Difference> text(
      String path,
      Function<Stated, Optional<String>> part,
      Optional<Stated> old,
      Optional<Stated> fresh) {
    String x = old.flatMap(part).orElse("");
    String y = fresh.flatMap(part).orElse("");
    return x.equals(y) || old.isEmpty() || fresh.isEmpty()
        ? Optional.empty()
        : Optional.of(new Difference(path, Entry.of(x), Entry.of(y), Optional.empty()));
  }

  /** As many digits as it takes to tell the two apart. */
  private static int digits(Quantity x, Quantity y) {
    int digits = Entry.DIGITS;
    while (digits < MOST_DIGITS && x.format(digits).equals(y.format(digits))) {
      digits++;
    }
    return digits;
  }

  private static Optional<Quantity> relative(Quantity x, Quantity y) {
    if (x.isZero() || !x.dimension().equals(y.dimension())) {
      return Optional.empty();
    }
    double change = (y.si() - x.si()) / Math.abs(x.si());
    return Double.isFinite(change)
        ? Optional.of(Quantity.ofSi(change, Dimension.NONE).to("%"))
        : Optional.empty();
  }

  private static Optional<Quantity> kelvins(Optional<Stated> old, Optional<Stated> fresh) {
    return old.isPresent()
            && fresh.isPresent()
            && old.get().content() instanceof Stated.Content.Degrees x
            && fresh.get().content() instanceof Stated.Content.Degrees y
        ? Optional.of(y.temperature().minus(x.temperature()))
        : Optional.empty();
  }

  private static Optional<Quantity> amount(Stated stated) {
    return stated.content() instanceof Stated.Content.Amount amount
        ? Optional.of(amount.quantity())
        : Optional.empty();
  }

  private static Entry entry(Optional<Stated> stated) {
    return stated.map(s -> s.content().entry()).orElse(Entry.EMPTY);
  }
}
