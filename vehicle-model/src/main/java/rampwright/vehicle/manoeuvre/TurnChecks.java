package rampwright.vehicle.manoeuvre;

import java.util.Optional;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.chassis.Wheel;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.trim.Trim;
import rampwright.vehicle.trim.Trims;

/** Runs transient checks of one car with one set of differentials. Not thread-safe. */
public final class TurnChecks {
  /** Time that is looked at (s). */
  private static final double DURATION = 2;

  private static final double SPACING = 0.01;

  private final Car car;
  private final Conditions conditions;
  private final Trims trims;
  private final MotionSolver solver;

  /** Prepares the equations. */
  public TurnChecks(
      Car car, Conditions conditions, DifferentialSet differentials, RotatingParts parts) {
    this.car = car;
    this.conditions = conditions;
    this.trims = new Trims(car, conditions, differentials);
    this.solver = new MotionSolver(car, conditions, differentials, parts);
  }

  /** Returns the response, or empty when the car cannot hold the turn to begin with. */
  public Optional<TurnResponse> run(TurnManoeuvre manoeuvre) {
    return trims
        .constantSpeed(manoeuvre.speed(), 1 / manoeuvre.radius(), 0)
        .map(before -> respond(manoeuvre, before));
  }

  private TurnResponse respond(TurnManoeuvre manoeuvre, Trim before) {
    TurnControls controls = new TurnControls(manoeuvre, before, car, conditions, cageSpeed(before));
    Motion motion = solver.drive(MotionState.of(before), controls, DURATION, SPACING);
    return new TurnResponse(manoeuvre, before, motion);
  }

  private double cageSpeed(Trim trim) {
    DriveLayout layout = car.driveline().layout();
    double split =
        layout == DriveLayout.ALL
            ? car.driveline().frontTorqueShare()
            : layout == DriveLayout.FRONT ? 1 : 0;
    double front = trim.wheel(Wheel.FRONT_LEFT).speed() + trim.wheel(Wheel.FRONT_RIGHT).speed();
    double rear = trim.wheel(Wheel.REAR_LEFT).speed() + trim.wheel(Wheel.REAR_RIGHT).speed();
    return (split * front + (1 - split) * rear) / 2;
  }
}
