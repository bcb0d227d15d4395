package rampwright.vehicle.trim;

/**
 * A differential in a trim.
 *
 * @param cageTorque torque into its case (N·m)
 * @param torqueDifference whole difference of the output torques (N·m), not negative: slower minus
 *     faster output while sliding, the size of the difference while sticking
 * @param speedDifference size of the difference of the output speeds (rad/s)
 * @param capacity largest friction torque difference at this cage torque (N·m); infinite for a
 *     spool
 * @param sticking whether the outputs turn together
 * @param wheelBrakeTorque torque with which the unit brakes the wheel (axle) that slips more (N·m)
 */
public record DifferentialState(
    double cageTorque,
    double torqueDifference,
    double speedDifference,
    double capacity,
    boolean sticking,
    double wheelBrakeTorque) {
  /** Returns the power turned into heat inside the unit (W): {@code D * dOmega / 2}. */
  public double slidingPower() {
    return torqueDifference * speedDifference / 2;
  }
}
