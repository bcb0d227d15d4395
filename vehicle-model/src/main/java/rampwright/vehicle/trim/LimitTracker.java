package rampwright.vehicle.trim;

/**
 * Follows a drive or brake limit from one point of the road to the next without searching the whole
 * branch again. The limit's kind (torque, tyres, driver) and the pattern of sticking and sliding
 * units must stay the same; whenever they do not, at every {@link #AUDIT}th point of a corner, and
 * whenever a step does not converge, the caller searches the branch with {@link SlipMarch}.
 *
 * <p>A workspace, one instance per thread and per mode.
 */
final class LimitTracker {
  /** Points after which the whole branch is searched again in a corner. */
  private static final int AUDIT = 12;

  /** Lateral acceleration (m/s²) below which the branch has no surprises. */
  private static final double STRAIGHT = 1.0;

  /** Change of mean slip (-) for a first difference quotient. */
  private static final double PROBE = 1e-4;

  /** Largest change of mean slip (-) between neighbouring points. */
  private static final double LARGEST_STEP = 0.02;

  private static final int MOST_ITERATIONS = 6;
  private static final double GROWTH_TOLERANCE = 1e-5;
  private static final double AX_TOLERANCE = 1e-6;

  private final Equilibrium equilibrium;
  private final Stability stability;
  private final int direction;
  private final TrimState last = new TrimState();
  private final TrimState before = new TrimState();
  private final TrimState trial = new TrimState();

  private int known;
  private int sinceAudit;
  private TrimLimit reason;
  private int pattern;
  private double slope;
  private double runawaySlope;

  LimitTracker(Equilibrium equilibrium, Stability stability) {
    this.equilibrium = equilibrium;
    this.stability = stability;
    this.direction = equilibrium.driveline.braking ? -1 : 1;
  }

  /** Forgets the points before: the next one has no neighbour. */
  void forget() {
    known = 0;
  }

  /**
   * Takes over a limit that a search of the whole branch has found.
   *
   * @param runaway torque slope (N·m) below which a limit of the driver's may lie before a dip
   */
  void searched(TrimLimit why, TrimState limit, double runaway) {
    runawaySlope = runaway;
    if (why != reason) {
      known = 0;
    }
    reason = why;
    sinceAudit = 0;
    slope = Double.NaN;
    // the search may have ended on another state
    trial.copyFrom(limit);
    if (!equilibrium.atMeanSlip(trial, limit.meanSlip)) {
      known = 0;
      return;
    }
    int now = pattern();
    if (now != pattern) {
      known = 0;
    }
    pattern = now;
    keep(limit);
  }

  /**
   * Tries to follow the limit to the point where the force balance stands.
   *
   * @return the limit's kind, or null when the whole branch must be searched
   */
  TrimLimit follow(
      double speed, SlipMarch.TorqueCap cap, double growthMax, int sign, TrimState out) {
    double lateral = speed * speed * equilibrium.forces.curvature;
    boolean due = sinceAudit >= AUDIT && Math.abs(lateral) > STRAIGHT;
    if (known == 0 || due) {
      return null;
    }
    sinceAudit++;
    predict(speed);
    boolean found =
        switch (reason) {
          case TORQUE -> cap.solve(equilibrium, trial) && !grows(growthMax);
          case DRIVER -> reachGrowth(growthMax) && cap.headroom(trial) >= 0;
          case TYRES -> reachExtreme() && !grows(growthMax) && cap.headroom(trial) >= 0;
        };
    boolean steady =
        found
            && trial.determinantSign == sign
            && (reason == TrimLimit.TYRES || direction * trial.torqueRate > runawaySlope)
            && Math.abs(trial.meanSlip - last.meanSlip) < LARGEST_STEP
            && pattern() == pattern;
    if (!steady) {
      known = 0;
      return null;
    }
    keep(trial);
    out.copyFrom(trial);
    return reason;
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

  private double growth() {
    stability.evaluate(equilibrium.forces, equilibrium.driveline, trial.speed, trial.sideslip);
    trial.sigma = stability.sigma;
    return trial.sigma;
  }

  private boolean grows(double growthMax) {
    return growthMax != Double.POSITIVE_INFINITY && growth() > growthMax;
  }

  /** Secant search for the mean slip at which the growth rate is the driver's. */
  private boolean reachGrowth(double growthMax) {
    double meanSlip = trial.meanSlip;
    double previousSlip = Double.NaN;
    double previousExcess = Double.NaN;
    for (int k = 0; k < MOST_ITERATIONS; k++) {
      if (!equilibrium.atMeanSlip(trial, meanSlip)) {
        return false;
      }
      double excess = growth() - growthMax;
      if (Math.abs(excess) < GROWTH_TOLERANCE) {
        return true;
      }
      double next = secant(meanSlip, excess, previousSlip, previousExcess);
      if (direction * slope <= 0) {
        return false;
      }
      previousSlip = meanSlip;
      previousExcess = excess;
      meanSlip = next;
      trial.predict(trial, meanSlip - previousSlip);
    }
    return false;
  }

  /** Secant search for the mean slip at which the acceleration is extreme. */
  private boolean reachExtreme() {
    double meanSlip = trial.meanSlip;
    double previousSlip = Double.NaN;
    double previousRate = Double.NaN;
    for (int k = 0; k < MOST_ITERATIONS; k++) {
      if (!equilibrium.atMeanSlip(trial, meanSlip)) {
        return false;
      }
      double next = secant(meanSlip, trial.axRate, previousSlip, previousRate);
      if (Math.abs(trial.axRate * (next - meanSlip)) < AX_TOLERANCE) {
        return true;
      }
      if (direction * slope >= 0) {
        return false;
      }
      previousSlip = meanSlip;
      previousRate = trial.axRate;
      meanSlip = next;
      trial.predict(trial, meanSlip - previousSlip);
    }
    return false;
  }

  /** Next mean slip of a secant search; without a slope from before, a small step to get one. */
  private double secant(double x, double f, double previousX, double previousF) {
    if (!Double.isNaN(previousX) && x != previousX) {
      slope = (f - previousF) / (x - previousX);
    }
    if (Double.isNaN(slope)) {
      return x + PROBE;
    }
    return x - f / slope;
  }

  private int pattern() {
    int code = 0;
    for (DifferentialEquation differential : equilibrium.driveline.differentials) {
      code = 4 * code + differential.state.ordinal();
    }
    return code;
  }
}
