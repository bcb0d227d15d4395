package rampwright.vehicle.balance;

import java.util.Optional;
import java.util.OptionalDouble;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.input.Quantity;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;

/**
 * Steady-state circular driving: how much more road-wheel steer and sideslip the car asks for as
 * lateral acceleration rises, on a circle of constant radius or at constant speed (two of the three
 * methods of ISO 4138).
 *
 * <pre>
 *   U = d(steer)/d(ay) - d(L/R)/d(ay)      positive: understeer
 * </pre>
 *
 * On a constant radius the kinematic (Ackermann) angle {@code L/R} does not change; at constant
 * speed it rises by {@code L/v²}. Slopes are central differences over {@code 2 *} {@link #STEP}.
 * Deviations from the standard: angles at the road wheels instead of the steering wheel over its
 * ratio, and beside constant speed any cage torque may be asked for (positive on power, negative on
 * overrun); the car then gains or loses speed and the trim is that of the moment. Left turns; a
 * flat road.
 *
 * <p>For a car with linear tyres {@code U = m (b Cr - a Cf) / (L Cf Cr)} with the cornering
 * stiffnesses of the axles (Gillespie, <i>Fundamentals of Vehicle Dynamics</i>, ch. 6).
 */
public final class UndersteerGradient {
  /** Half the range of lateral acceleration (m/s²) over which slopes are taken. */
  public static final double STEP = 0.05;

  public static final Quantity RADIUS =
      Quantity.si("circle_radius_m", "radius of the circle", "m", 2, 10000, "");
  public static final Quantity LATERAL =
      Quantity.si(
          "lateral_acceleration_mps2",
          "lateral acceleration",
          "m/s²",
          0.1,
          60,
          "it was given in g");

  private final double wheelbase;
  private final Trims trims;
  private final OptionalDouble torque;

  private UndersteerGradient(double wheelbase, Trims trims, OptionalDouble torque) {
    this.wheelbase = wheelbase;
    this.trims = trims;
    this.torque = torque;
  }

  /** Returns the gradients of a car that holds its speed. */
  public static UndersteerGradient atConstantSpeed(
      Car car, Conditions conditions, DifferentialSet differentials) {
    return new UndersteerGradient(
        car.chassis().wheelbase(),
        new Trims(car, conditions, differentials),
        OptionalDouble.empty());
  }

  /** Returns the gradients of a car with a cage torque (N·m). */
  public static UndersteerGradient atCageTorque(
      Car car, Conditions conditions, DifferentialSet differentials, double torque) {
    return new UndersteerGradient(
        car.chassis().wheelbase(),
        new Trims(car, conditions, differentials),
        OptionalDouble.of(torque));
  }

  /**
   * Returns the gradients on a circle at a lateral acceleration, or empty where the car cannot hold
   * it.
   *
   * @param radius radius of the path (m); the standard's is 100 m
   * @param lateral lateral acceleration (m/s²)
   */
  public Optional<HandlingGradients> onRadius(double radius, double lateral) {
    RADIUS.check(radius);
    LATERAL.check(lateral);
    return between(
        trim(Math.sqrt((lateral - STEP) * radius), 1 / radius),
        trim(Math.sqrt((lateral + STEP) * radius), 1 / radius),
        0);
  }

  /**
   * Returns the gradients at a speed (m/s) at a lateral acceleration (m/s²), or empty where the car
   * cannot hold it.
   */
  public Optional<HandlingGradients> atSpeed(double speed, double lateral) {
    LATERAL.check(lateral);
    double perAcceleration = 1 / (speed * speed);
    return between(
        trim(speed, (lateral - STEP) * perAcceleration),
        trim(speed, (lateral + STEP) * perAcceleration),
        wheelbase * perAcceleration);
  }

  private Optional<Trim> trim(double speed, double curvature) {
    return torque.isPresent()
        ? trims.atCageTorque(speed, curvature, 0, torque.getAsDouble())
        : trims.constantSpeed(speed, curvature, 0);
  }

  private Optional<HandlingGradients> between(
      Optional<Trim> low, Optional<Trim> high, double kinematic) {
    if (low.isEmpty() || high.isEmpty()) {
      return Optional.empty();
    }
    Trim a = low.get();
    Trim b = high.get();
    double range = b.ay() - a.ay();
    return Optional.of(
        new HandlingGradients(
            (a.ay() + b.ay()) / 2,
            (a.steer() + b.steer()) / 2,
            (b.steer() - a.steer()) / range - kinematic,
            (b.sideslip() - a.sideslip()) / range,
            wheelbase));
  }
}
