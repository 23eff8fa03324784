package pinchoff.device;

/** Whether a device conducts without a gate voltage. */
public enum Mode {
  /** Off at V_GS = 0: V_TH of zero or more for n, of zero or less for p. */
  ENHANCEMENT,
  /** On at V_GS = 0: V_TH of zero or less for n, of zero or more for p. */
  DEPLETION
}
