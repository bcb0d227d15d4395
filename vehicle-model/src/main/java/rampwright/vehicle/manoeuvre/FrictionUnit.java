package rampwright.vehicle.manoeuvre;

import rampwright.vehicle.differential.Differential;

/**
 * A differential in motion: its outputs stick together or slide, and which of the two holds until
 * an event says otherwise. A workspace.
 *
 * <p>Sticking takes the torque difference that keeps the output speeds equal; it ends when that
 * exceeds the capacity. Sliding ends when the speed difference comes back to zero.
 */
final class FrictionUnit {
  final Differential law;

  /** 0 sticking, 1 left (front) output faster, -1 the other. */
  private int direction;

  /** Torque of the right (rear) output minus the other's (N·m). */
  double difference;

  private double required;
  private double capacity;
  private double speedDifference;

  FrictionUnit(Differential law) {
    this.law = law;
  }

  /**
   * Evaluates the law in the present direction.
   *
   * @param cageTorque torque into the case (N·m)
   * @param speedDifference speed of the left (front) output minus the other's (rad/s)
   * @param required torque difference that would keep that difference of speeds (N·m)
   */
  void update(double cageTorque, double speedDifference, double required) {
    this.speedDifference = speedDifference;
    this.required = required;
    this.capacity = law.capacity(cageTorque);
    if (sticking()) {
      difference = required;
      return;
    }
    difference = law.viscousTorque(speedDifference);
    if (capacity > 0) {
      difference += direction * capacity * law.slidingFactor(speedDifference);
    }
  }

  boolean sticking() {
    return direction == 0;
  }

  /** Positive while the present direction holds; zero at the event that ends it. */
  double margin() {
    if (!sticking()) {
      return direction * speedDifference;
    }
    return capacity == Double.POSITIVE_INFINITY ? 1 : capacity - Math.abs(friction());
  }

  private double friction() {
    return required - law.viscousTorque(0);
  }

  /**
   * Decides the direction afresh from the speeds last seen, or at equal speeds from the torques.
   */
  void decide(double equalWithin) {
    if (Math.abs(speedDifference) > equalWithin) {
      direction = speedDifference > 0 ? 1 : -1;
    } else if (Math.abs(friction()) <= capacity) {
      direction = 0;
    } else {
      direction = friction() > 0 ? 1 : -1;
    }
  }

  /** Returns 1 when the left (front) output is the faster one while sliding, -1 for the other. */
  int direction() {
    return direction;
  }

  /** Whether the speeds last seen were equal. */
  boolean atEqualSpeeds(double equalWithin) {
    return Math.abs(speedDifference) <= equalWithin;
  }

  /** Starts to slide the way in which the torques push. */
  void breakAway() {
    direction = friction() > 0 ? 1 : -1;
  }
}
