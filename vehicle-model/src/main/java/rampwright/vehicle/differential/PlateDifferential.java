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
 * @param preload {@code P}: whole torque difference at zero cage torque (N·m); the bench figure
 *     with the propshaft locked, twice the one with one wheel held and the propshaft free
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

  @Override
  public double capacity(double cageTorque) {
    return preload + (cageTorque >= 0 ? driveShare * cageTorque : -coastShare * cageTorque);
  }

  @Override
  public double capacitySlope(double cageTorque) {
    return cageTorque >= 0 ? driveShare : -coastShare;
  }
}
