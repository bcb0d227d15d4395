package rampwright.vehicle.trim;

/**
 * Finds the drive or brake limit by following the branch of trims in the mean slip of the active
 * wheels, a parameter that does not fold where torque does.
 *
 * <p>With some lock at low speed the torque can rise to a first peak, dip while the inside wheel's
 * speed climbs to the outside wheel's, and rise again once the unit sticks. On the throttle the car
 * snaps across the dip; so the whole range is followed, the global extreme is taken, and states in
 * which torque falls with slip, or lies below a torque reached earlier, are crossed in a jump: they
 * are neither steady states nor asked for stability. Nor is the short stretch before such a dip
 * where torque rises by less than a fifth of its first slope, because there the inside wheel's
 * speed, not the car, is about to run away.
 *
 * <p>A workspace, one instance per thread and per mode (driving or braking).
 */
final class SlipMarch {
  private static final int MOST_STATES = 96;

  /** Share of the slip at the tyre's peak that one step covers. */
  private static final double STEP = 0.15;

  /** Growth of the step once torque falls. */
  private static final double GROWTH = 1.4;

  /** The branch is followed to this multiple of the slip at the tyre's peak. */
  static final double RANGE = 4;

  /** Arc length of a step where the branch does not go on at a given mean slip. */
  private static final double ARC_STEP = 0.3;

  private static final double SMALLEST_ARC_STEP = 1e-3;
  private static final double RUNAWAY_SLOPE = 0.2;
  private static final double TORQUE_SLOPE_SCALE = 1e4;
  private static final double DIRECTION_TOLERANCE = 1e-6;
  private static final double GROWTH_TOLERANCE = 1e-6;
  private static final double TORQUE_TOLERANCE = 1e-6;

  private final Equilibrium equilibrium;
  private final Stability stability;
  private final boolean braking;
  private final int direction;
  private final TrimState[] states = new TrimState[MOST_STATES];
  private final TrimState trial = new TrimState();
  private final Arc arc;
  private final ArcSearch search;
  private final ArcSearch.Miss slipPart;
  private final ArcSearch.Miss gainPart;
  private final ArcSearch.Miss growthLeft;
  private final ArcSearch.Miss torquePart;
  private final ArcSearch.Miss torqueLeft;
  private final ArcSearch.Miss torqueMissing;

  private int count;
  private int referenceSign;
  private double growthMax;
  private double torqueWanted;
  private TorqueCap cap;

  /** How much torque is left until the engine or the brakes have no more. */
  interface TorqueCap {
    /** Returns the torque left (N·m) at a state. */
    double headroom(TrimState state);

    /** Solves for the state at which nothing is left; returns whether that converged. */
    boolean solve(Equilibrium equilibrium, TrimState state);
  }

  SlipMarch(Equilibrium equilibrium, Stability stability) {
    this.equilibrium = equilibrium;
    this.stability = stability;
    this.braking = equilibrium.driveline.braking;
    this.direction = braking ? -1 : 1;
    for (int i = 0; i < MOST_STATES; i++) {
      states[i] = new TrimState();
    }
    this.arc = new Arc(false, equilibrium.driveline.activeWheels);
    this.search = new ArcSearch(equilibrium, arc);
    // on the near side of the fold, where derivatives with mean slip still have their sign
    this.slipPart = state -> direction * arc.meanSlipPart() - 2 * DIRECTION_TOLERANCE;
    this.gainPart = state -> direction * arc.thirdPart();
    this.growthLeft = state -> growthMax - growth(state);
    this.torquePart = this::boundedTorqueSlope;
    this.torqueLeft = state -> cap.headroom(state);
    this.torqueMissing = state -> torqueWanted - torque(state);
  }

  /**
   * Finds the limit.
   *
   * @param start a state of the branch from which torque rises
   * @param torqueCap what engine or brakes allow
   * @param largestGrowth largest growth rate that the driver masters (1/s), infinite for the car's
   *     limit
   * @param sign determinant sign of the branch that is joined to straight running
   * @param out receives the limit
   */
  TrimLimit find(
      TrimState start, TorqueCap torqueCap, double largestGrowth, int sign, TrimState out) {
    cap = torqueCap;
    growthMax = largestGrowth;
    referenceSign = sign;
    count = 1;
    states[0].copyFrom(start);
    if (grows(states[0])) {
      out.copyFrom(states[0]);
      return TrimLimit.DRIVER;
    }
    if (cap.headroom(states[0]) <= 0) {
      out.copyFrom(states[0]);
      return TrimLimit.TORQUE;
    }
    boolean capped = march();
    return choose(capped, out);
  }

  /** Returns the torque slope below which a state may lie before a dip (N·m). */
  double runawaySlope() {
    return RUNAWAY_SLOPE * torqueSlope(states[0]);
  }

  /** Returns whether torque dipped and rose again on the branch that was followed last. */
  boolean sawDip() {
    boolean fell = false;
    for (int i = 1; i < count; i++) {
      if (fell && torqueSlope(states[i]) > 0) {
        return true;
      }
      fell |= torqueSlope(states[i]) < 0;
    }
    return false;
  }

  private double torque(TrimState s) {
    return braking ? s.brakeTorque : s.cageTorque;
  }

  private double torqueSlope(TrimState s) {
    return direction * s.torqueRate;
  }

  /** Torque slope squeezed between -1 and 1, because it is infinite where the branch turns back. */
  private double boundedTorqueSlope(TrimState s) {
    double slope = torqueSlope(s) / TORQUE_SLOPE_SCALE;
    return slope / (1 + Math.abs(slope));
  }

  private double gain(TrimState s) {
    return braking ? -s.ax : s.ax;
  }

  /** Part of the branch's direction in acceleration, positive where the gain rises. */
  private double gainSlope(TrimState s) {
    arc.pointAlongBranch(s, 1);
    return arc.thirdPart();
  }

  private double growth(TrimState s) {
    if (Double.isNaN(s.sigma)) {
      stability.evaluate(equilibrium.forces, equilibrium.driveline, s.speed, s.sideslip);
      s.sigma = stability.sigma;
    }
    return s.sigma;
  }

  private boolean grows(TrimState s) {
    return growthMax != Double.POSITIVE_INFINITY && growth(s) > growthMax;
  }

  private boolean solveAt(TrimState from, double meanSlip, TrimState to) {
    to.predict(from, meanSlip - from.meanSlip);
    return equilibrium.atMeanSlip(to, meanSlip) && to.determinantSign == referenceSign;
  }

  /** Follows the branch; returns whether it ended at the torque cap. */
  private boolean march() {
    double peakSlip = equilibrium.peakSlip();
    double step = STEP * peakSlip;
    double largestStep = step;
    double end = RANGE * peakSlip;
    double firstSlope = torqueSlope(states[0]);
    double mostTorque = torque(states[0]);
    boolean bySlip = true;
    while (count < MOST_STATES && Math.abs(states[count - 1].meanSlip) < end) {
      TrimState last = states[count - 1];
      TrimState next = states[count];
      boolean ends = false;
      bySlip &= solveAt(last, last.meanSlip + direction * step, next);
      if (!bySlip) {
        if (!alongBranch(last, next)) {
          return false;
        }
        boolean turned = direction * arc.meanSlipPart() <= 0;
        ends = turned || next.determinantSign != referenceSign;
        if (turned) {
          double beyond = direction * arc.meanSlipPart();
          arc.pointAlongBranch(last, direction);
          search.narrow(
              last,
              direction * arc.meanSlipPart(),
              next,
              beyond,
              slipPart,
              DIRECTION_TOLERANCE,
              next);
        }
      }
      boolean rising = torqueSlope(next) > 0 && torque(next) > mostTorque;
      if (rising && cap.headroom(next) <= 0) {
        return reachCap(last, next);
      }
      count++;
      boolean tooFast = rising && grows(next);
      mostTorque = Math.max(mostTorque, torque(next));
      if (ends || tooFast && torqueSlope(next) >= RUNAWAY_SLOPE * firstSlope || finished(next)) {
        return false;
      }
      if (torqueSlope(next) < 0) {
        largestStep *= GROWTH;
      }
      step = Math.min(step * 2, largestStep);
    }
    return false;
  }

  /**
   * Steps along the branch by arc length, where the next mean slip has no trim nearby: the branch
   * may turn back in mean slip, which is the end of the road, or only bend sharply. It also ends
   * where both wheels of an axle pass their peak together and need no longer share its torque
   * evenly: the determinant changes sign and torque falls.
   */
  private boolean alongBranch(TrimState last, TrimState next) {
    for (double length = ARC_STEP; length > SMALLEST_ARC_STEP; length /= 2) {
      arc.pointAlongBranch(last, direction);
      arc.startAt(last);
      next.copyFrom(last);
      arc.move(next, length);
      if (equilibrium.alongArc(next, arc, length)
          && (direction * arc.meanSlipPart() <= 0
              || next.determinantSign == referenceSign
              || torqueSlope(next) < 0)) {
        return true;
      }
    }
    return false;
  }

  /** Replaces the state beyond the cap by the one at it. */
  private boolean reachCap(TrimState last, TrimState beyond) {
    double left = cap.headroom(last);
    double over = cap.headroom(beyond);
    trial.predict(last, (beyond.meanSlip - last.meanSlip) * left / (left - over));
    if (!cap.solve(equilibrium, trial) || !between(last, trial.meanSlip, beyond)) {
      search.narrow(last, left, beyond, over, torqueLeft, TORQUE_TOLERANCE, trial);
    }
    grows(trial);
    states[count++].copyFrom(trial);
    return true;
  }

  private boolean between(TrimState last, double meanSlip, TrimState beyond) {
    return (meanSlip - last.meanSlip) * direction >= -1e-9
        && (beyond.meanSlip - meanSlip) * direction >= -1e-9;
  }

  /** Whether torque cannot rise again beyond this state. */
  private boolean finished(TrimState state) {
    if (torqueSlope(state) >= 0) {
      return false;
    }
    DrivelineEquations driveline = equilibrium.driveline;
    if (driveline.centre != null) {
      return false;
    }
    if (braking) {
      return spent(0) && spent(1) || spent(2) && spent(3);
    }
    DifferentialEquation differential = driveline.differentials[0];
    int left = driveline.activeWheels[0];
    return switch (differential.state) {
      case FRICTIONLESS -> spent(left) || spent(left + 1);
      case LEFT_FASTER -> spent(left);
      case RIGHT_FASTER -> spent(left + 1);
      case STICKING -> spent(left) && spent(left + 1);
    };
  }

  /** Whether more slip gives a wheel less force. */
  private boolean spent(int wheel) {
    return equilibrium.forces.tyre[wheel].fxSlip < 0;
  }

  private TrimLimit choose(boolean capped, TrimState out) {
    double firstSlope = torqueSlope(states[0]);
    int best = 0;
    int lastSteady = 0;
    double mostTorque = torque(states[0]);
    for (int i = 1; i < count; i++) {
      TrimState s = states[i];
      boolean rising = torqueSlope(s) > 0 && torque(s) > mostTorque;
      mostTorque = Math.max(mostTorque, torque(s));
      if (!rising || torqueSlope(s) < RUNAWAY_SLOPE * firstSlope && dipFollows(i)) {
        continue;
      }
      if (grows(s)) {
        return crossing(lastSteady, i, best, out);
      }
      lastSteady = i;
      if (gain(s) > gain(states[best])) {
        best = i;
      }
    }
    if (capped && best == count - 1) {
      out.copyFrom(states[best]);
      return TrimLimit.TORQUE;
    }
    return extreme(best, out);
  }

  /** Whether torque falls after a state and later exceeds what it had reached. */
  private boolean dipFollows(int i) {
    double peak = torque(states[i]);
    boolean fell = false;
    for (int j = i + 1; j < count; j++) {
      if (fell && torque(states[j]) > peak) {
        return true;
      }
      fell |= torqueSlope(states[j]) < 0;
      peak = Math.max(peak, torque(states[j]));
    }
    return false;
  }

  /** The extreme of the acceleration next to the best steady state. */
  private TrimLimit extreme(int best, TrimState out) {
    out.copyFrom(states[best]);
    int next = best + 1;
    if (next < count && gainSlope(states[best]) > 0) {
      refineExtreme(states[best], states[next], out);
    } else if (best > 0 && gainSlope(states[best]) < 0) {
      refineExtreme(states[best - 1], states[best], out);
    }
    if (grows(out)) {
      return reachGrowth(states[best], out, out);
    }
    return TrimLimit.TYRES;
  }

  /**
   * The first of two points between a state and the next: where the acceleration is extreme, or
   * where torque is, beyond which a trim is no steady state.
   */
  private void refineExtreme(TrimState rising, TrimState falling, TrimState out) {
    double slopeRising = gainSlope(rising);
    double slopeFalling = gainSlope(falling);
    if (slopeRising > 0 && slopeFalling < 0) {
      search.narrow(
          rising, slopeRising, falling, slopeFalling, gainPart, DIRECTION_TOLERANCE, trial);
    } else {
      trial.copyFrom(gain(rising) >= gain(falling) ? rising : falling);
    }
    if (torqueSlope(trial) < 0 && torqueSlope(rising) > 0) {
      double torqueRising = boundedTorqueSlope(rising);
      double torqueFalling = boundedTorqueSlope(trial);
      search.narrow(
          rising, torqueRising, trial, torqueFalling, torquePart, DIRECTION_TOLERANCE, trial);
    }
    out.copyFrom(gain(trial) >= gain(rising) ? trial : rising);
    // the search may have ended on another state
    equilibrium.holds(out);
    grows(out);
  }

  /** The growth rate first exceeds the driver's at state {@code i}. */
  private TrimLimit crossing(int lastSteady, int i, int best, TrimState out) {
    if (lastSteady == i - 1) {
      reachGrowth(states[lastSteady], states[i], out);
    } else {
      land(lastSteady, i, out);
    }
    if (gain(states[best]) > gain(out)) {
      out.copyFrom(states[best]);
    }
    return TrimLimit.DRIVER;
  }

  /** Between the last steady state and state {@code i} lies a jump. */
  private void land(int lastSteady, int i, TrimState out) {
    torqueWanted = torque(states[0]);
    for (int j = 1; j < i; j++) {
      torqueWanted = Math.max(torqueWanted, torque(states[j]));
    }
    TrimState before = states[i - 1];
    search.narrow(
        before,
        torqueWanted - torque(before),
        states[i],
        torqueWanted - torque(states[i]),
        torqueMissing,
        TORQUE_TOLERANCE,
        trial);
    if (equilibrium.atMeanSlip(trial, trial.meanSlip) && !grows(trial)) {
      reachGrowth(trial, states[i], out);
    } else {
      out.copyFrom(states[lastSteady]);
    }
  }

  /** Finds where the growth rate reaches the driver's limit. */
  private TrimLimit reachGrowth(TrimState below, TrimState above, TrimState out) {
    search.narrow(
        below,
        growthMax - below.sigma,
        above,
        growthMax - above.sigma,
        growthLeft,
        GROWTH_TOLERANCE,
        out);
    return TrimLimit.DRIVER;
  }
}
