package pinchoff.page;

import java.util.Map;

/** The Greek letters of the trade by the names that are typed for them. */
final class Greek {
  /** Letter by name; each name is a LaTeX command too, which the capitals like Latin ones lack. */
  static final Map<String, Character> LETTERS =
      Map.ofEntries(
          Map.entry("alpha", 'α'),
          Map.entry("beta", 'β'),
          Map.entry("gamma", 'γ'),
          Map.entry("delta", 'δ'),
          Map.entry("epsilon", 'ε'),
          Map.entry("zeta", 'ζ'),
          Map.entry("eta", 'η'),
          Map.entry("theta", 'θ'),
          Map.entry("kappa", 'κ'),
          Map.entry("lambda", 'λ'),
          Map.entry("mu", 'μ'),
          Map.entry("nu", 'ν'),
          Map.entry("xi", 'ξ'),
          Map.entry("pi", 'π'),
          Map.entry("rho", 'ρ'),
          Map.entry("sigma", 'σ'),
          Map.entry("tau", 'τ'),
          Map.entry("phi", 'φ'),
          Map.entry("chi", 'χ'),
          Map.entry("psi", 'ψ'),
          Map.entry("omega", 'ω'),
          Map.entry("Gamma", 'Γ'),
          Map.entry("Delta", 'Δ'),
          Map.entry("Theta", 'Θ'),
          Map.entry("Lambda", 'Λ'),
          Map.entry("Sigma", 'Σ'),
          Map.entry("Phi", 'Φ'),
          Map.entry("Psi", 'Ψ'),
          Map.entry("Omega", 'Ω'));

  private Greek() {}

  /** The letter with this name, or the word itself. */
  static String letter(String word) {
    Character letter = LETTERS.get(word);
    return letter == null ? word : letter.toString();
  }
}
