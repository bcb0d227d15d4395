package rampwright.vehicle.balance;

/**
 * Slopes of the steady-state handling characteristic at one lateral acceleration.
 *
 * @param lateral lateral acceleration (m/s²)
 * @param steer road-wheel steer angle there (rad)
 * @param understeer understeer gradient (rad·s²/m), positive understeer
 * @param sideslip sideslip gradient (rad·s²/m)
 * @param wheelbase wheelbase of the car (m)
 */
public record HandlingGradients(
    double lateral, double steer, double understeer, double sideslip, double wheelbase) {
  /**
   * Returns the speed (m/s) at which an understeering car of this gradient needs twice the
   * kinematic steer angle, {@code sqrt(L/U)}; NaN for an oversteering one.
   */
  public double characteristicSpeed() {
    return understeer > 0 ? Math.sqrt(wheelbase / understeer) : Double.NaN;
  }

  /**
   * Returns the speed (m/s) from which an oversteering car of this gradient is unstable, {@code
   * sqrt(L/-U)}; NaN for an understeering one.
   */
  public double criticalSpeed() {
    return understeer < 0 ? Math.sqrt(-wheelbase / understeer) : Double.NaN;
  }
}
