package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Bevel side gear of a plate-type unit. The mesh with the cross gears pushes it outwards against
 * its pack:
 *
 * <pre>
 *   F = T/(2 r) tan(phi_n) sin(delta)      adds  k = N mu (r_m/r) tan(phi_n) sin(delta)
 * </pre>
 *
 * on power and on overrun alike. Source: axial force of a straight bevel gear, for example Shigley,
 * <i>Mechanical Engineering Design</i>, bevel gear force analysis, with half the cage torque on
 * each side.
 *
 * @param meanRadius mean pitch radius (m)
 * @param pressureAngle {@code phi_n} (rad)
 * @param coneAngle {@code delta}: pitch cone angle of the side gear (rad)
 */
public record SideGear(double meanRadius, double pressureAngle, double coneAngle) {
  public static final Quantity MEAN_RADIUS =
      new Quantity("side_gear_radius_mm", "side gear mean radius", "mm", 1e-3, 5, 500, "");
  public static final Quantity PRESSURE_ANGLE =
      Quantity.degrees("side_gear_pressure_angle_deg", "side gear pressure angle", 0, 40, "");
  public static final Quantity CONE_ANGLE =
      Quantity.degrees("side_gear_cone_angle_deg", "side gear pitch cone angle", 0, 89, "");

  /** Checks every value. */
  public SideGear {
    MEAN_RADIUS.check(meanRadius);
    PRESSURE_ANGLE.check(pressureAngle);
    CONE_ANGLE.check(coneAngle);
  }

  /** Returns the locking share that the thrust adds to a unit (-). */
  public double share(PlateHardware hardware, int facesPerSide) {
    return facesPerSide
        * hardware.plateFriction()
        * hardware.effectiveRadius()
        / meanRadius
        * Math.tan(pressureAngle)
        * Math.sin(coneAngle);
  }
}
