package rampwright.vehicle.trim;

/**
 * Largest speed at which the car can hold the path at constant speed. The branch of constant-speed
 * trims is followed upward in speed by its arc length, because speed itself folds at the limit; the
 * limit of the next point of a road is looked for from there along the direction of the branch.
 *
 * <p>A workspace, one instance per thread.
 */
final class CornerLimit {
  private static final double FIRST_STEP = 0.5;
  private static final double LARGEST_STEP = 1.0;
  private static final double SMALLEST_STEP = 1e-4;
  private static final int MOST_STEPS = 200;

  /**
   * Share of the branch's direction in speed that counts as none: the speed lies below the fold by
   * the order of its square.
   */
  private static final double FLAT = 1e-5;

  /** Share of the speed below which a step has left the branch: the equations are even in speed. */
  private static final double LEAST_SHARE = 0.5;

  private static final double GROWTH_TOLERANCE = 1e-6;
  private static final double SPEED_TOLERANCE = 1e-7;

  /** Share of the speed at one point below which the next one's is not sought nearby. */
  private static final double LEAST_FALL = 0.6;

  /** Share of the speed at a fold below which a dip is not followed. */
  private static final double DIP = 0.8;

  private final Equilibrium drive;
  private final Stability stability;
  private final BranchStart start;
  private final Arc arc;
  private final ArcSearch search;
  private final ArcSearch.Miss rise;
  private final ArcSearch.Miss growthLeft;
  private final ArcSearch.Miss speedMissing;
  private final TrimState last = new TrimState();
  private final TrimState next = new TrimState();
  private final TrimState fold = new TrimState();

  // limits of the points before
  private final TrimState kept = new TrimState();
  private final TrimState keptBefore = new TrimState();
  private int known;
  private boolean byDriver;

  private double growthMax;

  CornerLimit(Equilibrium drive, Stability stability, BranchStart start) {
    this.drive = drive;
    this.stability = stability;
    this.start = start;
    this.arc = new Arc(true, drive.driveline.activeWheels);
    this.search = new ArcSearch(drive, arc);
    this.rise = state -> arc.thirdPart();
    this.growthLeft = state -> growthMax - growth(state);
    this.speedMissing = state -> fold.speed - state.speed;
  }

  /** Forgets the points before: the next one has no neighbour. */
  void forget() {
    known = 0;
  }

  /**
   * Finds the limit at the point where the force balance stands, from straight running.
   *
   * @param from a speed (m/s) below the limit to start from
   * @param topSpeed speed (m/s) above which the limit is of no interest
   * @param largestGrowth largest growth rate that the driver masters (1/s), infinite for the car's
   * @param out receives the trim at the limit; at {@code topSpeed} when the limit lies above it
   * @return false when there is no constant-speed trim at the first speed
   */
  boolean find(double from, double topSpeed, double largestGrowth, TrimState out) {
    growthMax = largestGrowth;
    return start.coasting(from, out)
        && start.constantSpeed(out, last)
        && climb(topSpeed)
        && keep(topSpeed, out);
  }

  /**
   * Finds the limit from a nearby trim at constant speed below it.
   *
   * @return false when the start does not converge or is no steady state for the driver
   */
  boolean findFrom(
      TrimState near, double speed, double topSpeed, double largestGrowth, TrimState out) {
    growthMax = largestGrowth;
    last.copyFrom(near);
    last.speed = speed;
    last.ax = 0;
    return drive.atAcceleration(last, 0)
        && last.determinantSign == start.referenceSign
        && climb(topSpeed)
        && keep(topSpeed, out);
  }

  /**
   * Follows the limit from the points before.
   *
   * @return false when the limit must be searched
   */
  boolean follow(double topSpeed, double largestGrowth, TrimState out) {
    growthMax = largestGrowth;
    if (known == 0) {
      return false;
    }
    next.copyFrom(kept);
    if (known == 2) {
      next.sideslip += kept.sideslip - keptBefore.sideslip;
      next.steer += kept.steer - keptBefore.steer;
      next.speed += kept.speed - keptBefore.speed;
      for (int i = 0; i < 4; i++) {
        next.slip[i] += kept.slip[i] - keptBefore.slip[i];
      }
    }
    // a limit that falls so fast cannot be extrapolated, and the equations have a mirror image at
    // negative speed
    if (next.speed < LEAST_FALL * kept.speed) {
      known = 0;
      return false;
    }
    arc.turn();
    boolean found = reach();
    if (found && byDriver != atDriversLimit()) {
      byDriver = !byDriver;
      search.slope = Double.NaN;
      found = reach() && byDriver == atDriversLimit();
    }
    boolean near = found && next.speed < topSpeed && next.speed > LEAST_SHARE * kept.speed;
    if (!near || !drive.signAtMeanSlipIs(start.referenceSign, next)) {
      known = 0;
      return false;
    }
    last.copyFrom(next);
    if (!byDriver) {
      crossDip(topSpeed);
    }
    return keep(topSpeed, out);
  }

  /** Whether, at the state found last, the driver's limit is the first that the branch meets. */
  private boolean atDriversLimit() {
    return byDriver ? arc.thirdPart() > 0 : grows(next);
  }

  private boolean reach() {
    return byDriver
        ? search.follow(next, growthLeft, GROWTH_TOLERANCE)
        : search.follow(next, rise, FLAT);
  }

  private boolean keep(double topSpeed, TrimState out) {
    out.copyFrom(last);
    if (last.speed >= topSpeed) {
      known = 0;
      return true;
    }
    keptBefore.copyFrom(kept);
    kept.copyFrom(last);
    known = Math.min(2, known + 1);
    return true;
  }

  /** Follows the branch up from the trim in {@code last}, which ends as the limit. */
  private boolean climb(double topSpeed) {
    known = 0;
    search.slope = Double.NaN;
    arc.pointAlongThird();
    arc.startAt(last);
    if (!drive.alongArc(last, arc, 0) || grows(last)) {
      return false;
    }
    return rise(topSpeed) && (last.speed >= topSpeed || byDriver || crossDip(topSpeed));
  }

  /** Follows the branch up to the first fold of the speed or the driver's limit. */
  private boolean rise(double topSpeed) {
    double step = FIRST_STEP;
    for (int k = 0; k < MOST_STEPS && last.speed < topSpeed; k++) {
      arc.turn();
      arc.startAt(last);
      double growthBefore = last.sigma;
      double risingBefore = arc.thirdPart();
      boolean solved = advance(step);
      double rising = arc.thirdPart();
      if (solved && (rising <= 0 || grows(next))) {
        return settle(risingBefore, rising, growthBefore);
      }
      if (solved) {
        last.copyFrom(next);
        step = Math.min(LARGEST_STEP, step * 1.5);
      } else {
        arc.restoreTangent();
        step /= 2;
        if (step < SMALLEST_STEP) {
          // the end of the branch that is joined to straight running
          byDriver = false;
          return true;
        }
      }
    }
    return last.speed >= topSpeed;
  }

  /** Steps along the line from the last state to the next. */
  private boolean advance(double step) {
    next.copyFrom(last);
    arc.move(next, step);
    return drive.alongArc(next, arc, step)
        && next.speed > LEAST_SHARE * last.speed
        && drive.signAtMeanSlipIs(start.referenceSign, next);
  }

  /** Ends the climb at the fold or the driver's limit, between the last two states. */
  private boolean settle(double risingBefore, double rising, double growthBefore) {
    byDriver = true;
    if (rising <= 0) {
      search.narrow(last, risingBefore, next, rising, rise, FLAT, next);
      byDriver = drive.signAtMeanSlipIs(start.referenceSign, next) && grows(next);
    }
    if (byDriver) {
      search.narrow(
          last,
          growthMax - growthBefore,
          next,
          growthMax - growth(next),
          growthLeft,
          GROWTH_TOLERANCE,
          next);
    }
    last.copyFrom(next);
    return drive.signAtMeanSlipIs(start.referenceSign, last);
  }

  /**
   * Looks beyond a fold at which the inside wheel is past its peak and the differential slides: the
   * wheel's speed climbs to the outside wheel's, the unit sticks, and the speed may rise again, as
   * torque does in {@link SlipMarch}. The fold stays the limit when it does not.
   */
  private boolean crossDip(double topSpeed) {
    if (!mayStick()) {
      return true;
    }
    fold.copyFrom(last);
    double range = SlipMarch.RANGE * drive.peakSlip();
    double step = FIRST_STEP;
    for (int k = 0; k < MOST_STEPS && step > SMALLEST_STEP; k++) {
      arc.turn();
      arc.startAt(last);
      if (!advance(step)) {
        arc.restoreTangent();
        step /= 2;
        continue;
      }
      if (next.meanSlip > range || next.speed < DIP * fold.speed) {
        break;
      }
      if (next.speed > fold.speed && arc.thirdPart() > 0) {
        return land(topSpeed);
      }
      last.copyFrom(next);
      step = Math.min(LARGEST_STEP, step * 1.5);
    }
    last.copyFrom(fold);
    return true;
  }

  /** The car jumps to where the branch has risen to the fold's speed again and goes on there. */
  private boolean land(double topSpeed) {
    search.narrow(
        last,
        fold.speed - last.speed,
        next,
        fold.speed - next.speed,
        speedMissing,
        SPEED_TOLERANCE,
        last);
    boolean masters = !grows(last) && rise(topSpeed) && last.speed > fold.speed;
    if (!masters) {
      last.copyFrom(fold);
      byDriver = false;
    }
    return true;
  }

  /** Whether an inside wheel spins up at the fold: more slip gives it hardly any more force. */
  private boolean mayStick() {
    drive.signAtMeanSlipIs(start.referenceSign, last);
    for (DifferentialEquation differential : drive.driveline.differentials) {
      boolean slides =
          differential.state == DifferentialEquation.State.LEFT_FASTER
              || differential.state == DifferentialEquation.State.RIGHT_FASTER;
      if (slides && drive.someWheelSpent()) {
        return true;
      }
    }
    return false;
  }

  private double growth(TrimState state) {
    stability.evaluate(drive.forces, drive.driveline, state.speed, state.sideslip);
    state.sigma = stability.sigma;
    return state.sigma;
  }

  private boolean grows(TrimState state) {
    return growth(state) > growthMax;
  }
}
