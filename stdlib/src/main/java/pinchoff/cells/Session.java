package pinchoff.cells;

import java.util.Optional;
import pinchoff.claims.Claim;
import pinchoff.claims.Premise;
import pinchoff.claims.Provenance;
import pinchoff.claims.Spec;
import pinchoff.derive.Derivation;
import pinchoff.display.Displayable;
import pinchoff.display.Host;
import pinchoff.display.MimeBundle;
import pinchoff.page.Page;
import pinchoff.page.Progress;
import pinchoff.quantity.Quantity;

/** What a cell can ask of the notebook that it runs in. All of it is preloaded in a session. */
public final class Session {

  private Session() {}

  /**
   * Shows a result at once, beside whatever value the cell ends with.
   *
   * @param result anything; a result of this library shows its tables and pictures
   */
  public static void show(Object result) {
    Host.current().publish(bundleOf(result));
  }

  /**
   * Shows a result in a named place: a second call with the same name replaces the first one's.
   *
   * @param place a name for the place, unique in the notebook
   * @param result anything
   */
  public static void showIn(String place, Object result) {
    Host host = Host.current();
    if (Places.isNew(host, place)) {
      host.publish(place, bundleOf(result));
    } else {
      host.update(place, bundleOf(result));
    }
  }

  /** Removes what this cell has shown so far, as soon as it shows something else. */
  public static void clearOutput() {
    Host.current().clear(true);
  }

  /**
   * Asks for a line of text.
   *
   * @throws IllegalStateException if nobody can be asked, for example in a run without a front end
   */
  public static String ask(String prompt) {
    return Host.current().ask(prompt, false);
  }

  /**
   * Asks for a line of text that is not shown while it is typed.
   *
   * @throws IllegalStateException if nobody can be asked
   */
  public static String askHidden(String prompt) {
    return Host.current().ask(prompt, true);
  }

  /**
   * Starts a derivation: formulas in trade notation, one to a line, worked out with units.
   *
   * <pre>
   * derive("""
   *     V_OV       = sqrt(2*I_REF/(k_n*W/L))    // square law, saturation
   *     R_B [kohm] = (V_DD - V_TH - V_OV)/I_REF
   *     V_OV &gt;= 100 mV                          // strong inversion
   *     """).using(op.as("1"))
   * </pre>
   *
   * @param text the formulas, see {@link Derivation}
   */
  public static Derivation derive(String text) {
    return Derivation.of(text);
  }

  /**
   * Names an input of the notebook, so that it can be set from outside when the notebook is run
   * again.
   *
   * @param name its name, which formulas can use
   * @param standard its usual value
   */
  public static Premise premise(String name, Quantity standard) {
    return Premise.of(name, standard);
  }

  /** Names a result that a rerun must reproduce. */
  public static Claim claim(String name, Quantity value) {
    return Claim.of(name, value);
  }

  /**
   * Names a result that has limits: {@code spec("I_D of M1", i).min(uA(18)).typ(uA(20))
   * .max(uA(22))}.
   */
  public static Spec spec(String name, Quantity value) {
    return Spec.of(name, value);
  }

  /** Shows several specs as one table. */
  public static Page specs(Spec... specs) {
    return Spec.table(specs);
  }

  /** What the results rest on: versions, technology files with their hashes, premises. */
  public static Provenance provenance() {
    return Provenance.current();
  }

  /**
   * Shows how far a long calculation is; to be used with {@code try} so that it ends with it.
   *
   * @param name what is calculated
   * @param steps number of steps, at least 1
   */
  public static Progress progress(String name, long steps) {
    return Progress.of(name, steps);
  }

  /**
   * Shows the signature and the meaning of a name in the front end's pager.
   *
   * @param name a name as it stands in a cell, for example {@code "V"} or {@code "Technology.read"}
   */
  public static void help(String name) {
    Host host = Host.current();
    Optional<MimeBundle> found = host.help(name);
    host.page(
        found.orElseGet(
            () -> MimeBundle.text("Nothing is known of \"" + name + "\" in this session.")));
  }

  private static MimeBundle bundleOf(Object result) {
    return result instanceof Displayable displayable
        ? displayable.display()
        : MimeBundle.text(String.valueOf(result));
  }
}
