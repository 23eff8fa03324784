package pinchoff.claims;

import java.util.Optional;
import pinchoff.display.Displayable;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.page.Table;
import pinchoff.page.Value;
import pinchoff.quantity.Quantity;
import pinchoff.quantity.Tolerance;

/**
 * A named result that a rerun must reproduce.
 *
 * @param name tells it from the other claims of a notebook
 * @param value what it is worth
 * @param tolerance how far a rerun may differ; the reviewer's default if empty
 */
public record Claim(String name, Quantity value, Optional<Tolerance> tolerance)
    implements Displayable {

  /** Checks the name. */
  public Claim {
    Names.checked("claim", name);
  }

  /** A claim with the reviewer's default tolerance. */
  public static Claim of(String name, Quantity value) {
    return new Claim(name, value, Optional.empty());
  }

  /**
   * The same claim with a tolerance.
   *
   * @param plusMinus in the unit of the value, or relative, for example {@code percent(1)}
   * @throws ClaimException if it is negative or of another dimension
   */
  public Claim within(Quantity plusMinus) {
    boolean relative = plusMinus.dimension().isNone() && !value.dimension().isNone();
    if (plusMinus.si() < 0 || !(relative || plusMinus.dimension().equals(value.dimension()))) {
      throw new ClaimException(
          "claim %s = %s within %s: expected 0 or more, in percent or %s"
              .formatted(name, value, plusMinus, value.dimension().description()));
    }
    Tolerance within =
        relative
            ? Tolerance.relative(plusMinus.si(), value.dimension())
            : Tolerance.absolute(plusMinus);
    return new Claim(name, value, Optional.of(within));
  }

  /** The claim with its value. */
  public Page page() {
    Value entry = Value.claim("claim " + name, name, value);
    return Page.untitled()
        .table(
            Table.sheet()
                .line(
                    "Claim: " + name,
                    value,
                    tolerance.map(t -> "reproduced within " + t).orElse("")))
        .value(tolerance.map(entry::within).orElse(entry))
        .build();
  }

  @Override
  public MimeBundle display() {
    return page().display();
  }
}
