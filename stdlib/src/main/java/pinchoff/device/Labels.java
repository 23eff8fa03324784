package pinchoff.device;

/**
 * The names of voltages as they are positive in normal operation.
 *
 * @param gateSource V_GS, or V_SG for p
 * @param drainSource V_DS, or V_SD for p
 * @param sourceBody V_SB, or V_BS for p
 * @param threshold V_TH, or |V_TH| for p
 * @param saturation V_DS,sat, or V_SD,sat for p
 * @param signs the sign convention in words
 */
record Labels(
    String gateSource,
    String drainSource,
    String sourceBody,
    String threshold,
    String saturation,
    String signs) {

  private static final Labels OF_N =
      new Labels(
          "V_GS",
          "V_DS",
          "V_SB",
          "V_TH",
          "V_DS,sat",
          "n device: V_GS, V_DS, V_SB and I_D (into the drain) are positive in normal operation.");

  private static final Labels OF_P =
      new Labels(
          "V_SG",
          "V_SD",
          "V_BS",
          "−V_TH",
          "V_SD,sat",
          "p device: V_SG, V_SD, V_BS and I_D (out of the drain) are positive in normal operation.");

  /** What V_OV is the difference of. */
  String overdrive() {
    return gateSource + " − " + (threshold.startsWith("−") ? "(" + threshold + ")" : threshold);
  }

  static Labels of(Polarity polarity) {
    return polarity == Polarity.N ? OF_N : OF_P;
  }
}
