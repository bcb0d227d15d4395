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
  private static final int MOST_REFINEMENTS = 40;
  private static final int MOST_FOLLOWING = 8;

  /** Arc length for a first difference quotient. */
  private static final double PROBE = 0.01;

  /** Largest arc length between the limits of neighbouring points. */
  private static final double FAR = 1.5;

  /**
   * Share of the branch's direction in speed that counts as none: the speed lies below the fold by
   * the order of its square.
   */
  private static final double FLAT = 1e-5;

  private static final double GROWTH_TOLERANCE = 1e-6;

  private final Equilibrium drive;
  private final Stability stability;
  private final BranchStart start;
  private final Arc arc;
  private final TrimState last = new TrimState();
  private final TrimState next = new TrimState();

  // limits of the points before
  private final TrimState kept = new TrimState();
  private final TrimState keptBefore = new TrimState();
  private int known;
  private boolean byDriver;
  private double slope;

  private double growthMax;

  CornerLimit(Equilibrium drive, Stability stability, BranchStart start) {
    this.drive = drive;
    this.stability = stability;
    this.start = start;
    this.arc = new Arc(true, drive.driveline.activeWheels);
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
    arc.turn();
    arc.startAt(next);
    boolean found = reach(byDriver);
    if (found && byDriver != atDriversLimit()) {
      byDriver = !byDriver;
      slope = Double.NaN;
      found = reach(byDriver) && byDriver == atDriversLimit();
    }
    if (!found || next.speed > topSpeed || !drive.signAtMeanSlipIs(start.referenceSign, next)) {
      known = 0;
      return false;
    }
    last.copyFrom(next);
    return keep(topSpeed, out);
  }

  /** Whether, at the state found last, the driver's limit is the first that the branch meets. */
  private boolean atDriversLimit() {
    return byDriver ? arc.thirdPart() > 0 : grows(next);
  }

  /** Secant search along the line for the fold of the speed or the driver's growth rate. */
  private boolean reach(boolean growth) {
    double distance = arc.distance(next);
    double previous = Double.NaN;
    double missBefore = Double.NaN;
    for (int k = 0; k < MOST_FOLLOWING; k++) {
      if (!drive.alongArc(next, arc, distance)) {
        return false;
      }
      double miss = growth ? growth(next) - growthMax : arc.thirdPart();
      if (Math.abs(miss) < (growth ? GROWTH_TOLERANCE : FLAT)) {
        return true;
      }
      if (!Double.isNaN(previous)) {
        slope = (miss - missBefore) / (distance - previous);
      }
      previous = distance;
      missBefore = miss;
      distance += Double.isNaN(slope) ? PROBE : -miss / slope;
      if (!(Math.abs(distance) < FAR)) {
        return false;
      }
      arc.move(next, distance - previous);
    }
    return false;
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
    slope = Double.NaN;
    arc.pointAlongThird();
    arc.startAt(last);
    if (!drive.alongArc(last, arc, 0) || grows(last)) {
      return false;
    }
    double step = FIRST_STEP;
    for (int k = 0; k < MOST_STEPS && last.speed < topSpeed; k++) {
      arc.turn();
      arc.startAt(last);
      double growthBefore = last.sigma;
      double risingBefore = arc.thirdPart();
      boolean solved = advance(step);
      boolean over = solved && arc.thirdPart() <= 0;
      boolean tooFast = solved && grows(next);
      if (solved && !drive.signAtMeanSlipIs(start.referenceSign, next)) {
        solved = false;
      }
      if (solved && (over || tooFast)) {
        return settle(step, over, risingBefore, growthBefore);
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

  private boolean advance(double distance) {
    next.copyFrom(last);
    arc.move(next, distance);
    return drive.alongArc(next, arc, distance);
  }

  /** Ends the climb at the fold or the driver's limit, within a step of the line. */
  private boolean settle(double step, boolean over, double rising, double growthBefore) {
    double end = step;
    if (over) {
      end = narrow(0, rising, step, arc.thirdPart(), false);
      byDriver = false;
      if (!grows(next)) {
        last.copyFrom(next);
        return drive.signAtMeanSlipIs(start.referenceSign, last);
      }
    }
    byDriver = true;
    narrow(0, growthBefore - growthMax, end, next.sigma - growthMax, true);
    last.copyFrom(next);
    return drive.signAtMeanSlipIs(start.referenceSign, last);
  }

  /**
   * Illinois search between two distances along the line, at which the miss has opposite signs.
   *
   * @return the distance found; the state there is left in {@code next}
   */
  private double narrow(double from, double missFrom, double to, double missTo, boolean growth) {
    double a = from;
    double missA = missFrom;
    double b = to;
    double missB = missTo;
    double tolerance = growth ? GROWTH_TOLERANCE : FLAT;
    int side = 0;
    double at = to;
    for (int k = 0; k < MOST_REFINEMENTS; k++) {
      at = k % 5 == 4 ? (a + b) / 2 : a + (b - a) * missA / (missA - missB);
      if (!advance(at)) {
        break;
      }
      double miss = growth ? growth(next) - growthMax : arc.thirdPart();
      if (Math.abs(miss) < tolerance || Math.abs(b - a) < 1e-9) {
        return at;
      }
      if (miss * missFrom > 0) {
        a = at;
        missA = miss;
        missB *= side == 1 ? 0.5 : 1;
        side = 1;
      } else {
        b = at;
        missB = miss;
        missA *= side == -1 ? 0.5 : 1;
        side = -1;
      }
    }
    advance(a);
    return a;
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
