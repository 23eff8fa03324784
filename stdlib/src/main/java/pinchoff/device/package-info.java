/**
 * MOS transistors: what a process says of them, how they are sized and biased, and what flows.
 *
 * <p>A {@link pinchoff.device.Device} holds the {@link pinchoff.device.DeviceParameters} of a
 * process with its rules and ratings; {@link pinchoff.device.Device#sized sized} makes a {@link
 * pinchoff.device.Transistor}, and {@link pinchoff.device.Transistor#at at} biases it and gives an
 * {@link pinchoff.device.OperatingPoint}. The current comes from a {@link
 * pinchoff.device.ChannelModel}: equations on plain numbers in SI units with exact derivatives.
 *
 * <p><b>Signs.</b> For an n device V_GS, V_DS, V_SB and I_D are positive in normal operation; for a
 * p device V_SG, V_SD, V_BS and I_D are, and results are labelled with those symbols. Thresholds in
 * {@link pinchoff.device.DeviceParameters} are signed as V_GS is; the equations of a p device use
 * the reflected value. The terminal that acts as the source is the one with the lower potential (p:
 * the higher); where that is not the one named source, the result says so.
 *
 * <p><b>Why reflection.</b> Each set of equations is written once, for an n device with V_DS of
 * zero or more. A p device is the n device with all voltages and the current negated, so that the
 * two can never disagree.
 *
 * <p><b>Why there is no bare "K".</b> Texts disagree on whether it holds the factor one half. Here
 * k' is µ C_ox in A/V², and β = k' W/L; the factor one half stands in the equations.
 */
@NullMarked
package pinchoff.device;

import org.jspecify.annotations.NullMarked;
