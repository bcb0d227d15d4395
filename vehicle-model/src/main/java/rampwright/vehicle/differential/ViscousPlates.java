package rampwright.vehicle.differential;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Plate stack of a viscous unit and the law that follows from it. A Newtonian oil in {@code n} gaps
 * of width {@code h} between plates that turn at {@code dw} against each other gives
 *
 * <pre>
 *   T = n pi eta dw (ro^4 - ri^4)/(2 h)
 * </pre>
 *
 * (for one full disc: Cengel and Cimbala, <i>Fluid Mechanics</i>, problem on an oil-film clutch).
 * Thinning is judged at the mean radius. Slots, holes and air in real stacks lower the torque, by
 * an amount that only a test tells.
 *
 * @param outerRadius outer radius of the sheared faces (m)
 * @param innerRadius inner radius of the sheared faces (m), 0 for full discs
 * @param gapWidth oil film between two plates (m)
 * @param gaps number of oil films; on each side when the outputs are sheared against the case
 * @param arrangement which parts the plates join
 */
public record ViscousPlates(
    double outerRadius, double innerRadius, double gapWidth, int gaps, Arrangement arrangement) {
  public static final Quantity OUTER_RADIUS =
      new Quantity("plate_outer_radius_mm", "plate outer radius", "mm", 1e-3, 5, 500, "");
  public static final Quantity INNER_RADIUS =
      new Quantity("plate_inner_radius_mm", "plate inner radius", "mm", 1e-3, 0, 500, "");
  public static final Quantity GAP_WIDTH =
      new Quantity("gap_mm", "gap between plates", "mm", 1e-3, 0.01, 10, "");
  public static final Quantity GAPS = Quantity.si("gaps", "number of gaps", "", 1, 500, "");

  /** Which parts the plates join. */
  public enum Arrangement {
    /** One stack from output to output: shears at the whole speed difference. */
    OUTPUT_TO_OUTPUT,
    /** A stack on each side from output to case: shears at half the speed difference. */
    OUTPUTS_TO_CASE
  }

  /** Checks every value. */
  public ViscousPlates {
    OUTER_RADIUS.check(outerRadius);
    INNER_RADIUS.check(innerRadius);
    GAP_WIDTH.check(gapWidth);
    GAPS.check(gaps);
    if (arrangement == null) {
      throw InvalidInput.of("arrangement", "missing", "output_to_output or outputs_to_case", "");
    }
    if (innerRadius >= outerRadius) {
      throw InvalidInput.value(
          INNER_RADIUS.label(),
          innerRadius * 1e3,
          "mm",
          "less than the outer radius of " + outerRadius * 1e3 + " mm",
          "the two were swapped");
    }
  }

  /** Returns the torque (N·m) of the stack per speed at which it shears (N·m·s/rad). */
  public double shearCoefficient(double viscosity) {
    double fourth = Math.pow(outerRadius, 4) - Math.pow(innerRadius, 4);
    return gaps * Math.PI * viscosity * fourth / (2 * gapWidth);
  }

  /**
   * Returns the law of the whole torque difference: twice the torque between the outputs, and with
   * stacks against the case twice what half the speed difference shears.
   *
   * @param oil the oil
   * @param temperature its temperature (°C)
   */
  public ViscousDifferential law(SiliconeOil oil, double temperature) {
    double stack = shearCoefficient(oil.viscosity(temperature));
    double meanRadius = (outerRadius + innerRadius) / 2;
    double thinning = oil.thinningRate() * gapWidth / meanRadius;
    boolean toCase = arrangement == Arrangement.OUTPUTS_TO_CASE;
    return new ViscousDifferential(
        toCase ? stack : 2 * stack, toCase ? 2 * thinning : thinning, oil.thinningExponent());
  }
}
