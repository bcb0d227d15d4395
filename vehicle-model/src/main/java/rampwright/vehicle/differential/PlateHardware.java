package rampwright.vehicle.differential;

import java.util.Locale;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * What does not change from build to build of one plate-type unit.
 *
 * @param plateOuterRadius outer radius of the friction faces (m)
 * @param plateInnerRadius inner radius of the friction faces (m)
 * @param plateFriction friction coefficient between plates (-)
 * @param rampRadius radius at which the cross pins meet the ramps (m)
 * @param rampFriction friction coefficient between pin and ramp (-)
 * @param pressure which pressure distribution gives the effective radius
 */
public record PlateHardware(
    double plateOuterRadius,
    double plateInnerRadius,
    double plateFriction,
    double rampRadius,
    double rampFriction,
    FacePressure pressure) {
  public static final Quantity OUTER_RADIUS =
      new Quantity("plate_outer_radius_mm", "plate outer radius", "mm", 1e-3, 5, 500, "");
  public static final Quantity INNER_RADIUS =
      new Quantity("plate_inner_radius_mm", "plate inner radius", "mm", 1e-3, 1, 500, "");
  public static final Quantity PLATE_FRICTION =
      Quantity.si("plate_friction", "plate friction coefficient", "", 0.01, 1, "");
  public static final Quantity RAMP_RADIUS =
      new Quantity("ramp_radius_mm", "ramp radius", "mm", 1e-3, 5, 500, "");
  public static final Quantity RAMP_FRICTION =
      Quantity.si("ramp_friction", "ramp friction coefficient", "", 0, 0.5, "");

  /** Checks every value and that the plates are rings. */
  public PlateHardware {
    OUTER_RADIUS.check(plateOuterRadius);
    INNER_RADIUS.check(plateInnerRadius);
    PLATE_FRICTION.check(plateFriction);
    RAMP_RADIUS.check(rampRadius);
    RAMP_FRICTION.check(rampFriction);
    if (pressure == null) {
      throw InvalidInput.of("face pressure", "missing", "uniform_wear or uniform_pressure", "");
    }
    if (plateInnerRadius >= plateOuterRadius) {
      throw InvalidInput.value(
          INNER_RADIUS.label(),
          plateInnerRadius * 1e3,
          "mm",
          String.format(
              Locale.ROOT, "less than the outer radius of %.1f mm", plateOuterRadius * 1e3),
          "the two were swapped");
    }
  }

  /** Returns the effective radius of a friction face (m). */
  public double effectiveRadius() {
    return pressure.effectiveRadius(plateOuterRadius, plateInnerRadius);
  }

  /** Returns the area of one friction face (m²). */
  public double faceArea() {
    return Math.PI * (plateOuterRadius * plateOuterRadius - plateInnerRadius * plateInnerRadius);
  }
}
