package rampwright.vehicle.chassis;

import rampwright.vehicle.input.Quantity;

/**
 * Service brakes with equal torque left and right on an axle.
 *
 * @param frontShare front axle's share of the total brake torque (-)
 * @param maxTorque largest total brake torque of all four wheels (N·m)
 */
public record Brakes(double frontShare, double maxTorque) {
  public static final Quantity FRONT_SHARE =
      Quantity.si(
          "brake_front_share", "front share of brake torque", "", 0, 1, "it was given in percent");
  public static final Quantity MAX_TORQUE =
      Quantity.si("brake_max_torque_nm", "largest total brake torque", "N·m", 0, 1e6, "");

  /** Checks every value. */
  public Brakes {
    FRONT_SHARE.check(frontShare);
    MAX_TORQUE.check(maxTorque);
  }
}
