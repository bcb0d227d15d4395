package rampwright.vehicle.lap;

import rampwright.vehicle.circuit.Road;
import rampwright.vehicle.driveline.Driveline;
import rampwright.vehicle.trim.TrimResults;
import rampwright.vehicle.trim.TrimSolver;
import rampwright.vehicle.trim.TrimState;

/**
 * Turns the final profile into a trace. Every station's trim is solved once more; where the profile
 * was lowered to a limit of speed, the trim is the one whose acceleration is that of the profile.
 */
final class TraceWriter {
  private final Road road;
  private final TrimSolver solver;
  private final Gearbox gearbox;
  private final Driveline driveline;
  private final Profile profile;
  private final Trace trace;
  private final double[] ax;
  private final boolean[] braking;
  private final TrimState state = new TrimState();
  private final TrimState level = new TrimState();
  private final TrimState fresh = new TrimState();

  TraceWriter(Road road, TrimSolver solver, Gearbox gearbox, Driveline driveline, Profile profile) {
    this.road = road;
    this.solver = solver;
    this.gearbox = gearbox;
    this.driveline = driveline;
    this.profile = profile;
    this.trace = new Trace(road.stations());
    this.ax = new double[road.size()];
    this.braking = new boolean[road.size()];
  }

  Trace trace() {
    return trace;
  }

  /** Writes every station and returns the lap time (s). */
  double write() {
    for (int i = 0; i < road.size(); i++) {
      ax[i] = profile.limit[i] == LapLimit.CORNERING ? asked(i) : profile.ax(i);
      braking[i] = profile.braking(i);
    }
    for (int station = 0; station < road.stations(); station++) {
      int i = road.pointOf(station);
      solver.place(road, i);
      profile.load(i, state);
      int gear = profile.gear[i];
      if (profile.limit[i] == LapLimit.CORNERING || !solver.restore(state)) {
        gear = gearbox.best(solver.rollingCageSpeed(profile.speed[i]));
        follow(i, gear);
      }
      row(station, i, gear);
      ax[i] = state.ax;
      braking[i] = state.brakeTorque > 0;
    }
    return times();
  }

  private double times() {
    double time = 0;
    int station = 0;
    for (int i = 0; i < road.size(); i++) {
      if (station < road.stations() && road.pointOf(station) == i) {
        set(Channel.TIME, station++, time);
      }
      int next = road.next(i);
      if (next != i) {
        time += interval(i, next);
      }
    }
    return time;
  }

  /**
   * Time (s) from one point to the next. Where drive turns into braking between the two, both
   * accelerations are held up to the point where they meet; elsewhere the kinetic energy is taken
   * as the cubic through both ends and the time integrated by Simpson's rule.
   */
  private double interval(int i, int j) {
    double ds = road.step(i);
    double from = profile.speed[i];
    double to = profile.speed[j];
    double axFrom = ax[i];
    double axTo = ax[j];
    double gain = (to * to - from * from) / 2;
    if (axFrom > 0 && axTo < 0 && braking[j]) {
      double share = (gain - axTo * ds) / ((axFrom - axTo) * ds);
      if (share > 0 && share < 1) {
        double top = Math.sqrt(from * from + 2 * axFrom * share * ds);
        return 2 * ds * (share / (from + top) + (1 - share) / (top + to));
      }
    }
    double middle = (from * from + to * to) / 2 + ds / 4 * (axFrom - axTo);
    double least = Math.min(from, to) * Math.min(from, to) / 4;
    return ds / 6 * (1 / from + 4 / Math.sqrt(Math.max(least, middle)) + 1 / to);
  }

  /** Acceleration (m/s²) that the neighbouring speeds ask for. */
  private double asked(int i) {
    int before = road.previous(i);
    int after = road.next(i);
    double distance = (before == i ? 0 : road.step(before)) + (after == i ? 0 : road.step(i));
    double fast = profile.speed[after];
    double slow = profile.speed[before];
    return (fast * fast - slow * slow) / 2 / distance;
  }

  /** Solves for the acceleration asked for, starting from the trim of the profile. */
  private void follow(int i, int gear) {
    level.copyFrom(state);
    level.speed = profile.speed[i];
    level.braking = false;
    if (accelerates(ax[i], gear)) {
      return;
    }
    // the station's limit may lie too far from the speed at which it is driven
    boolean steady = solver.constantSpeed(level.speed, level, fresh);
    if (steady) {
      level.copyFrom(fresh);
    }
    if (steady && accelerates(ax[i], gear)) {
      return;
    }
    // at the very limit of speed there is no acceleration to give
    state.copyFrom(level);
    if (!solver.restore(state) && !restoreJustBelow(profile.speed[i])) {
      throw new IllegalStateException("no trim at station " + i);
    }
  }

  /** At the very limit a trim may be found only by a hair's breadth below the speed. */
  private boolean restoreJustBelow(double speed) {
    for (double share = 1e-6; share < 5e-3; share *= 4) {
      if (solver.constantSpeed(speed * (1 - share), fresh) && solver.restore(fresh)) {
        state.copyFrom(fresh);
        return true;
      }
    }
    return false;
  }

  private boolean accelerates(double wanted, int gear) {
    return solver.atAcceleration(level, wanted, gear, state) && solver.restore(state);
  }

  private void row(int station, int point, int gear) {
    int i = station;
    TrimResults r = solver.results();
    double speed = profile.speed[point];
    set(Channel.DISTANCE, i, road.distance(point));
    set(Channel.SPEED, i, speed);
    set(Channel.CURVATURE, i, road.curvature(point));
    set(Channel.CURVATURE_GRADIENT, i, road.curvatureGradient(point));
    set(Channel.AX, i, state.ax);
    set(Channel.AY, i, speed * speed * road.curvature(point));
    set(Channel.SIDESLIP, i, state.sideslip);
    set(Channel.STEER, i, state.steer);
    set(Channel.CAGE_TORQUE, i, state.cageTorque);
    set(Channel.FULL_TORQUE, i, driveline.fullTorque(gear, state.cageSpeed));
    set(Channel.BRAKE_TORQUE, i, state.brakeTorque);
    set(Channel.GEAR, i, gear);
    set(Channel.LIMIT, i, profile.limit[point].ordinal());
    set(Channel.SIGMA, i, r.sigma());
    set(Channel.CONTROL, i, r.control());
    set(Channel.YAW_MOMENT, i, r.yawMoment());
    for (int p = 0; p < 3; p++) {
      block(Channel.FRONT_CAGE_TORQUE, 4 * p, i, r.cageTorque(p));
      block(Channel.FRONT_TORQUE_DIFFERENCE, 4 * p, i, r.torqueDifference(p));
      block(Channel.FRONT_SPEED_DIFFERENCE, 4 * p, i, r.speedDifference(p));
      block(Channel.FRONT_CAPACITY, 4 * p, i, r.capacity(p));
    }
    for (int w = 0; w < 4; w++) {
      block(Channel.FX_FL, w, i, r.fx(w));
      block(Channel.FY_FL, w, i, r.fy(w));
      block(Channel.FZ_FL, w, i, r.fz(w));
      block(Channel.SLIP_FL, w, i, state.slip[w]);
      block(Channel.SLIP_ANGLE_FL, w, i, r.slipAngle(w));
      block(Channel.WHEEL_SPEED_FL, w, i, r.wheelSpeed(w));
    }
  }

  private void set(Channel channel, int i, double value) {
    trace.set(channel, i, value);
  }

  private void block(Channel first, int offset, int i, double value) {
    trace.set(first, offset, i, value);
  }
}
