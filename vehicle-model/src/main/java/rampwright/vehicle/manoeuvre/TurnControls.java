package rampwright.vehicle.manoeuvre;

import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Brakes;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.trim.Trim;

/** Steering held at the steady turn's; throttle and brakes ramped from there, gear held. */
final class TurnControls implements Controls {
  /** Time to close the throttle (s). */
  private static final double CLOSING = 0.1;

  /** Time to open the throttle or to build up the brakes (s). */
  private static final double OPENING = 0.2;

  private final TurnManoeuvre manoeuvre;
  private final Trim before;
  private final Driveline driveline;
  private final int gear;
  private final double brakeTorque;

  TurnControls(
      TurnManoeuvre manoeuvre, Trim before, Car car, Conditions conditions, double cageSpeed) {
    this.manoeuvre = manoeuvre;
    this.before = before;
    this.driveline = car.driveline();
    this.gear = driveline.bestGear(cageSpeed);
    Brakes brakes = car.brakes();
    double perTorque =
        brakes.frontShare() / car.frontRadius() + (1 - brakes.frontShare()) / car.rearRadius();
    double force = (car.chassis().mass() + conditions.fuelMass()) * manoeuvre.strength();
    this.brakeTorque = Math.min(brakes.maxTorque(), force / perTorque);
  }

  @Override
  public double steer(double time) {
    return before.steer();
  }

  @Override
  public double cageTorque(double time, double cageSpeed) {
    boolean opens = manoeuvre.kind() == TurnManoeuvre.Kind.THROTTLE_ON;
    double wanted =
        opens
            ? manoeuvre.strength() * driveline.fullTorque(gear, cageSpeed)
            : driveline.overrunTorque(gear, cageSpeed);
    double done = Math.min(1, time / (opens ? OPENING : CLOSING));
    return before.cageTorque() + (wanted - before.cageTorque()) * done;
  }

  @Override
  public double brakeTorque(double time) {
    boolean brakes = manoeuvre.kind() == TurnManoeuvre.Kind.BRAKING;
    return brakes ? brakeTorque * Math.min(1, time / OPENING) : 0;
  }
}
