package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * A quantity that says what it is: {@code vgs(mV(650))}. The factories are preloaded in a session.
 *
 * @param kind what it is
 * @param value its value
 */
public record Known(Kind kind, Quantity value) {

  /** What a known quantity is. */
  public enum Kind {
    /** V_GS of an n device. */
    VGS("vgs"),
    /** V_DS of an n device. */
    VDS("vds"),
    /** V_SB of an n device. */
    VSB("vsb"),
    /** V_SG of a p device. */
    VSG("vsg"),
    /** V_SD of a p device. */
    VSD("vsd"),
    /** V_BS of a p device. */
    VBS("vbs"),
    /** Node voltage of the gate. */
    GATE("gate"),
    /** Node voltage of the drain. */
    DRAIN("drain"),
    /** Node voltage of the source. */
    SOURCE("source"),
    /** Node voltage of the body. */
    BODY("body");

    private final String word;

    Kind(String word) {
      this.word = word;
    }

    /** The name of the factory. */
    public String word() {
      return word;
    }
  }

  /** Checks the dimension. */
  public Known {
    value.requireDimension(kind.word(), Dimension.VOLTAGE);
  }

  /** Gate to source of an n device. */
  public static Known vgs(Quantity value) {
    return new Known(Kind.VGS, value);
  }

  /** Drain to source of an n device. */
  public static Known vds(Quantity value) {
    return new Known(Kind.VDS, value);
  }

  /** Source to body of an n device: positive in reverse bias. */
  public static Known vsb(Quantity value) {
    return new Known(Kind.VSB, value);
  }

  /** Source to gate of a p device: positive when it conducts. */
  public static Known vsg(Quantity value) {
    return new Known(Kind.VSG, value);
  }

  /** Source to drain of a p device: positive in normal operation. */
  public static Known vsd(Quantity value) {
    return new Known(Kind.VSD, value);
  }

  /** Body to source of a p device: positive in reverse bias. */
  public static Known vbs(Quantity value) {
    return new Known(Kind.VBS, value);
  }

  /** Voltage of the gate node. */
  public static Known gate(Quantity value) {
    return new Known(Kind.GATE, value);
  }

  /** Voltage of the drain node. */
  public static Known drain(Quantity value) {
    return new Known(Kind.DRAIN, value);
  }

  /** Voltage of the source node. */
  public static Known source(Quantity value) {
    return new Known(Kind.SOURCE, value);
  }

  /** Voltage of the body node. */
  public static Known body(Quantity value) {
    return new Known(Kind.BODY, value);
  }

  @Override
  public String toString() {
    return kind.word() + "(" + value + ")";
  }
}
