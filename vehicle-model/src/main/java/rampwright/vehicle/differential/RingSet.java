package rampwright.vehicle.differential;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * A pair of pressure rings: one part with a drive and a coast ramp angle. The angle is the one the
 * trade stamps: between the ramp's flank and the ring's plane of rotation, so 30 degrees locks
 * hard, 60 little and 90 not at all.
 *
 * @param name the stamp or bin label
 * @param driveAngle ramp angle that works on power (rad)
 * @param coastAngle ramp angle that works on overrun (rad)
 * @param reversible whether the set can be fitted turned round, which swaps the two angles
 */
public record RingSet(String name, double driveAngle, double coastAngle, boolean reversible) {
  public static final Quantity DRIVE_ANGLE =
      Quantity.degrees(
          "drive_angle_deg",
          "drive ramp angle",
          15,
          90,
          "the angle was measured from the axle: use 90 minus it");
  public static final Quantity COAST_ANGLE =
      Quantity.degrees(
          "coast_angle_deg",
          "coast ramp angle",
          15,
          90,
          "the angle was measured from the axle: use 90 minus it");

  /** Checks the name and both angles. */
  public RingSet {
    if (name == null || name.isBlank()) {
      throw InvalidInput.of(
          "name of a ring set", "blank", "some text", "use the stamp on the part");
    }
    DRIVE_ANGLE.check(driveAngle);
    COAST_ANGLE.check(coastAngle);
  }

  /** Returns the drive angle as fitted (rad). */
  public double driveAngle(boolean turned) {
    return turned ? coastAngle : driveAngle;
  }

  /** Returns the coast angle as fitted (rad). */
  public double coastAngle(boolean turned) {
    return turned ? driveAngle : coastAngle;
  }
}
