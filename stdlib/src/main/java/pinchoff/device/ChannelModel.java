package pinchoff.device;

import java.util.Optional;

/**
 * Equations of the drain current: a pure function of terminal voltages and of a {@link Channel},
 * which holds geometry, temperature and parameters as plain numbers in SI units.
 *
 * <p>Models are antisymmetric in drain and source. A p device is the reflected n device. The result
 * is written to the caller's array; nothing is allocated.
 */
public interface ChannelModel {

  /** Index of the current into the drain terminal (A): negative for a conducting p device. */
  int CURRENT = 0;

  /** Index of ∂I/∂V_G (S). */
  int BY_GATE = 1;

  /** Index of ∂I/∂V_D (S). */
  int BY_DRAIN = 2;

  /** Index of ∂I/∂V_S (S). */
  int BY_SOURCE = 3;

  /** Index of ∂I/∂V_B (S). */
  int BY_BODY = 4;

  /** Length of the array of results. */
  int SIZE = 5;

  /** What the model is called, for example "square law". */
  String name();

  /**
   * The current and its exact partial derivatives for voltages against any common node. At an edge
   * where a derivative jumps, it is the one of the saturation side.
   *
   * <p>Where 2φ_F + V_SB is zero or less, the body effect is continued by a straight line, so that
   * a solver may pass through; {@link Transistor#at} refuses such a bias.
   *
   * @param result at least {@value #SIZE} long; see the index constants
   */
  void evaluate(
      Channel channel, double gate, double drain, double source, double body, double[] result);

  /**
   * The drain saturation voltage, in the reflected voltages of the n equations (volts, zero or
   * more).
   *
   * @param vgs from gate to acting source
   * @param vsb from acting source to body
   */
  double saturationVoltage(Channel channel, double vgs, double vsb);

  /** How this model defines its drain saturation voltage, for example "V_DS,sat = V_OV". */
  String saturationDefinition();

  /** True if current flows below the threshold too, so that there is no cutoff. */
  boolean conductsBelowThreshold();

  /** True if the current has no jump anywhere, so that a circuit can be solved with it. */
  boolean isContinuous();

  /** What the parameters of a transistor lack for this model, if anything. */
  Optional<String> lacking(Transistor transistor);
}
