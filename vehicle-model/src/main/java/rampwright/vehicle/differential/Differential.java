package rampwright.vehicle.differential;

/**
 * A differential's law as the trim sees it. The two outputs share the cage torque; friction and
 * viscous shear move the torque difference {@code D} (N·m, the whole difference) from the faster to
 * the slower output:
 *
 * <pre>
 *   D = viscousTorque(dOmega) + friction,   |friction| &lt;= capacity(cageTorque),
 *   equal speeds while |friction| is below the capacity
 * </pre>
 *
 * {@code dOmega} is the speed of the left (front, for a centre unit) output minus the other's
 * (rad/s) and {@code D} then the torque of the right (rear) output minus the other's.
 */
public sealed interface Differential permits OpenDifferential, Spool, PlateDifferential {
  /**
   * Returns the largest friction torque difference (N·m) at a cage torque; infinite for a spool.
   */
  double capacity(double cageTorque);

  /** Returns the derivative of the capacity with cage torque (-). */
  double capacitySlope(double cageTorque);

  /** Returns the torque difference (N·m) of viscous shear at an output speed difference (rad/s). */
  default double viscousTorque(double speedDifference) {
    return 0;
  }

  /** Returns the derivative of the viscous torque (N·m·s/rad). */
  default double viscousSlope(double speedDifference) {
    return 0;
  }
}
