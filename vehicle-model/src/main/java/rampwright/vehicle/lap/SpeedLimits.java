package rampwright.vehicle.lap;

import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.input.InvalidInput;
import rampwright.vehicle.trim.TrimSolver;
import rampwright.vehicle.trim.TrimState;

/**
 * Largest steady speed at every station, capped at a speed that the engine cannot exceed. Each
 * station starts from the limit of the one before it.
 */
final class SpeedLimits {
  /** First speed of a search from straight running, as lateral acceleration (m/s²). */
  private static final double GENTLE = 1.5;

  /** Share of the expected limit from which a station's search starts. */
  private static final double BELOW = 0.93;

  /** Lateral acceleration (m/s²) at top speed below which a station is straight... */
  private static final double STRAIGHT = 0.5;

  /** ...and yaw acceleration (rad/s²) below which it is. */
  private static final double STRAIGHT_YAW = 0.05;

  /** Margin over the straight-line top speed for wind, grade and wheel slip. */
  private static final double TOP_SPEED_MARGIN = 1.2;

  /** Bend of the limit's energy, as a share of it, up to which a parabola describes an apex. */
  private static final double MOST_BEND = 0.2;

  private final Road road;
  private final TrimSolver solver;
  private final double growthMax;
  private final double topSpeed;
  private final Profile found;
  private final TrimState straight = new TrimState();

  SpeedLimits(LapRequest request, Road road, TrimSolver solver, double growthMax) {
    this.road = road;
    this.solver = solver;
    this.growthMax = growthMax;
    this.topSpeed = TOP_SPEED_MARGIN * straightTopSpeed(request, solver);
    this.found = new Profile(road.size());
  }

  /** Speed at which full throttle in the best gear only balances the drag, or the rev limit. */
  private static double straightTopSpeed(LapRequest request, TrimSolver solver) {
    Driveline driveline = request.car().driveline();
    double perSpeed = solver.rollingCageSpeed(1);
    double high = driveline.engine().revLimit() / (driveline.ratio(driveline.gears()) * perSpeed);
    double drag = 0.5 * request.conditions().airDensity() * request.car().aero().dragArea();
    double low = 1;
    for (int k = 0; k < 60; k++) {
      double speed = (low + high) / 2;
      double cageSpeed = speed * perSpeed;
      double torque = driveline.fullTorque(driveline.bestGear(cageSpeed), cageSpeed);
      if (torque * perSpeed > drag * speed * speed) {
        low = speed;
      } else {
        high = speed;
      }
    }
    return low;
  }

  void compute() {
    TrimState near = new TrimState();
    TrimState out = new TrimState();
    boolean haveNear = false;
    for (int i = 0; i < road.size(); i++) {
      if (isStraight(i)) {
        leaveFree(i, near);
        haveNear = false;
        continue;
      }
      solver.place(road, i);
      double curvature = Math.abs(road.curvature(i));
      boolean solved =
          solver.nextCornerLimit(topSpeed, growthMax, out)
              || haveNear
                  && solver.cornerLimit(near, firstSpeed(i, curvature), topSpeed, growthMax, out);
      // where the curvature changes fast, the speed that suits the curvature may be too high
      double from = Math.min(topSpeed, Math.sqrt(GENTLE / Math.max(1e-9, curvature)));
      while (!solved && from > 1) {
        solved = solver.cornerLimit(null, from, topSpeed, growthMax, out);
        from *= 0.7;
      }
      if (!solved) {
        throw InvalidInput.value(
            "curvature at " + Math.round(road.distance(i)) + " m",
            road.curvature(i),
            "1/m",
            "one that the car can follow",
            "check the circuit there, or the grip");
      }
      near.copyFrom(out);
      haveNear = true;
      found.save(i, out, 1, LapLimit.CORNERING);
      if (out.speed >= topSpeed) {
        found.speed[i] = topSpeed;
      }
    }
  }

  /** Whether even at top speed a station asks for next to no lateral force or yaw moment. */
  private boolean isStraight(int i) {
    double square = topSpeed * topSpeed;
    return square * Math.abs(road.curvature(i)) < STRAIGHT
        && square * Math.abs(road.curvatureGradient(i)) < STRAIGHT_YAW;
  }

  /** Leaves a station without a limit. */
  private void leaveFree(int i, TrimState near) {
    near.copyFrom(straight);
    near.speed = topSpeed;
    found.save(i, near, 1, LapLimit.CORNERING);
    solver.forget();
  }

  /** Speed from which the search starts, judged from the station before. */
  private double firstSpeed(int i, double curvature) {
    double before = Math.abs(road.curvature(i - 1));
    if (found.speed[i - 1] >= topSpeed || curvature == 0) {
      return topSpeed;
    }
    double expected = found.speed[i - 1] * Math.min(2, Math.sqrt(before / curvature));
    // after a straight the station before says nothing
    double gentle = Math.sqrt(GENTLE / curvature);
    return BELOW * Math.min(topSpeed, Math.max(gentle, expected));
  }

  /** Returns the limit (m/s) at a station. */
  double speed(int i) {
    return found.speed[i];
  }

  /** Returns whether the limit lies below every speed that the engine can reach. */
  boolean binds(int i) {
    return found.speed[i] < topSpeed;
  }

  /** Returns whether no neighbour of a station has a lower limit. */
  boolean isApex(int i) {
    return binds(i) && speed(i) <= speed(road.previous(i)) && speed(i) <= speed(road.next(i));
  }

  /**
   * Returns how far (m) behind an apex's point the limit is lowest, negative before it: the vertex
   * of the parabola through the kinetic energies of the point and its neighbours. A limit that
   * jumps up beside the point, as where an arc begins without a transition, is no parabola: the
   * lowest place is then the point.
   */
  double apexOffset(int i) {
    double bend = bend(i);
    double before = road.step(road.previous(i));
    double after = road.step(i);
    if (bend <= 1e-12 || bend * before * after > MOST_BEND * energy(i)) {
      return 0;
    }
    return Math.max(-before / 2, Math.min(after / 2, -slope(i) / bend));
  }

  /** Returns the kinetic energy per mass (m²/s²) of the lowest limit near an apex. */
  double apexEnergy(int i) {
    return energy(i) + 0.5 * slope(i) * apexOffset(i);
  }

  /** Slope at a point of the parabola through the energies of it and its neighbours. */
  private double slope(int i) {
    double before = road.step(road.previous(i));
    double after = road.step(i);
    double rise = (energy(road.next(i)) - energy(i)) / after;
    double fall = (energy(i) - energy(road.previous(i))) / before;
    return (rise * before + fall * after) / (before + after);
  }

  private double bend(int i) {
    double before = road.step(road.previous(i));
    double after = road.step(i);
    double rise = (energy(road.next(i)) - energy(i)) / after;
    double fall = (energy(i) - energy(road.previous(i))) / before;
    return 2 * (rise - fall) / (before + after);
  }

  private double energy(int i) {
    return 0.5 * found.speed[i] * found.speed[i];
  }

  void load(int i, TrimState out) {
    found.load(i, out);
  }

  /** Returns the station with the lowest limit. */
  int slowest() {
    int slowest = 0;
    for (int i = 1; i < road.size(); i++) {
      if (found.speed[i] < found.speed[slowest]) {
        slowest = i;
      }
    }
    return slowest;
  }
}
