package pinchoff.formula;

/** An operator between two operands. */
public enum Operator {
  /** Sum. */
  PLUS("+", 1),
  /** Difference. */
  MINUS("-", 1),
  /** Product. */
  TIMES("*", 2),
  /** Quotient. */
  OVER("/", 2),
  /** Power; the exponent is a plain number unless the base is one too. */
  POWER("^", 4);

  private final String sign;
  private final int rank;

  Operator(String sign, int rank) {
    this.sign = sign;
    this.rank = rank;
  }

  /** How it is written. */
  public String sign() {
    return sign;
  }

  /** Binds the tighter, the higher. */
  int rank() {
    return rank;
  }
}
