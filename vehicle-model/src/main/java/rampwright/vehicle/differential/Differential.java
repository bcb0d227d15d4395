package rampwright.vehicle.differential;

/**
 * A differential's law as the trim sees it. The two outputs share the cage torque; friction and
 * viscous shear move the torque difference {@code D} (N·m, the whole difference) from the faster to
 * the slower output:
 *
 * <pre>
 *   D = viscousTorque(dOmega) + friction
 *   sticking: equal speeds, |friction| &lt;= capacity(cageTorque)
 *   sliding:  |friction| = capacity(cageTorque) * slidingFactor(dOmega)
 * </pre>
 *
 * {@code dOmega} is the speed of the left (front, for a centre unit) output minus the other's
 * (rad/s) and {@code D} then the torque of the right (rear) output minus the other's.
 *
 * <p>A unit may also brake the wheel (axle, for a centre unit) with more slip. That torque is lost,
 * not moved: the output must deliver it beyond what the wheel brings to the road.
 */
public sealed interface Differential
    permits OpenDifferential,
        Spool,
        PlateDifferential,
        RefinedPlateDifferential,
        ViscousDifferential,
        TorqueSensingDifferential,
        BrakeLock {
  /**
   * Returns the largest friction torque difference (N·m) at a cage torque; infinite for a spool.
   */
  double capacity(double cageTorque);

  /** Returns the derivative of the capacity with cage torque (-). */
  double capacitySlope(double cageTorque);

  /**
   * Returns friction while sliding over capacity (-) at an output speed difference (rad/s): 1 at
   * zero and positive.
   */
  default double slidingFactor(double speedDifference) {
    return 1;
  }

  /** Returns the derivative of the sliding factor with speed difference (s/rad). */
  default double slidingFactorSlope(double speedDifference) {
    return 0;
  }

  /** Returns the torque difference (N·m) of viscous shear at an output speed difference (rad/s). */
  default double viscousTorque(double speedDifference) {
    return 0;
  }

  /** Returns the derivative of the viscous torque (N·m·s/rad). */
  default double viscousSlope(double speedDifference) {
    return 0;
  }

  /**
   * Returns the brake torque (N·m, not negative) on the wheel with more slip.
   *
   * @param slip longitudinal slip of that wheel (-)
   * @param otherSlip longitudinal slip of the other wheel (-)
   */
  default double wheelBrakeTorque(double slip, double otherSlip) {
    return 0;
  }

  /** Returns the derivative of the wheel's brake torque with the slip of the braked wheel (N·m). */
  default double wheelBrakeBySlip(double slip, double otherSlip) {
    return 0;
  }

  /** Returns the derivative of the wheel's brake torque with the slip of the other wheel (N·m). */
  default double wheelBrakeByOtherSlip(double slip, double otherSlip) {
    return 0;
  }
}
