package rampwright.vehicle.trim;

/**
 * Follows a drive or brake limit from one point of the road to the next without searching the whole
 * branch again. The limit's kind and the pattern of sticking and sliding units must stay the same;
 * whenever they do not, at every {@link #AUDIT}th point of a corner, and whenever a step does not
 * converge, the caller searches the branch with {@link SlipMarch}.
 *
 * <p>A workspace, one instance per thread and per mode.
 */
final class LimitTracker {
  /** Points after which the whole branch is searched again in a corner. */
  private static final int AUDIT = 12;

  /** Lateral acceleration (m/s²) below which the branch has no surprises. */
  private static final double STRAIGHT = 1.0;

  /** Largest change of mean slip (-) between neighbouring points. */
  private static final double LARGEST_STEP = 0.02;

  /** Part of the branch's direction that counts as none when a limit's kind is told. */
  private static final double FLAT = 1e-3;

  /** Change of torque with mean slip (N·m) that counts as none. */
  private static final double PEAK_SLOPE = 20;

  private static final double PEAK_TOLERANCE = 0.1;
  private static final double DIRECTION_TOLERANCE = 1e-5;
  private static final double GROWTH_TOLERANCE = 1e-6;

  /** What makes a state the limit. */
  private enum Kind {
    TORQUE,
    /** The driver's growth rate is reached. */
    GROWTH,
    /** The acceleration is extreme. */
    EXTREME,
    /** Torque is extreme, while more slip would still gain acceleration. */
    PEAK,
    /** The branch turns back in mean slip. */
    FOLD,
    /** Anything else, such as a change between sticking and sliding: cannot be followed. */
    KINK
  }

  private final Equilibrium equilibrium;
  private final Stability stability;
  private final int direction;
  private final Arc arc;
  private final ArcSearch search;
  private final ArcSearch.Miss slipPart;
  private final ArcSearch.Miss gainPart;
  private final ArcSearch.Miss torqueRate;
  private final ArcSearch.Miss growthLeft;
  private final TrimState last = new TrimState();
  private final TrimState before = new TrimState();
  private final TrimState trial = new TrimState();

  private int known;
  private int sinceAudit;
  private TrimLimit reason;
  private Kind kind;
  private int pattern;
  private double runawaySlope;
  private double growthMax;

  LimitTracker(Equilibrium equilibrium, Stability stability) {
    this.equilibrium = equilibrium;
    this.stability = stability;
    this.direction = equilibrium.driveline.braking ? -1 : 1;
    this.arc = new Arc(false, equilibrium.driveline.activeWheels);
    this.search = new ArcSearch(equilibrium, arc);
    this.slipPart = state -> arc.meanSlipPart();
    this.gainPart = state -> arc.thirdPart();
    this.torqueRate = state -> state.torqueRate;
    this.growthLeft = state -> growthMax - growth(state);
  }

  /** Forgets the points before: the next one has no neighbour. */
  void forget() {
    known = 0;
  }

  /**
   * Takes over a limit that a search of the whole branch has found.
   *
   * @param largestGrowth largest growth rate that the driver masters (1/s)
   * @param runaway torque slope (N·m) below which a limit of the driver's may lie before a dip
   */
  void searched(TrimLimit why, TrimState limit, double largestGrowth, double runaway) {
    growthMax = largestGrowth;
    runawaySlope = runaway;
    sinceAudit = 0;
    search.slope = Double.NaN;
    reason = why;
    Kind now = kindOf(why, limit);
    // the search may have ended on another state
    trial.copyFrom(limit);
    boolean usable = now != Kind.KINK && equilibrium.holds(trial);
    int nowPattern = pattern();
    if (!usable || now != kind || nowPattern != pattern) {
      known = 0;
    }
    kind = now;
    pattern = nowPattern;
    if (usable) {
      keep(limit);
    }
  }

  private Kind kindOf(TrimLimit why, TrimState limit) {
    if (why == TrimLimit.TORQUE) {
      return Kind.TORQUE;
    }
    if (why == TrimLimit.DRIVER) {
      return Math.abs(limit.sigma - growthMax) < FLAT ? Kind.GROWTH : Kind.KINK;
    }
    arc.pointAlongBranch(limit, 1);
    if (Math.abs(arc.thirdPart()) < FLAT) {
      return Kind.EXTREME;
    }
    if (Math.abs(arc.meanSlipPart()) < FLAT) {
      return Kind.FOLD;
    }
    return Math.abs(limit.torqueRate) < PEAK_SLOPE ? Kind.PEAK : Kind.KINK;
  }

  /**
   * Tries to follow the limit to the point where the force balance stands.
   *
   * @return the limit's kind, or null when the whole branch must be searched
   */
  TrimLimit follow(
      double speed, SlipMarch.TorqueCap cap, double largestGrowth, int sign, TrimState out) {
    double lateral = speed * speed * equilibrium.forces.curvature;
    boolean due = sinceAudit >= AUDIT && Math.abs(lateral) > STRAIGHT;
    if (due || !peek(speed, cap, largestGrowth, sign, out)) {
      known = 0;
      return null;
    }
    sinceAudit++;
    keep(trial);
    return reason;
  }

  /** Looks at the limit at a point without going there; returns whether it could be followed. */
  boolean peek(
      double speed, SlipMarch.TorqueCap cap, double largestGrowth, int sign, TrimState out) {
    if (known == 0) {
      return false;
    }
    growthMax = largestGrowth;
    predict(speed);
    boolean found =
        switch (kind) {
          case TORQUE -> cap.solve(equilibrium, trial) && !grows() && onBranch(sign);
          case GROWTH -> reach(growthLeft, GROWTH_TOLERANCE) && isFirst(sign);
          case EXTREME ->
              reach(gainPart, DIRECTION_TOLERANCE)
                  && !grows()
                  && joined(sign)
                  && direction * trial.torqueRate > -PEAK_SLOPE;
          case PEAK -> reach(torqueRate, PEAK_TOLERANCE) && !grows() && joined(sign) && gainRises();
          case FOLD ->
              reach(slipPart, DIRECTION_TOLERANCE)
                  && !grows()
                  && gainRises()
                  && direction * trial.torqueRate * arc.meanSlipPart() >= 0;
          case KINK -> false;
        };
    boolean steady =
        found
            && (kind == Kind.TORQUE || cap.headroom(trial) >= 0 && !nearDip())
            && Math.abs(trial.meanSlip - last.meanSlip) < LARGEST_STEP
            && pattern() == pattern;
    if (steady) {
      out.copyFrom(trial);
    }
    return steady;
  }

  /**
   * Whether the branch may dip before this limit: a wheel is past its peak and friction links it to
   * its neighbour. The limit may then jump from one side of the dip to the other.
   */
  private boolean nearDip() {
    for (DifferentialEquation differential : equilibrium.driveline.differentials) {
      if (differential.state != DifferentialEquation.State.FRICTIONLESS
          && differential.capacity < Double.POSITIVE_INFINITY
          && equilibrium.someWheelSpent()) {
        return true;
      }
    }
    return false;
  }

  private boolean reach(ArcSearch.Miss miss, double tolerance) {
    arc.pointAlongBranch(last, direction);
    return search.follow(trial, miss, tolerance);
  }

  private boolean joined(int sign) {
    return trial.determinantSign == sign;
  }

  private boolean onBranch(int sign) {
    return joined(sign) && direction * trial.torqueRate > runawaySlope;
  }

  /** Whether the growth rate still rises, so that the driver's limit is crossed upwards. */
  private boolean isFirst(int sign) {
    return onBranch(sign) && !(search.slope > 0);
  }

  /** Whether the acceleration gains all the way to the fold. */
  private boolean gainRises() {
    return direction * arc.thirdPart() > FLAT;
  }

  private void keep(TrimState limit) {
    before.copyFrom(last);
    last.copyFrom(limit);
    known = Math.min(2, known + 1);
  }

  /** Linear extrapolation from the last two limits, or the last one. */
  private void predict(double speed) {
    trial.copyFrom(last);
    if (known == 2) {
      trial.sideslip += last.sideslip - before.sideslip;
      trial.steer += last.steer - before.steer;
      trial.ax += last.ax - before.ax;
      for (int i = 0; i < 4; i++) {
        trial.slip[i] += last.slip[i] - before.slip[i];
      }
      trial.meanSlip += last.meanSlip - before.meanSlip;
    }
    trial.speed = speed;
  }

  private double growth(TrimState state) {
    stability.evaluate(equilibrium.forces, equilibrium.driveline, state.speed, state.sideslip);
    state.sigma = stability.sigma;
    return state.sigma;
  }

  private boolean grows() {
    return growthMax != Double.POSITIVE_INFINITY && growth(trial) > growthMax;
  }

  private int pattern() {
    int code = 0;
    for (DifferentialEquation differential : equilibrium.driveline.differentials) {
      code = 4 * code + differential.state.ordinal();
    }
    return code;
  }
}
