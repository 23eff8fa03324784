package pinchoff.device;

/** Which carriers conduct. */
public enum Polarity {
  /** Electrons: V_GS, V_DS, V_SB and I_D are positive in normal operation. */
  N("n", 1),
  /** Holes: V_SG, V_SD, V_BS and I_D are positive in normal operation. */
  P("p", -1);

  private final String letter;
  private final int sign;

  Polarity(String letter, int sign) {
    this.letter = letter;
    this.sign = sign;
  }

  /** The small letter: {@code "n"}. */
  public String letter() {
    return letter;
  }

  /** +1 for n, −1 for p: what turns a voltage of this device into one of the n equations. */
  public int sign() {
    return sign;
  }
}
