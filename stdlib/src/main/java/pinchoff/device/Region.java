package pinchoff.device;

/** Where a transistor is biased. */
public enum Region {
  /** V_GS at or below V_TH: the square law says no current. */
  CUTOFF("cutoff"),
  /** V_DS below V_DS,sat: a resistor set by the gate. */
  TRIODE("triode"),
  /** V_DS at or above V_DS,sat: a current source. */
  SATURATION("saturation");

  private final String words;

  Region(String words) {
    this.words = words;
  }

  /** The region as it is shown: {@code "saturation"}. */
  public String words() {
    return words;
  }
}
