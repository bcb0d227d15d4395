package rampwright.vehicle.trim;

import java.util.Arrays;
import rampwright.vehicle.Car;
import rampwright.vehicle.Conditions;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.differential.DifferentialSet;
import rampwright.vehicle.driveline.DriveLayout;
import rampwright.vehicle.driveline.Driveline;

/**
 * Trims and limits of one car with one set of differentials, at one point of the road after
 * another. A workspace, one instance per thread; what was solved before changes results only within
 * the solver's tolerance.
 *
 * <p>Growth limits are the largest growth rate of a slide that the driver masters (1/s), infinite
 * for the car's own limit.
 */
public final class TrimSolver {
  /** Steps in which torque is taken off when lifting the throttle at once has no trim. */
  private static final int LIFT_STEPS = 20;

  /** Constant-speed trims of neighbouring points differ by less than this in mean slip... */
  private static final double NEAR_SLIP = 0.015;

  /** ...and in sideslip (rad); a larger step means another branch. */
  private static final double NEAR_ANGLE = 0.03;

  /** Lateral acceleration (m/s²) that every car sustains. */
  private static final double GENTLE = 1.5;

  private final Car car;
  private final Driveline engineSide;
  private final ForceBalance forces;
  private final Equilibrium drive;
  private final Equilibrium brake;
  private final Stability stability = new Stability();
  private final BranchStart driveStart;
  private final int brakeSign;
  private final CornerLimit corner;
  private final SlipMarch driveMarch;
  private final SlipMarch brakeMarch;
  private final LimitTracker driveTracker;
  private final LimitTracker brakeTracker;
  private final FullLoad fullLoad = new FullLoad();
  private final FullBrakes fullBrakes = new FullBrakes();
  private final GivenTorque givenTorque = new GivenTorque();
  private final TrimState work = new TrimState();
  private final TrimState trial = new TrimState();
  private final TrimResults driveResults;
  private final TrimResults brakeResults;

  /** Prepares the equations. */
  public TrimSolver(Car car, Conditions conditions, DifferentialSet differentials) {
    this.car = car;
    this.engineSide = car.driveline();
    this.forces = new ForceBalance(car, conditions, differentials);
    this.drive =
        new Equilibrium(forces, DrivelineEquations.driving(car, differentials), engineSide);
    this.brake =
        new Equilibrium(forces, DrivelineEquations.braking(car, differentials), engineSide);
    this.driveStart = new BranchStart(drive);
    this.brakeSign = new BranchStart(brake).referenceSign;
    this.corner = new CornerLimit(drive, stability, driveStart);
    this.driveMarch = new SlipMarch(drive, stability);
    this.brakeMarch = new SlipMarch(brake, stability);
    this.driveTracker = new LimitTracker(drive, stability);
    this.brakeTracker = new LimitTracker(brake, stability);
    this.driveResults = resultsOf(drive);
    this.brakeResults = resultsOf(brake);
  }

  private TrimResults resultsOf(Equilibrium equilibrium) {
    DriveLayout layout = engineSide.layout();
    return new TrimResults(
        forces,
        equilibrium.driveline,
        layout != DriveLayout.REAR,
        layout != DriveLayout.FRONT,
        stability,
        trial);
  }

  /** Moves to a station of a road. */
  public void place(Road road, int station) {
    forces.place(
        road.curvature(station),
        road.curvatureGradient(station),
        road.grade(station),
        road.bank(station),
        road.verticalCurvature(station),
        road.gripLeft(station),
        road.gripRight(station),
        road.headwind(station));
  }

  /** Moves to a flat point of even grip without wind. */
  public void place(double curvature, double curvatureGradient) {
    forces.place(curvature, curvatureGradient, 0, 0, 0, 1, 1, 0);
  }

  /** Returns the speed of the engine-driven case (rad/s) when rolling free at a speed (m/s). */
  public double rollingCageSpeed(double speed) {
    int[] driven = drive.driveline.activeWheels;
    return speed / forces.radius(driven[driven.length - 1]);
  }

  /**
   * Solves for constant speed, following the path from straight running.
   *
   * @return whether such a trim is joined to straight running
   */
  public boolean constantSpeed(double speed, TrimState out) {
    return driveStart.coasting(speed, work) && driveStart.constantSpeed(work, out)
        || climbTo(speed, out);
  }

  /**
   * Follows the branch of constant-speed trims up from a gentle speed: near the cornering limit
   * there may be no coasting trim to start from, as with a locked front axle in a tight turn.
   */
  private boolean climbTo(double speed, TrimState out) {
    double gentle = Math.sqrt(GENTLE / Math.max(1e-9, Math.abs(forces.curvature)));
    if (gentle >= speed || !corner.find(gentle, speed, Double.POSITIVE_INFINITY, out)) {
      return false;
    }
    out.speed = speed;
    return drive.atAcceleration(out, 0) && out.determinantSign == driveStart.referenceSign;
  }

  /**
   * Solves for constant speed from such a trim nearby. The answer is kept when it is close to the
   * start and torque still brings speed there; otherwise the path is followed from straight
   * running.
   */
  public boolean constantSpeed(double speed, TrimState near, TrimState out) {
    double meanSlip = near.meanSlip;
    double sideslip = near.sideslip;
    boolean usable = !near.braking;
    out.copyFrom(near);
    out.speed = speed;
    out.ax = 0;
    boolean solved =
        usable
            && drive.atAcceleration(out, 0)
            && out.determinantSign == driveStart.referenceSign
            && out.axRate > 0
            && Math.abs(out.meanSlip - meanSlip) < NEAR_SLIP
            && Math.abs(out.sideslip - sideslip) < NEAR_ANGLE;
    return solved || constantSpeed(speed, out);
  }

  /**
   * Finds the largest acceleration.
   *
   * @param level trim at constant speed
   * @param gear gear that is in
   * @param growthMax growth limit on power
   * @param out receives the trim at the limit
   */
  public TrimLimit driveLimit(TrimState level, int gear, double growthMax, TrimState out) {
    work.copyFrom(level);
    drive.atAcceleration(work, 0);
    fullLoad.gear = gear;
    return driveMarch.find(work, fullLoad, growthMax, driveStart.referenceSign, out);
  }

  /**
   * Finds the strongest braking: the throttle is closed, then the brakes are applied.
   *
   * @param level trim at constant speed
   * @param gear gear that is in, for the engine's overrun torque
   * @param growthMax growth limit when braking
   * @param out receives the trim at the limit
   */
  public TrimLimit brakeLimit(TrimState level, int gear, double growthMax, TrimState out) {
    double overrun = engineSide.overrunTorque(gear, rollingCageSpeed(level.speed));
    if (!lift(level, overrun, growthMax, out)) {
      return TrimLimit.DRIVER;
    }
    brake.input = overrun;
    work.copyFrom(out);
    if (!brake.atTotalTorque(work, overrun) || work.determinantSign != brakeSign) {
      return TrimLimit.DRIVER;
    }
    return brakeMarch.find(work, fullBrakes, growthMax, brakeSign, out);
  }

  /**
   * Finds the largest acceleration at the next point of a road, following the limit of the point
   * before where that is possible.
   *
   * @param speed speed (m/s)
   * @param level trim at constant speed nearby; replaced when the whole branch had to be searched
   * @return why the limit lies there, or null when there is no steady trim at this speed
   */
  public TrimLimit nextDriveLimit(
      double speed, TrimState level, int gear, double growthMax, TrimState out) {
    fullLoad.gear = gear;
    TrimLimit followed =
        driveTracker.follow(speed, fullLoad, growthMax, driveStart.referenceSign, out);
    if (followed != null) {
      return followed;
    }
    if (!constantSpeed(speed, level, level)) {
      driveTracker.forget();
      return null;
    }
    TrimLimit searched = driveLimit(level, gear, growthMax, out);
    if (driveMarch.sawDip()) {
      driveTracker.forget();
    } else {
      driveTracker.searched(searched, out, growthMax, driveMarch.runawaySlope());
    }
    return searched;
  }

  /**
   * Looks at the drive limit a little further on, without leaving the point where it was found
   * last.
   *
   * @return whether the limit could be followed there
   */
  public boolean peekDriveLimit(double speed, int gear, double growthMax, TrimState out) {
    fullLoad.gear = gear;
    return driveTracker.peek(speed, fullLoad, growthMax, driveStart.referenceSign, out);
  }

  /** Looks at the brake limit a little further back, like {@link #peekDriveLimit}. */
  public boolean peekBrakeLimit(double speed, int gear, double growthMax, TrimState out) {
    brake.input = engineSide.overrunTorque(gear, rollingCageSpeed(speed));
    return brakeTracker.peek(speed, fullBrakes, growthMax, brakeSign, out);
  }

  /** Finds the strongest braking at the next point, like {@link #nextDriveLimit}. */
  public TrimLimit nextBrakeLimit(
      double speed, TrimState level, int gear, double growthMax, TrimState out) {
    brake.input = engineSide.overrunTorque(gear, rollingCageSpeed(speed));
    TrimLimit followed = brakeTracker.follow(speed, fullBrakes, growthMax, brakeSign, out);
    if (followed != null) {
      return followed;
    }
    if (!constantSpeed(speed, level, level)) {
      brakeTracker.forget();
      return null;
    }
    TrimLimit searched = brakeLimit(level, gear, growthMax, out);
    if (out.braking) {
      brakeTracker.searched(searched, out, growthMax, brakeMarch.runawaySlope());
    } else {
      brakeTracker.forget();
    }
    return searched;
  }

  /** Starts afresh: the next limit has no neighbour. */
  public void forget() {
    corner.forget();
    driveTracker.forget();
    brakeTracker.forget();
  }

  /** Closes the throttle; returns whether the driver masters the car all the way. */
  private boolean lift(TrimState level, double overrun, double growthMax, TrimState out) {
    if (lower(level, overrun, growthMax)) {
      out.copyFrom(work);
      return true;
    }
    out.copyFrom(level);
    double step = (level.cageTorque - overrun) / LIFT_STEPS;
    for (int i = 0; i < 3 * LIFT_STEPS; i++) {
      double torque = Math.max(overrun, out.cageTorque - step);
      if (!lower(out, torque, growthMax)) {
        step /= 4;
        continue;
      }
      out.copyFrom(work);
      if (torque == overrun) {
        return true;
      }
    }
    return false;
  }

  /** Solves in {@code work} for less cage torque; returns whether the driver masters that trim. */
  private boolean lower(TrimState from, double torque, double growthMax) {
    work.predict(from, (torque - from.cageTorque) / from.torqueRate);
    return drive.atTotalTorque(work, torque)
        && work.determinantSign == driveStart.referenceSign
        && masters(work, drive, growthMax);
  }

  private boolean masters(TrimState state, Equilibrium equilibrium, double growthMax) {
    if (growthMax == Double.POSITIVE_INFINITY) {
      return true;
    }
    stability.evaluate(forces, equilibrium.driveline, state.speed, state.sideslip);
    state.sigma = stability.sigma;
    return state.sigma <= growthMax;
  }

  /**
   * Finds the largest speed at constant speed.
   *
   * @param near trim at constant speed nearby, or null to start from straight running
   * @param from speed to start from (m/s), below the limit
   * @param topSpeed speed above which the limit is of no interest (m/s)
   * @param growthMax growth limit on power
   * @param out receives the trim at the limit, or at the first speed at or above {@code topSpeed}
   * @return false when there is no steady trim at the first speed
   */
  public boolean cornerLimit(
      TrimState near, double from, double topSpeed, double growthMax, TrimState out) {
    return near == null
        ? corner.find(from, topSpeed, growthMax, out)
        : corner.findFrom(near, from, topSpeed, growthMax, out);
  }

  /**
   * Follows the cornering limit from the point where it was found last.
   *
   * @return false when it must be searched with {@link #cornerLimit}
   */
  public boolean nextCornerLimit(double topSpeed, double growthMax, TrimState out) {
    return corner.follow(topSpeed, growthMax, out);
  }

  /**
   * Follows the branch from constant speed to a cage torque with the brakes off.
   *
   * @return false when the branch does not reach it
   */
  public boolean reachCageTorque(TrimState level, double torque, TrimState out) {
    if (torque <= level.cageTorque) {
      return lift(level, torque, Double.POSITIVE_INFINITY, out);
    }
    work.copyFrom(level);
    drive.atAcceleration(work, 0);
    givenTorque.torque = torque;
    return driveMarch.find(
            work, givenTorque, Double.POSITIVE_INFINITY, driveStart.referenceSign, out)
        == TrimLimit.TORQUE;
  }

  /** Solves for a cage torque with the brakes off, from a trim nearby; returns whether it did. */
  public boolean atCageTorque(TrimState near, double torque, TrimState out) {
    out.copyFrom(near);
    return drive.atTotalTorque(out, torque) && out.determinantSign == driveStart.referenceSign;
  }

  /**
   * Solves for a path acceleration, with throttle or, when closing it is not enough, with the
   * brakes.
   *
   * @param near trim with the brakes off at the same speed
   * @return whether there is such a trim
   */
  public boolean atAcceleration(TrimState near, double ax, int gear, TrimState out) {
    double overrun = engineSide.overrunTorque(gear, rollingCageSpeed(near.speed));
    out.copyFrom(near);
    if (throttleGives(ax, overrun, out)) {
      return true;
    }
    // near the limit of speed only the far side of the branch leads there
    if (!driveStart.coasting(near.speed, work)) {
      return false;
    }
    out.copyFrom(work);
    if (throttleGives(ax, overrun, out)) {
      return true;
    }
    brake.input = overrun;
    out.copyFrom(work);
    Arrays.fill(out.slip, 0);
    return brake.atTotalTorque(out, overrun)
        && brake.atAcceleration(out, ax)
        && out.brakeTorque >= 0;
  }

  /**
   * Returns whether the driver masters a trim with a path acceleration, with throttle or brakes.
   *
   * @param near trim with the brakes off at the same speed
   * @param out receives the trim
   */
  public boolean masters(TrimState near, double ax, int gear, double growthMax, TrimState out) {
    if (!atAcceleration(near, ax, gear, out) || out.brakeTorque > car.brakes().maxTorque()) {
      return false;
    }
    if (out.braking && out.determinantSign != brakeSign) {
      return false;
    }
    return masters(out, out.braking ? brake : drive, growthMax);
  }

  private boolean throttleGives(double ax, double overrun, TrimState out) {
    return drive.atAcceleration(out, ax)
        && out.cageTorque >= overrun
        && out.determinantSign == driveStart.referenceSign;
  }

  /**
   * Solves a known trim once more, so that every result below belongs to it.
   *
   * @return whether it is a trim at the point where the solver stands
   */
  public boolean restore(TrimState state) {
    Equilibrium equilibrium = state.braking ? brake : drive;
    brake.input = state.braking ? state.cageTorque : 0;
    trial.copyFrom(state);
    boolean solved = equilibrium.holds(trial);
    if (solved) {
      stability.evaluate(forces, equilibrium.driveline, trial.speed, trial.sideslip);
      trial.sigma = stability.sigma;
      state.copyFrom(trial);
    }
    return solved;
  }

  /** Returns the results of the trim that was restored last. */
  public TrimResults results() {
    return trial.braking ? brakeResults : driveResults;
  }

  /** Torque left until full throttle. */
  private final class FullLoad implements SlipMarch.TorqueCap {
    private int gear;

    @Override
    public double headroom(TrimState state) {
      return engineSide.fullTorque(gear, state.cageSpeed) - state.cageTorque;
    }

    @Override
    public boolean solve(Equilibrium equilibrium, TrimState state) {
      return equilibrium.atFullLoad(state, gear);
    }
  }

  /** Torque left until a given cage torque. */
  private static final class GivenTorque implements SlipMarch.TorqueCap {
    private double torque;

    @Override
    public double headroom(TrimState state) {
      return torque - state.cageTorque;
    }

    @Override
    public boolean solve(Equilibrium equilibrium, TrimState state) {
      return equilibrium.atTotalTorque(state, torque);
    }
  }

  /** Torque left until the brakes have no more. */
  private final class FullBrakes implements SlipMarch.TorqueCap {
    @Override
    public double headroom(TrimState state) {
      return car.brakes().maxTorque() - state.brakeTorque;
    }

    @Override
    public boolean solve(Equilibrium equilibrium, TrimState state) {
      return equilibrium.atTotalTorque(state, equilibrium.input - car.brakes().maxTorque());
    }
  }
}
