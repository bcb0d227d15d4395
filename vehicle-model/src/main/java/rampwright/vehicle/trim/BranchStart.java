package rampwright.vehicle.trim;

/**
 * Finds trims that are joined to straight running: from the straight line at zero mean slip the
 * path is bent step by step to the curvature wanted. A change of the determinant's sign on the way
 * is a fold in sideslip or steer and the end of the road.
 */
final class BranchStart {
  /** Lateral acceleration (m/s²) that one step of bending adds at most. */
  private static final double STEP = 2.5;

  /**
   * Kinematic steer (rad) that one step of bending adds at most: a larger first step at walking
   * speed leads to a car that slides sideways.
   */
  private static final double STEER_STEP = 0.05;

  private static final int MOST_HALVINGS = 8;

  private final Equilibrium equilibrium;
  private final TrimState last = new TrimState();
  private final TrimState next = new TrimState();

  /** Determinant sign on the branch joined to straight running. */
  final int referenceSign;

  BranchStart(Equilibrium equilibrium) {
    this.equilibrium = equilibrium;
    ForceBalance forces = equilibrium.forces;
    forces.place(0, 0, 0, 0, 0, 1, 1, 0);
    straight(20);
    if (!equilibrium.atMeanSlip(last, 0)) {
      throw new IllegalStateException("no trim in a straight line at 20 m/s");
    }
    referenceSign = last.determinantSign;
  }

  private void straight(double speed) {
    last.speed = speed;
    last.sideslip = 0;
    last.steer = 0;
    last.ax = 0;
    java.util.Arrays.fill(last.slip, 0);
  }

  /**
   * Solves for zero mean slip at the point where the force balance stands.
   *
   * @return whether such a trim is joined to straight running
   */
  boolean coasting(double speed, TrimState out) {
    ForceBalance forces = equilibrium.forces;
    double curvature = forces.curvature;
    double gradient = forces.curvatureGradient;
    double bend = Math.max(1e-9, Math.abs(curvature));
    double step =
        Math.min(1, Math.min(STEP / (speed * speed), STEER_STEP / forces.wheelbase) / bend);
    straight(speed);
    forces.bend(0, 0);
    boolean found = solve(last);
    double reached = 0;
    double steerPerShare = forces.wheelbase * curvature;
    double sideslipPerShare = 0;
    int halvings = 0;
    while (found && reached < 1) {
      double share = Math.min(1, reached + step);
      next.copyFrom(last);
      next.steer += steerPerShare * (share - reached);
      next.sideslip += sideslipPerShare * (share - reached);
      forces.bend(curvature * share, gradient * share);
      if (solve(next)) {
        steerPerShare = (next.steer - last.steer) / (share - reached);
        sideslipPerShare = (next.sideslip - last.sideslip) / (share - reached);
        reached = share;
        last.copyFrom(next);
      } else {
        step /= 2;
        found = ++halvings <= MOST_HALVINGS;
      }
    }
    forces.bend(curvature, gradient);
    if (found) {
      out.copyFrom(last);
    }
    return found;
  }

  private boolean solve(TrimState state) {
    return equilibrium.atMeanSlip(state, 0) && state.determinantSign == referenceSign;
  }

  /**
   * Solves for constant speed on level drive, from a coasting trim.
   *
   * @return whether the branch reaches constant speed
   */
  boolean constantSpeed(TrimState coasting, TrimState out) {
    out.copyFrom(coasting);
    if (equilibrium.atAcceleration(out, 0) && out.determinantSign == referenceSign) {
      return true;
    }
    return climb(coasting, out);
  }

  /** Raises the mean slip in small steps until the car no longer slows down. */
  private boolean climb(TrimState coasting, TrimState out) {
    last.copyFrom(coasting);
    double step = last.ax < 0 ? 0.01 : -0.01;
    for (int i = 0; i < 60 && Math.abs(step) > 1e-4; i++) {
      next.predict(last, step);
      boolean solved =
          equilibrium.atMeanSlip(next, last.meanSlip + step)
              && next.determinantSign == referenceSign;
      if (solved && next.ax * last.ax <= 0) {
        out.copyFrom(next);
        return equilibrium.atAcceleration(out, 0) && out.determinantSign == referenceSign;
      }
      if (solved) {
        last.copyFrom(next);
      } else {
        step /= 2;
      }
    }
    return false;
  }
}
