package rampwright.vehicle.differential;

import rampwright.vehicle.input.Quantity;

/**
 * Law of a plate-type unit: the outputs stick together until their torque difference reaches
 *
 * <pre>
 *   D_cap = P + k_drive * max(T, 0) + k_coast * max(-T, 0)
 * </pre>
 *
 * and slide at that difference beyond it.
 *
 * @param preload {@code P}: whole torque difference at zero cage torque (N·m): twice the bench
 *     figure with one wheel held, the other turned and the propshaft free
 * @param driveShare {@code k_drive}: locking value added per cage torque on power (-)
 * @param coastShare {@code k_coast}: the same on overrun (-)
 */
public record PlateDifferential(double preload, double driveShare, double coastShare)
    implements Differential {
  public static final Quantity PRELOAD =
      Quantity.si("preload_nm", "preload (whole torque difference)", "N·m", 0, 5000, "");
  public static final Quantity DRIVE_SHARE =
      Quantity.si("drive_share", "drive locking share", "", 0, 100, "");
  public static final Quantity COAST_SHARE =
      Quantity.si("coast_share", "coast locking share", "", 0, 100, "");

  /** Checks every value. */
  public PlateDifferential {
    PRELOAD.check(preload);
    DRIVE_SHARE.check(driveShare);
    COAST_SHARE.check(coastShare);
  }

  /**
   * Returns the bench breakaway (N·m) with one wheel held, the other turned and the propshaft free:
   * no torque reaches the case, the outputs carry opposite torques.
   */
  public double breakawayWheelHeld() {
    return preload / 2;
  }

  /**
   * Returns the bench breakaway (N·m) with the propshaft locked, one wheel free and the other
   * turned: the free one carries nothing, so the turned one carries the whole difference. What
   * holds the propshaft loads the ramps with that same torque, so {@code D = P + k D}; infinite
   * from {@code k = 1} on.
   *
   * @param forwards whether the wheel is turned forwards, which works on the coast flanks; else it
   *     works on the drive flanks
   */
  public double breakawayPropshaftLocked(boolean forwards) {
    double share = forwards ? coastShare : driveShare;
    return share < 1 ? preload / (1 - share) : Double.POSITIVE_INFINITY;
  }

  @Override
  public double capacity(double cageTorque) {
    return preload + (cageTorque >= 0 ? driveShare * cageTorque : -coastShare * cageTorque);
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return cageTorque >= 0 ? driveShare : -coastShare;
  }
}
