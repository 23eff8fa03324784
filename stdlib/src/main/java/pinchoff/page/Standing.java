package pinchoff.page;

/** How a check came out. Shown as a sign and a word, so that colour is never needed to read it. */
public enum Standing {
  /** What was required is so. */
  HOLDS("✓", "holds"),
  /** On the boundary, within the tolerance of the check. */
  EDGE("≈", "on the edge"),
  /** What was required is not so. */
  FAILS("✗", "fails"),
  /** It could not be decided. */
  UNKNOWN("?", "unknown");

  private final String sign;
  private final String word;

  Standing(String sign, String word) {
    this.sign = sign;
    this.word = word;
  }

  /** One character that tells the standings apart without colour. */
  public String sign() {
    return sign;
  }

  /** The standing in words. */
  public String word() {
    return word;
  }
}
