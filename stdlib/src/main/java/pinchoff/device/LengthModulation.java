package pinchoff.device;

/** Where channel-length modulation multiplies the current: the three published forms. */
public enum LengthModulation {
  /** 1 + λ V_DS in triode and saturation: current and slope are continuous. */
  BOTH("in both regions"),
  /** 1 + λ V_DS in saturation alone: the current jumps at the edge. */
  SATURATION_ONLY("in saturation alone"),
  /** 1 + λ (V_DS − V_DS,sat) in saturation alone: the current is continuous, its slope jumps. */
  OFFSET("from the edge of saturation");

  private final String words;

  LengthModulation(String words) {
    this.words = words;
  }

  String words() {
    return words;
  }
}
