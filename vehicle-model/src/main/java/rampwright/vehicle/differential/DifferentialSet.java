package rampwright.vehicle.differential;

/**
 * The differentials of a car by position. Positions that the layout does not use are ideal open
 * units and carry no torque.
 *
 * @param front front axle
 * @param centre between the axles
 * @param rear rear axle
 */
public record DifferentialSet(Differential front, Differential centre, Differential rear) {
  /** Returns the set of a rear-wheel-drive car. */
  public static DifferentialSet rear(Differential rear) {
    return new DifferentialSet(OpenDifferential.IDEAL, OpenDifferential.IDEAL, rear);
  }
}
