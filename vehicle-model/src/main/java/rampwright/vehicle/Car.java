package rampwright.vehicle;

import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.tyre.Tyre;
import rampwright.vehicle.tyre.TyreForces;

/**
 * Everything about a car that stays the same while its differential is being set.
 *
 * @param name a name for people
 * @param chassis mass and geometry
 * @param aero aerodynamics
 * @param brakes service brakes
 * @param driveline engine and gears
 * @param frontTyre tyre of both front wheels
 * @param rearTyre tyre of both rear wheels
 * @param frontRadius rolling radius of the front wheels (m)
 * @param rearRadius rolling radius of the rear wheels (m)
 */
public record Car(
    String name,
    Chassis chassis,
    Aero aero,
    Brakes brakes,
    Driveline driveline,
    Tyre frontTyre,
    Tyre rearTyre,
    double frontRadius,
    double rearRadius) {
  public static final Quantity FRONT_RADIUS =
      Quantity.si(
          "front_rolling_radius_m",
          "front rolling radius",
          "m",
          0.05,
          2,
          "the value is in millimetres");
  public static final Quantity REAR_RADIUS =
      Quantity.si(
          "rear_rolling_radius_m",
          "rear rolling radius",
          "m",
          0.05,
          2,
          "the value is in millimetres");

  /** Load (N) at which the tyres' force without slip is checked. */
  private static final double LOAD_OF_CHECK = 3000;

  /** Checks the radii, the name and that a tyre without slip has no force. */
  public Car {
    if (name == null || name.isBlank()) {
      throw InvalidInput.of("name of the car", "blank", "some text", "");
    }
    FRONT_RADIUS.check(frontRadius);
    REAR_RADIUS.check(rearRadius);
    checkAtRest("front", frontTyre);
    checkAtRest("rear", rearTyre);
  }

  /** A free wheel rolls without slip, so a force there would never be in balance. */
  private static void checkAtRest(String position, Tyre tyre) {
    TyreForces forces = new TyreForces();
    tyre.evaluate(LOAD_OF_CHECK, 0, 0, 1, forces);
    double force = Math.hypot(forces.fx, forces.fy);
    if (!(force <= 1e-9 * LOAD_OF_CHECK)) {
      throw InvalidInput.value(
          "force of the " + position + " tyre without slip",
          force,
          "N",
          "zero",
          "the shifts of the curves are still in: use the centred tyre");
    }
  }
}
