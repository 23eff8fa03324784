package pinchoff.page;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The name of a quantity in trade notation, for example <i>V</i><sub>DS,sat</sub>.
 *
 * <p>The notation is what one would type: {@code V_DS,sat}, {@code V_TH0}, {@code 2φ_F}, {@code
 * g_m/I_D}, {@code k'_n}, {@code √I_D}. Greek letters may be written as words ({@code lambda},
 * {@code 2phi_F}), a second underscore in a subscript stands for a comma ({@code V_DS_sat}), and
 * digits after a single letter are its subscript ({@code W1}). Text that is no such notation is a
 * symbol too: it is shown upright, as it is.
 */
public final class Symbol {

  /**
   * One letter with what hangs on it.
   *
   * @param lead what stands before it, upright: a coefficient, a slash, a root sign, or nothing
   * @param base the letter or word
   * @param primed whether it bears a prime
   * @param subscript the subscript, or empty text
   */
  public record Atom(String lead, String base, boolean primed, String subscript) {

    /** True if the subscript is written without an underscore, as in {@code W1}. */
    boolean joined() {
      return !subscript.isEmpty() && subscript.chars().allMatch(c -> c >= '0' && c <= '9');
    }

    /** True for a single letter, which is set in italics; words are upright. */
    public boolean italic() {
      return base.codePointCount(0, base.length()) == 1 && Character.isLetter(base.codePointAt(0));
    }
  }

  private static final Pattern ATOM =
      Pattern.compile(
          "(?<lead>[/·]?\\d{0,6}√?)(?<base>\\p{L}{1,40})(?<prime>['′]?)"
              + "(?<subscript>(?<=(?<!\\p{L})\\p{L})\\d{1,9}|_[\\p{L}\\p{N}][\\p{L}\\p{N},_+−-]{0,60})?");

  private final String text;
  private final List<Atom> atoms;

  private Symbol(String text, List<Atom> atoms) {
    this.text = text;
    this.atoms = List.copyOf(atoms);
  }

  /**
   * Reads trade notation.
   *
   * @param notation the symbol as one would type it
   * @throws IllegalArgumentException if it is blank
   */
  public static Symbol of(String notation) {
    String trimmed = notation.strip();
    if (trimmed.isEmpty()) {
      throw new IllegalArgumentException("a symbol needs at least one letter, found none");
    }
    List<Atom> atoms = new ArrayList<>();
    StringBuilder text = new StringBuilder();
    Matcher matcher = ATOM.matcher(trimmed);
    while (matcher.lookingAt()) {
      atoms.add(atom(matcher));
      text.append(spelled(matcher));
      matcher.region(matcher.end(), trimmed.length());
    }
    boolean understood = matcher.regionStart() == trimmed.length() && separated(atoms);
    return understood
        ? new Symbol(text.toString(), atoms)
        : new Symbol(trimmed, List.of(new Atom("", trimmed, false, "")));
  }

  private static Atom atom(Matcher m) {
    String subscript = subscript(m).replace('_', ',');
    return new Atom(
        m.group("lead"),
        base(m),
        !m.group("prime").isEmpty(),
        subscript.startsWith(",") ? subscript.substring(1) : subscript);
  }

  private static String spelled(Matcher m) {
    return m.group("lead") + base(m) + (m.group("prime").isEmpty() ? "" : "′") + subscript(m);
  }

  private static String base(Matcher m) {
    return Greek.letter(m.group("base"));
  }

  private static String subscript(Matcher m) {
    String subscript = m.group("subscript");
    return subscript == null ? "" : subscript;
  }

  /** Letters may follow each other only after a slash or a dot: otherwise it was a plain word. */
  private static boolean separated(List<Atom> atoms) {
    return atoms.stream()
        .skip(1)
        .allMatch(a -> a.lead().startsWith("/") || a.lead().startsWith("·"));
  }

  /** The symbol as plain text: {@code V_DS,sat}, {@code λ}, {@code g_m/I_D}. */
  public String text() {
    return text;
  }

  /** The letters it is made of, for those who draw or set it. */
  public List<Atom> atoms() {
    return atoms;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Symbol s && text.equals(s.text);
  }

  @Override
  public int hashCode() {
    return text.hashCode();
  }

  @Override
  public String toString() {
    return text;
  }
}
