package rampwright.vehicle.lap;

import rampwright.vehicle.Driver;
import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.trim.TrimLimit;
import rampwright.vehicle.trim.TrimSolver;
import rampwright.vehicle.trim.TrimState;

/**
 * Integrates the brake limit backward from every station that is slower than the forward pass
 * arrives, and lowers the speeds before it.
 */
final class BackwardPass {
  /**
   * Share by which speeds may differ and still count as equal: so near below a cornering limit the
   * branch of trims turns back, and nothing is gained by another trim.
   */
  private static final double SAME_SPEED = 1e-5;

  /** Lateral acceleration (m/s²) below which braking changes slowly along the road. */
  private static final double STRAIGHT = 1.0;

  private final Road road;
  private final TrimSolver solver;
  private final Gearbox gearbox;
  private final SpeedLimits limits;
  private final Profile profile;
  private final Driver driver;
  private final LimitForm form;
  private final TrimState level = new TrimState();
  private final TrimState limit = new TrimState();
  private final TrimState held = new TrimState();
  private final TrimState peeked = new TrimState();
  private int gear;
  private LapLimit reason;

  BackwardPass(
      Road road,
      TrimSolver solver,
      Gearbox gearbox,
      SpeedLimits limits,
      Profile profile,
      LapRequest request) {
    this.road = road;
    this.solver = solver;
    this.gearbox = gearbox;
    this.limits = limits;
    this.profile = profile;
    this.driver = request.driver();
    this.form = request.form();
  }

  /** Runs once around against the direction of travel, ending at a station. */
  void run(int start) {
    int steps = road.closed() ? road.size() : road.size() - 1;
    int last = road.closed() ? start : road.size() - 1;
    double after = Double.NaN;
    for (int k = 0; k < steps; k++) {
      int i = Math.floorMod(last - k, road.size());
      int previous = Math.floorMod(i - 1, road.size());
      boolean lowered = !Double.isNaN(after);
      if (!lowered && atLimit(i) && limits.isApex(i)) {
        reachApex(i, previous);
      }
      double ax = Double.NaN;
      if (lowered || profile.speed[previous] > profile.speed[i] && !slowsEnough(i, previous)) {
        ax = brakeAt(i, profile.speed[i], lowered);
      }
      if (lowered && !Double.isNaN(ax)) {
        profile.save(i, limit, gear, reason);
      }
      after =
          profile.speed[previous] > profile.speed[i]
              ? slowDown(i, previous, ax, after)
              : Double.NaN;
    }
  }

  private boolean atLimit(int i) {
    return profile.limit[i] == LapLimit.CORNERING
        && Math.abs(profile.speed[i] - limits.speed(i)) < 1e-9 * limits.speed(i);
  }

  /**
   * Ends at the slowest point of a corner, which lies between stations: it is reached at zero
   * acceleration, and the mean acceleration from the station before to there is half of that
   * station's.
   */
  private void reachApex(int i, int previous) {
    double offset = limits.apexOffset(i);
    double energy = limits.apexEnergy(i);
    int before = offset > 0 ? i : previous;
    double distance = offset > 0 ? offset : road.step(previous) + offset;
    double ax = brakeAt(before, Math.sqrt(2 * energy), false);
    if (Double.isNaN(ax)) {
      return;
    }
    double reached = Math.sqrt(2 * (energy - 0.5 * ax * distance));
    if (reached < profile.speed[before]) {
      profile.speed[before] = reached;
      profile.limit[before] = LapLimit.CORNERING;
    }
  }

  /** Whether the car can slow down as the profile asks, which needs no search for the limit. */
  private boolean slowsEnough(int i, int previous) {
    double speed = profile.speed[i];
    double asked =
        (speed * speed - profile.speed[previous] * profile.speed[previous])
            / 2
            / road.step(previous);
    solver.place(road, i);
    profile.load(i, held);
    held.braking = false;
    int lowest = gearbox.best(solver.rollingCageSpeed(speed));
    return solver.masters(held, asked, lowest, growthMax(i, speed), limit);
  }

  /** Brake limit at a station; leaves it in {@code limit}. NaN when there is no trim there. */
  private double brakeAt(int i, double speed, boolean haveLevel) {
    solver.place(road, i);
    gear = gearbox.best(solver.rollingCageSpeed(speed));
    if (!haveLevel) {
      limits.load(i, level);
      solver.forget();
    }
    TrimLimit why = solver.nextBrakeLimit(speed, level, gear, growthMax(i, speed), limit);
    if (why == null) {
      return Double.NaN;
    }
    reason = why == TrimLimit.DRIVER ? LapLimit.SLIDE_ON_BRAKES : LapLimit.BRAKING;
    return Math.min(0, limit.ax);
  }

  /**
   * Lowers the station before; returns the acceleration used, or NaN when it was slow enough. Where
   * no brake limit was found, as may happen right at the cornering limit, the speed is held: a
   * lower station must never be left with a faster one before it.
   */
  private double slowDown(int i, int previous, double brakeLimit, double after) {
    boolean found = !Double.isNaN(brakeLimit);
    double ax = found ? brakeLimit : 0;
    double energy = profile.speed[i] * profile.speed[i] / 2;
    double ds = road.step(previous);
    double slope;
    if (Double.isNaN(after) || !found) {
      double guess = Math.min(Math.sqrt(2 * (energy - ax * ds)), profile.speed[previous]);
      double before = brakeAt(previous, guess, found);
      slope = Double.isNaN(before) ? ax : (ax + before) / 2;
    } else {
      slope = corrected(previous, energy, ax, ax + 0.5 * (ax - after) * ds / road.step(i), ds);
    }
    double reached = Math.sqrt(2 * (energy - Math.min(0, slope) * ds));
    if (reached >= profile.speed[previous] * (1 - SAME_SPEED)) {
      return Double.NaN;
    }
    profile.speed[previous] = reached;
    return ax;
  }

  /** Trapezoidal rule with a look at the point before, at the speed predicted there. */
  private double corrected(int previous, double energy, double ax, double predicted, double ds) {
    double speed = Math.sqrt(2 * (energy - Math.min(0, predicted) * ds));
    if (speed * speed * Math.abs(road.curvature(previous)) < STRAIGHT) {
      return predicted;
    }
    solver.place(road, previous);
    boolean seen =
        solver.peekBrakeLimit(
            speed,
            gearbox.best(solver.rollingCageSpeed(speed)),
            growthMax(previous, speed),
            peeked);
    return seen ? (ax + Math.min(0, peeked.ax)) / 2 : predicted;
  }

  private double growthMax(int i, double speed) {
    return form == LimitForm.CAR
        ? Double.POSITIVE_INFINITY
        : driver.brakingGrowth(speed * speed * road.curvature(i));
  }
}
