package rampwright.vehicle.tyre;

/**
 * A steady-state tyre: vertical load, longitudinal slip and slip angle to forces, with closed-form
 * partial derivatives. Implementations are immutable and safe to share between threads.
 */
public interface Tyre {
  /**
   * Evaluates the tyre.
   *
   * @param load vertical load (N), not negative
   * @param slip longitudinal slip {@code (omega*R - vx)/vx} (-)
   * @param slipAngle slip angle {@code atan(vy/vx)} (rad)
   * @param grip factor on the friction of the road, 1 for the reference surface
   * @param out receives forces (N) and partials
   */
  void evaluate(double load, double slip, double slipAngle, double grip, TyreForces out);

  /** Returns the longitudinal slip at which the pure longitudinal force peaks at this load (-). */
  double slipAtPeak(double load);

  /** Returns the slip angle at which the pure lateral force peaks at this load (rad, positive). */
  double slipAngleAtPeak(double load);
}
