package rampwright.vehicle.tyre;

/**
 * Result slot of a tyre evaluation: forces in the wheel's own axes (N) and their partial
 * derivatives. Mutable on purpose: the trim solver evaluates millions of tyres and reuses one slot
 * per wheel.
 */
public final class TyreForces {
  /** Longitudinal force (N), positive forward. */
  public double fx;

  /** Lateral force (N), positive to the left. */
  public double fy;

  /** Partial of {@link #fx} with longitudinal slip (N). */
  public double fxSlip;

  /** Partial of {@link #fx} with slip angle (N/rad). */
  public double fxAngle;

  /** Partial of {@link #fx} with vertical load (-). */
  public double fxLoad;

  /** Partial of {@link #fy} with longitudinal slip (N). */
  public double fySlip;

  /** Partial of {@link #fy} with slip angle (N/rad). */
  public double fyAngle;

  /** Partial of {@link #fy} with vertical load (-). */
  public double fyLoad;
}
