package rampwright.vehicle.tyre;

import rampwright.vehicle.input.Quantity;

/**
 * Where a tyre peaks at one vertical load, as a tyre report gives it.
 *
 * @param load vertical load (N)
 * @param frictionX peak longitudinal force over load (-)
 * @param frictionY peak lateral force over load (-)
 * @param slip longitudinal slip at the peak of the pure longitudinal force (-)
 * @param slipAngle slip angle at the peak of the pure lateral force (rad)
 */
public record PeakAtLoad(
    double load, double frictionX, double frictionY, double slip, double slipAngle) {
  public static final Quantity LOAD =
      Quantity.si("load_n", "tyre load", "N", 1, 1e6, "the value is in kN");
  public static final Quantity FRICTION_X =
      Quantity.si("peak_friction_x", "peak longitudinal friction", "", 0.05, 5, "");
  public static final Quantity FRICTION_Y =
      Quantity.si("peak_friction_y", "peak lateral friction", "", 0.05, 5, "");
  public static final Quantity SLIP =
      Quantity.si("slip_at_peak", "slip at peak", "", 0.02, 0.6, "it was given in percent");
  public static final Quantity SLIP_ANGLE =
      Quantity.degrees(
          "slip_angle_at_peak_deg", "slip angle at peak", 1.2, 40, "it was given in radians");

  /** Checks every value. */
  public PeakAtLoad {
    LOAD.check(load);
    FRICTION_X.check(frictionX);
    FRICTION_Y.check(frictionY);
    SLIP.check(slip);
    SLIP_ANGLE.check(slipAngle);
  }
}
