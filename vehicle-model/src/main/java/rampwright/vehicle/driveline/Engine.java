package rampwright.vehicle.driveline;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Engine at full load and on overrun.
 *
 * @param fullLoad crankshaft torque with the throttle open (N·m), positive below the rev limit
 * @param overrun crankshaft torque with the throttle closed (N·m), not positive
 * @param revLimit highest engine speed (rad/s)
 */
public record Engine(TorqueCurve fullLoad, TorqueCurve overrun, double revLimit) {
  public static final Quantity REV_LIMIT =
      new Quantity("rev_limit_rpm", "rev limit", "rpm", Math.PI / 30, 500, 30000, "");

  /** Checks the rev limit and the signs of both curves. */
  public Engine {
    REV_LIMIT.check(revLimit);
    for (TorqueCurve.Point p : overrun.points()) {
      if (p.torque() > 0) {
        throw InvalidInput.value(
            "overrun torque", p.torque(), "N·m", "not above 0", "the sign was left out");
      }
    }
    for (TorqueCurve.Point p : fullLoad.points()) {
      if (p.speed() <= revLimit && p.torque() <= 0) {
        throw InvalidInput.value(
            "full-load torque", p.torque(), "N·m", "above 0 up to the rev limit", "");
      }
    }
  }
}
