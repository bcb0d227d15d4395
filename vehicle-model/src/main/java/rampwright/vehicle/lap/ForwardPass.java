package rampwright.vehicle.lap;

import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.trim.TrimLimit;
import rampwright.vehicle.trim.TrimSolver;
import rampwright.vehicle.trim.TrimState;

/**
 * Integrates the drive limit forward: {@code d(v²/2)/ds = ax}, held at the cornering limit where
 * that is lower. During a gear change the car rolls without drive torque.
 */
final class ForwardPass {
  /** The kinetic energy per mass does not fall below that of 1 m/s. */
  private static final double LEAST_ENERGY = 0.5;

  /** Fall of the drive limit (m/s²) between stations that only a jump of the limit explains. */
  private static final double JUMP = 1.0;

  private static final int THRESHOLD_STEPS = 12;

  private final Road road;
  private final TrimSolver solver;
  private final Gearbox gearbox;
  private final SpeedLimits limits;
  private final double growthMax;
  private final Profile profile;
  private final TrimState level = new TrimState();
  private final TrimState limit = new TrimState();
  private final TrimState ahead = new TrimState();

  private int gear;
  private double shiftLeft;
  private double before;
  private double axBefore;
  private double energyBefore;

  ForwardPass(
      Road road,
      TrimSolver solver,
      Gearbox gearbox,
      SpeedLimits limits,
      double growthMax,
      Profile profile) {
    this.road = road;
    this.solver = solver;
    this.gearbox = gearbox;
    this.limits = limits;
    this.growthMax = growthMax;
    this.profile = profile;
  }

  /**
   * Runs once around from a station, or to the end of an open road.
   *
   * @return the speed with which the car arrives at the start of a closed road again
   */
  double run(int start, double startSpeed) {
    gear = gearbox.best(solver.rollingCageSpeed(startSpeed));
    shiftLeft = 0;
    before = Double.NaN;
    axBefore = Double.NaN;
    limits.load(start, level);
    solver.forget();
    double energy = startSpeed * startSpeed / 2;
    for (int k = 0; k < road.size(); k++) {
      int i = Math.floorMod(start + k, road.size());
      double speed = Math.sqrt(2 * energy);
      boolean capped = speed >= limits.speed(i) && limits.binds(i);
      if (speed >= limits.speed(i)) {
        speed = limits.speed(i);
        before = Double.NaN;
        axBefore = Double.NaN;
      }
      energy = capped && limits.isApex(i) ? leaveApex(i) : step(i, speed, capped);
    }
    return Math.min(Math.sqrt(2 * energy), limits.speed(start));
  }

  /**
   * Starts from the slowest point of a corner, which lies between stations: it is reached at zero
   * acceleration, and the mean acceleration from there to the next station is half of that
   * station's.
   */
  private double leaveApex(int i) {
    double offset = limits.apexOffset(i);
    double energy = limits.apexEnergy(i);
    if (offset > 0) {
      step(i, limits.speed(i), true);
      before = Double.NaN;
      shiftLeft = 0;
      double ax = driveLimitAhead(road.next(i), Math.sqrt(2 * energy));
      return energy + 0.5 * Math.max(0, ax) * (road.step(i) - offset);
    }
    double ax = driveLimitAhead(i, Math.sqrt(2 * energy));
    double reached = energy - 0.5 * Math.max(0, ax) * offset;
    return step(i, Math.min(limits.speed(i), Math.sqrt(2 * reached)), true);
  }

  /** Acceleration of the drive limit at a station, nothing saved; 0 where there is none. */
  private double driveLimitAhead(int i, double speed) {
    solver.place(road, i);
    limits.load(i, ahead);
    if (!solver.constantSpeed(speed, ahead, ahead)) {
      return 0;
    }
    solver.driveLimit(ahead, gear, growthMax, limit);
    return limit.ax;
  }

  /** Saves the drive limit at a station and returns the energy at the next. */
  private double step(int i, double speed, boolean capped) {
    double energy = speed * speed / 2;
    solver.place(road, i);
    gear = gearbox.keepOrLower(gear, solver.rollingCageSpeed(speed));
    if (shiftLeft > 0) {
      return rollThroughShift(i, speed);
    }
    if (capped && holds(i)) {
      return hold(i, energy);
    }
    TrimLimit why = solver.nextDriveLimit(speed, level, gear, growthMax, limit);
    if (why == null) {
      limits.load(i, level);
      profile.save(i, level, gear, LapLimit.CORNERING);
      before = Double.NaN;
      return energy;
    }
    if (!capped && axBefore - limit.ax > JUMP) {
      energy = holdThreshold(i, energy, limit.ax);
      why = TrimLimit.DRIVER;
    }
    profile.save(i, limit, gear, capped ? LapLimit.CORNERING : reason(why));
    axBefore = limit.ax;
    energyBefore = energy;
    double ax = limit.ax;
    double cageSpeed = limit.cageSpeed;
    double slope;
    if (Double.isNaN(before)) {
      slope = startSlope(i, energy, ax);
    } else {
      slope = ax + 0.5 * (ax - before) * road.step(i) / road.step(road.previous(i));
      if (why != TrimLimit.TORQUE) {
        slope = corrected(i, energy, ax, slope);
      }
    }
    before = ax;
    return shiftWithin(i, energy, slope, cageSpeed);
  }

  /** Whether the engine has the torque to hold the cornering limit; leaves its trim. */
  private boolean holds(int i) {
    limits.load(i, level);
    return gearbox.fullTorque(gear, cageSpeed(level)) > level.cageTorque;
  }

  private double cageSpeed(TrimState state) {
    return solver.rollingCageSpeed(state.speed) * (1 + state.meanSlip);
  }

  /** Stays at the cornering limit, where there is no acceleration to give. */
  private double hold(int i, double energy) {
    profile.save(i, level, gear, LapLimit.CORNERING);
    before = Double.NaN;
    axBefore = Double.NaN;
    int next = road.next(i);
    if (limits.binds(next) && limits.speed(next) <= level.speed) {
      return energy;
    }
    double cageSpeed = cageSpeed(level);
    solver.forget();
    return shiftWithin(i, energy, startSlope(i, energy, 0), cageSpeed);
  }

  /**
   * The drive limit jumps down between the last station and this one: below some speed the car may
   * cross a dip of torque, above it may not. Speed is then held at that threshold; without this it
   * would swing about it by an amount that depends on the spacing.
   *
   * @return the energy at the threshold, or the one given when there is no threshold below it
   */
  private double holdThreshold(int i, double energy, double axAbove) {
    double below = energyBefore + Math.min(0, axAbove) * road.step(road.previous(i));
    double middle = (axBefore + axAbove) / 2;
    double above = energy;
    if (below < LEAST_ENERGY || !(driveLimitAhead(i, Math.sqrt(2 * below)) > middle)) {
      driveLimitAhead(i, Math.sqrt(2 * energy));
      return energy;
    }
    before = Double.NaN;
    for (int k = 0; k < THRESHOLD_STEPS; k++) {
      double energyAt = (below + above) / 2;
      if (driveLimitAhead(i, Math.sqrt(2 * energyAt)) > middle) {
        below = energyAt;
      } else {
        above = energyAt;
      }
    }
    driveLimitAhead(i, Math.sqrt(2 * below));
    return below;
  }

  /** Station within a gear change: no drive torque. */
  private double rollThroughShift(int i, double speed) {
    before = Double.NaN;
    axBefore = Double.NaN;
    if (!solver.constantSpeed(speed, level, level) || !solver.atCageTorque(level, 0, limit)) {
      limits.load(i, limit);
      limit.speed = speed;
    }
    profile.save(i, limit, gear, LapLimit.SHIFT);
    return roll(speed * speed / 2, limit.ax, road.step(i));
  }

  private static LapLimit reason(TrimLimit why) {
    return switch (why) {
      case TORQUE -> LapLimit.POWER;
      case TYRES -> LapLimit.TRACTION;
      case DRIVER -> LapLimit.SLIDE_ON_POWER;
    };
  }

  /** Mean acceleration over the next interval by the trapezoidal rule, for lack of a past. */
  private double startSlope(int i, double energy, double ax) {
    int next = road.next(i);
    if (next == i) {
      return ax;
    }
    double speed =
        Math.min(
            Math.sqrt(2 * Math.max(energy + ax * road.step(i), LEAST_ENERGY)), limits.speed(next));
    solver.place(road, next);
    if (solver.nextDriveLimit(speed, level, gear, growthMax, limit) == null) {
      return ax;
    }
    return (ax + limit.ax) / 2;
  }

  /**
   * Mean acceleration over the next interval by the trapezoidal rule, from a look at the next point
   * with the speed that a predicted acceleration leads to.
   */
  private double corrected(int i, double energy, double ax, double predicted) {
    int next = road.next(i);
    double energyThere = energy + predicted * road.step(i);
    double speed = Math.sqrt(2 * Math.max(energyThere, LEAST_ENERGY));
    if (next == i || limits.binds(next) && speed >= limits.speed(next)) {
      return predicted;
    }
    solver.place(road, next);
    boolean seen = solver.peekDriveLimit(speed, gear, growthMax, limit);
    return seen ? (ax + limit.ax) / 2 : predicted;
  }

  /** Takes the next gear when its shift speed lies within the interval. */
  private double shiftWithin(int i, double energy, double slope, double cageSpeed) {
    double ds = road.step(i);
    double next = Math.max(energy + slope * ds, LEAST_ENERGY);
    double then = cageSpeed * Math.sqrt(next / energy);
    double shiftSpeed = gearbox.upshiftSpeed(gear);
    if (then < shiftSpeed) {
      return next;
    }
    gear++;
    if (gearbox.shiftTime() == 0) {
      return next;
    }
    shiftLeft = gearbox.shiftTime();
    before = Double.NaN;
    double driven = cageSpeed >= shiftSpeed ? 0 : (shiftSpeed - cageSpeed) / (then - cageSpeed);
    solver.place(road, i);
    boolean steady = solver.constantSpeed(Math.sqrt(2 * energy), level, level);
    double rolling = steady && solver.atCageTorque(level, 0, limit) ? limit.ax : 0;
    return roll(energy + slope * ds * driven, rolling, ds * (1 - driven));
  }

  /** Rolls for the rest of the shift, then drives for what is left of the distance. */
  private double roll(double energy, double ax, double distance) {
    double speed = Math.sqrt(2 * energy);
    double rolled = Math.min(distance, speed * shiftLeft);
    shiftLeft = rolled < distance ? 0 : shiftLeft - rolled / speed;
    double next = energy + ax * rolled;
    if (rolled < distance) {
      solver.driveLimit(level, gear, growthMax, limit);
      next += limit.ax * (distance - rolled);
    }
    return Math.max(next, LEAST_ENERGY);
  }
}
