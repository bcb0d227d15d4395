package rampwright.vehicle;

import rampwright.vehicle.chassis.Aero;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.chassis.Chassis;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.tyre.Tyre;

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

  /** Checks the radii and the name. */
  public Car {
    if (name == null || name.isBlank()) {
      throw InvalidInput.of("name of the car", "blank", "some text", "");
    }
    FRONT_RADIUS.check(frontRadius);
    REAR_RADIUS.check(rearRadius);
  }
}
