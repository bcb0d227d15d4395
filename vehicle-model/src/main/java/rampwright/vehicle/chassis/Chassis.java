package rampwright.vehicle.chassis;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * Mass and geometry.
 *
 * @param mass mass with driver, without the fuel of the conditions (kg)
 * @param yawInertia moment of inertia about the vertical axis through the centre of gravity (kg·m²)
 * @param wheelbase distance between the axles (m)
 * @param cgToFrontAxle distance of the centre of gravity behind the front axle (m)
 * @param cgHeight height of the centre of gravity (m)
 * @param trackFront distance between the front wheels' contact centres (m)
 * @param trackRear distance between the rear wheels' contact centres (m)
 * @param rollCentreFront height of the front roll centre (m), negative below ground
 * @param rollCentreRear height of the rear roll centre (m)
 * @param frontRollShare front share of the total roll stiffness, springs and bars (-)
 */
public record Chassis(
    double mass,
    double yawInertia,
    double wheelbase,
    double cgToFrontAxle,
    double cgHeight,
    double trackFront,
    double trackRear,
    double rollCentreFront,
    double rollCentreRear,
    double frontRollShare) {
  public static final Quantity MASS = Quantity.si("mass_kg", "mass", "kg", 50, 20000, "");
  public static final Quantity YAW_INERTIA =
      Quantity.si("yaw_inertia_kgm2", "yaw inertia", "kg·m²", 5, 200000, "");
  public static final Quantity WHEELBASE =
      Quantity.si("wheelbase_m", "wheelbase", "m", 0.8, 8, "the value is in millimetres");
  public static final Quantity CG_TO_FRONT_AXLE =
      Quantity.si(
          "cg_to_front_axle_m", "distance from front axle to centre of gravity", "m", 0.1, 8, "");
  public static final Quantity CG_HEIGHT =
      Quantity.si(
          "cg_height_m", "centre of gravity height", "m", 0, 2, "the value is in millimetres");
  public static final Quantity TRACK_FRONT =
      Quantity.si("track_front_m", "front track", "m", 0.5, 10, "the value is in millimetres");
  public static final Quantity TRACK_REAR =
      Quantity.si("track_rear_m", "rear track", "m", 0.5, 10, "the value is in millimetres");
  public static final Quantity ROLL_CENTRE_FRONT =
      Quantity.si("roll_centre_front_m", "front roll centre height", "m", -0.5, 1.5, "");
  public static final Quantity ROLL_CENTRE_REAR =
      Quantity.si("roll_centre_rear_m", "rear roll centre height", "m", -0.5, 1.5, "");
  public static final Quantity FRONT_ROLL_SHARE =
      Quantity.si(
          "front_roll_share", "front share of roll stiffness", "", 0, 1, "it was given in percent");

  /**
   * Checks every value.
   *
   * @throws InvalidInput when a value is out of range or the centre of gravity is not between the
   *     axles
   */
  public Chassis {
    MASS.check(mass);
    YAW_INERTIA.check(yawInertia);
    WHEELBASE.check(wheelbase);
    CG_TO_FRONT_AXLE.check(cgToFrontAxle);
    CG_HEIGHT.check(cgHeight);
    TRACK_FRONT.check(trackFront);
    TRACK_REAR.check(trackRear);
    ROLL_CENTRE_FRONT.check(rollCentreFront);
    ROLL_CENTRE_REAR.check(rollCentreRear);
    FRONT_ROLL_SHARE.check(frontRollShare);
    if (cgToFrontAxle >= wheelbase) {
      throw InvalidInput.value(
          CG_TO_FRONT_AXLE.label(),
          cgToFrontAxle,
          "m",
          "less than the wheelbase of " + wheelbase + " m",
          "");
    }
  }

  /** Returns the distance of the centre of gravity ahead of the rear axle (m). */
  public double cgToRearAxle() {
    return wheelbase - cgToFrontAxle;
  }

  /** Returns this chassis with more mass at the centre of gravity (fuel); inertia is unchanged. */
  public Chassis withAddedMass(double added) {
    return new Chassis(
        mass + added,
        yawInertia,
        wheelbase,
        cgToFrontAxle,
        cgHeight,
        trackFront,
        trackRear,
        rollCentreFront,
        rollCentreRear,
        frontRollShare);
  }
}
