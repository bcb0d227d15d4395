package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Worm mesh of a torque-sensing unit: each side gear is a worm, and the element gears that mesh
 * with it are tied to those of the other side. When the outputs turn at different speeds one worm
 * drives its element gear and the other is driven by it, with the same force along the worm's axis:
 *
 * <pre>
 *   worm drives   T = F r tan(lambda + phi)       worm is driven   T = F r tan(lambda - phi)
 *   phi = atan(f / cos(phi_n))                    TBR = tan(lambda + phi)/tan(lambda - phi)
 * </pre>
 *
 * With {@code lambda <= phi} the element gear cannot drive the worm at all and the unit locks.
 * Friction of thrust faces, which a maker uses to raise the ratio further, is left out.
 *
 * <p>Source: statics of the mesh as in Carvill, <i>Mechanical Engineer's Data Handbook</i>, p. 99,
 * and Shigley, <i>Mechanical Engineering Design</i>, worm gear efficiency; the bias ratio is our
 * derivation from it ({@code TBR} is one over the product of both efficiencies).
 *
 * @param leadAngle {@code lambda}: between thread and plane of rotation (rad)
 * @param pressureAngle {@code phi_n}: normal pressure angle (rad)
 * @param friction {@code f}: friction coefficient of the mesh (-)
 */
public record WormGear(double leadAngle, double pressureAngle, double friction) {
  public static final Quantity LEAD_ANGLE =
      Quantity.degrees(
          "lead_angle_deg",
          "worm lead angle",
          0.5,
          80,
          "the angle was measured from the axis: use 90 minus it");
  public static final Quantity PRESSURE_ANGLE =
      Quantity.degrees("pressure_angle_deg", "normal pressure angle", 0, 40, "");
  public static final Quantity FRICTION =
      Quantity.si("gear_friction", "friction coefficient of the gears", "", 0, 0.5, "");

  /** Checks every value. */
  public WormGear {
    LEAD_ANGLE.check(leadAngle);
    PRESSURE_ANGLE.check(pressureAngle);
    FRICTION.check(friction);
  }

  /** Returns the friction angle {@code phi} (rad). */
  public double frictionAngle() {
    return Math.atan(friction / Math.cos(pressureAngle));
  }

  /** Returns the efficiency when the worm drives (-). */
  public double efficiency() {
    return Math.tan(leadAngle) / Math.tan(leadAngle + frictionAngle());
  }

  /** Returns the efficiency when the worm is driven (-); not positive when it cannot be. */
  public double backDriveEfficiency() {
    return Math.tan(leadAngle - frictionAngle()) / Math.tan(leadAngle);
  }

  /** Returns whether the gear cannot drive the worm. */
  public boolean selfLocking() {
    return leadAngle <= frictionAngle() + 1e-12;
  }

  /** Returns the torque bias ratio (-); infinite when the gear cannot drive the worm. */
  public double biasRatio() {
    return selfLocking() ? Double.POSITIVE_INFINITY : 1 / (efficiency() * backDriveEfficiency());
  }

  /**
   * Returns the law of a unit with this mesh on both sides; locked when the gear cannot drive the
   * worm.
   *
   * @param preload whole torque difference at zero cage torque (N·m)
   */
  public Differential law(double preload) {
    double bias = biasRatio();
    return selfLocking() ? new Spool() : new TorqueSensingDifferential(preload, bias, bias);
  }
}
