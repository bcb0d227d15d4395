package rampwright.vehicle.manoeuvre;

/** What the driver does over time. Implementations are pure functions. */
public interface Controls {
  /** Returns the road-wheel steer angle of the front wheels (rad). */
  double steer(double time);

  /**
   * Returns the torque into the case of the (centre) differential (N·m).
   *
   * @param time time (s)
   * @param cageSpeed speed of that case (rad/s)
   */
  double cageTorque(double time, double cageSpeed);

  /** Returns the service brake torque of all wheels together (N·m), not negative. */
  double brakeTorque(double time);

  /** Returns steady controls. */
  static Controls steady(double steer, double cageTorque, double brakeTorque) {
    return new Controls() {
      @Override
      public double steer(double time) {
        return steer;
      }

      @Override
      public double cageTorque(double time, double cageSpeed) {
        return cageTorque;
      }

      @Override
      public double brakeTorque(double time) {
        return brakeTorque;
      }
    };
  }
}
