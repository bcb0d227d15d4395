package rampwright.vehicle.manoeuvre;

import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.input.Quantity;

/**
 * A disturbance of steady cornering with the steering held, in the spirit of ISO 9816 (power-off
 * reaction in a turn) and ISO 7975 (braking in a turn); both from memory. Deviations: the steering
 * is held at the road wheels; the throttle or brake is ramped instead of operated by a driver;
 * engine and gears have no inertia; the clutch stays closed under braking; no wind, even road.
 *
 * @param kind what the driver does
 * @param radius radius of the turn before (m), to the left
 * @param lateralAcceleration lateral acceleration before (m/s²)
 * @param strength share of full torque for {@link Kind#THROTTLE_ON} (-); deceleration that the
 *     brakes alone would give with rolling wheels for {@link Kind#BRAKING} (m/s²); unused otherwise
 */
public record TurnManoeuvre(Kind kind, double radius, double lateralAcceleration, double strength) {
  public static final Quantity RADIUS = Quantity.si("radius_m", "radius", "m", 5, 5000, "");
  public static final Quantity LATERAL_ACCELERATION =
      Quantity.si(
          "lateral_acceleration_mps2",
          "lateral acceleration",
          "m/s²",
          0.01,
          60,
          "it was given in g");
  public static final Quantity STRENGTH =
      Quantity.si("strength", "strength of the input", "", 0, 60, "");

  /** Standard radius of both standards (m). */
  private static final double STANDARD_RADIUS = 100;

  /** What the driver does. */
  public enum Kind {
    /** Closes the throttle. */
    POWER_OFF,
    /** Opens the throttle. */
    THROTTLE_ON,
    /** Closes the throttle and brakes. */
    BRAKING
  }

  /** Checks every value. */
  public TurnManoeuvre {
    RADIUS.check(radius);
    LATERAL_ACCELERATION.check(lateralAcceleration);
    STRENGTH.check(strength);
    if (kind == Kind.THROTTLE_ON && strength > 1) {
      throw InvalidInput.value(
          "throttle", strength, "", "a share from 0 to 1", "it was given in percent");
    }
  }

  /** Returns closing the throttle on a circle of 100 m radius. */
  public static TurnManoeuvre powerOff(double lateralAcceleration) {
    return new TurnManoeuvre(Kind.POWER_OFF, STANDARD_RADIUS, lateralAcceleration, 0);
  }

  /** Returns opening the throttle to a share of full torque on a circle of 100 m radius. */
  public static TurnManoeuvre throttleOn(double lateralAcceleration, double share) {
    return new TurnManoeuvre(Kind.THROTTLE_ON, STANDARD_RADIUS, lateralAcceleration, share);
  }

  /** Returns braking with a deceleration (m/s²) on a circle of 100 m radius. */
  public static TurnManoeuvre braking(double lateralAcceleration, double deceleration) {
    return new TurnManoeuvre(Kind.BRAKING, STANDARD_RADIUS, lateralAcceleration, deceleration);
  }

  /** Returns the speed before (m/s). */
  public double speed() {
    return Math.sqrt(lateralAcceleration * radius);
  }
}
