package pinchoff.device;

import pinchoff.quantity.Dimension;
import pinchoff.quantity.Quantity;

/**
 * Capacitance of the source and drain junctions: C_J A/(1+V_R/P_B)^M_J + C_JSW P/(1+V_R/P_B)^M_JSW
 * for a reverse voltage V_R. The perimeter counts the edge at the gate too.
 *
 * @param area C_J at zero bias (F/m²), 0 or more
 * @param sidewall C_JSW at zero bias (F/m), 0 or more
 * @param builtIn P_B, above 0
 * @param areaGrading M_J, 0 to 1
 * @param sidewallGrading M_JSW, 0 to 1
 * @param diffusionLength length of a source or drain area away from the gate, above 0
 */
public record Junction(
    Quantity area,
    Quantity sidewall,
    Quantity builtIn,
    double areaGrading,
    double sidewallGrading,
    Quantity diffusionLength) {

  /** Checks dimensions and ranges. */
  public Junction {
    Check.notNegative("junction capacitance per area", area, Dimension.CAPACITANCE_PER_AREA);
    Check.notNegative("junction sidewall capacitance", sidewall, Dimension.CAPACITANCE_PER_LENGTH);
    Check.positive("junction built-in potential", builtIn, Dimension.VOLTAGE);
    Check.within("junction area grading", areaGrading, 0, 1);
    Check.within("junction sidewall grading", sidewallGrading, 0, 1);
    Check.positive("diffusion length", diffusionLength, Dimension.LENGTH);
  }
}
